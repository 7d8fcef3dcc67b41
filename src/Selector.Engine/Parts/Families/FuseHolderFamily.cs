using Selector.Engine.Quantities;

namespace Selector.Engine.Parts.Families;

/// <summary>Holders of fuse links.</summary>
public static class FuseHolderFamily
{
    public const string Id = "fuse-holder";
    public const string Current = "current";
    public const string Voltage = "voltage";
    public const string Power = "power";
    public const string Knee = "power_knee";
    public const string Zero = "power_zero";

    public static FamilySpec Spec { get; } = new(Id, "fuse holder", "fuse holders",
    [
        new(Current, "current", Units.Ampere, Range.Amperes, "Rated.") { Required = true, InDescription = true },
        new(Voltage, "voltage", Units.Volt, Range.Volts, "Nominal system voltage.") { Required = true, InDescription = true },
        new(Power, "power acceptance", Units.Watt, new(0.1, 100), "Heat of the link that it may take at 23 °C.") { Fall = new(Knee, Zero) },
        new(Knee, "power full to", Units.Celsius, Range.Degrees, "Ambient up to which it holds."),
        new(Zero, "power gone at", Units.Celsius, Range.Degrees, "Where the maker's straight line meets nothing."),
    ])
    {
        Technologies = ["panel", "board"],
        SafetyCritical = true,
    };
}
