using Selector.Engine.Quantities;

namespace Selector.Engine.Parts.Families;

/// <summary>Varistors across the mains.</summary>
public static class VaristorFamily
{
    public const string Id = "varistor";
    public const string VoltageAc = "voltage_ac_max";
    public const string VoltageDc = "voltage_dc_max";
    public const string Clamping = "clamping_voltage";
    public const string ClampingCurrent = "clamping_current";
    public const string Energy = "energy";
    public const string Peak = "peak_current";

    public static FamilySpec Spec { get; } = new(Id, "varistor", "varistors",
    [
        new(VoltageAc, "AC voltage", Units.Volt, Range.Volts, "Greatest continuous rms voltage.") { Required = true, InDescription = true },
        new(VoltageDc, "DC voltage", Units.Volt, Range.Volts, "Greatest continuous DC voltage."),
        new(Clamping, "clamping voltage", Units.Volt, Range.Volts, "At the current beside it."),
        new(ClampingCurrent, "clamping at", Units.Ampere, Range.Amperes, "Current of the 8/20 µs pulse."),
        new(Energy, "energy", Units.Joule, new(0.01, 1e4), "Of one 2 ms pulse."),
        new(Peak, "peak current", Units.Ampere, new(1, 1e6), "Of one 8/20 µs pulse.") { InDescription = true },
    ])
    {
        Technologies = ["metal oxide"],
        SafetyCritical = true,
    };
}
