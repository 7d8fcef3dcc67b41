using Selector.Engine.Quantities;

namespace Selector.Engine.Parts.Families;

/// <summary>Miniature fuse links.</summary>
public static class FuseFamily
{
    public const string Id = "fuse";
    public const string Current = "current";
    public const string VoltageAc = "voltage_ac";
    public const string VoltageDc = "voltage_dc";
    public const string BreakingAc = "breaking_ac";
    public const string BreakingDc = "breaking_dc";
    public const string Melting = "melting_integral";
    public const string Class = "melting_class";
    public const string OpensAt = "opens_at";
    public const string Resistance = "cold_resistance";
    public const string Loss = "power_loss";
    public const string Knee = "current_knee";
    public const string Zero = "current_zero";

    public static FamilySpec Spec { get; } = new(Id, "fuse link", "fuse links",
    [
        new(Current, "rated current", Units.Ampere, new(1e-3, 100), "As marked; the standard says how long it may be carried.") { Required = true, InDescription = true, Fall = new(Knee, Zero) },
        new(Class, "melting class", Units.One, new(0, 2), "How fast it opens.") { Choices = ["very quick", "quick", "time-lag"], Required = true, InDescription = true },
        new(OpensAt, "must open at", Units.One, new(1.1, 20), "Multiple of the rated current at which its standard makes it open within seconds or minutes.") { Required = true },
        new(VoltageAc, "AC voltage", Units.Volt, Range.Volts, "Greatest nominal system voltage.") { InDescription = true },
        new(VoltageDc, "DC voltage", Units.Volt, Range.Volts, "Greatest DC voltage that it breaks."),
        new(BreakingAc, "AC breaking current", Units.Ampere, Range.Amperes, "At the rated AC voltage."),
        new(BreakingDc, "DC breaking current", Units.Ampere, Range.Amperes, "At the rated DC voltage."),
        new(Melting, "melting integral", Units.AmpereSquaredSecond, new(1e-6, 1e6), "I²t to melting, at ten times the rated current."),
        new(Resistance, "cold resistance", Units.Ohm, Range.Ohms, "Typical."),
        new(Loss, "power loss", Units.Watt, new(0, 100), "Greatest, at the rated current."),
        new(Knee, "current full to", Units.Celsius, Range.Degrees, "Ambient up to which the rated current holds."),
        new(Zero, "current gone at", Units.Celsius, Range.Degrees, "Where the straight line of the maker's derating meets nothing."),
    ])
    {
        Technologies = ["IEC 60127", "UL 248-14"],
        SafetyCritical = true,
        Checks = [new([Knee, Zero], v => v[0] < v[1], "The current is said to be full above where it is gone: check both.")],
    };
}
