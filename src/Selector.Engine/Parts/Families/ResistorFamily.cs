using Selector.Engine.Quantities;

namespace Selector.Engine.Parts.Families;

/// <summary>Fixed resistors.</summary>
public static class ResistorFamily
{
    public const string Id = "resistor";
    public const string Resistance = "resistance";
    public const string Tolerance = "tolerance";
    public const string Power = "power";
    public const string Knee = "power_knee";
    public const string Zero = "power_zero";
    public const string Voltage = "voltage";
    public const string Drift = "temperature_coefficient";

    /// <summary>A bank wider than this is a different design.</summary>
    private const int MostInParallel = 10;

    public const string PulseEnergy = "pulse_energy";

    public static FamilySpec Spec { get; } = new(Id, "fixed resistor", "fixed resistors",
    [
        new(Resistance, "resistance", Units.Ohm, new(1e-4, 1e9), "Nominal.") { Required = true, InDescription = true },
        new(Tolerance, "tolerance", Units.Percent, Range.Fraction, "Symmetric, when bought.") { InDescription = true },
        new(Power, "power", Units.Watt, new(1e-3, 1e4), "Full up to the temperature beside it.") { Required = true, InDescription = true, Fall = new(Knee, Zero) },
        new(Knee, "power full to", Units.Celsius, Range.Degrees, "Ambient temperature up to which the power is full."),
        new(Zero, "power nothing at", Units.Celsius, Range.Degrees, "Ambient temperature at which nothing is left."),
        new(PulseEnergy, "pulse energy", Units.Joule, new(1e-6, 1e5), "Of one short pulse that the element takes as heat."),
        new(Voltage, "working voltage", Units.Volt, Range.Volts, "Limiting element voltage."),
        new(Drift, "temperature coefficient", Units.PerKelvin, new(0, 0.01), "Greatest, either sign."),
    ])
    {
        Technologies = ["film", "wirewound", "current sense"],
        Arrangements = [new(ArrangementKind.Parallel, MostInParallel)],
        Checks =
        [
            new([Knee, Zero], v => v[0] < v[1], "The power is said to be full above where nothing is left: check both."),
        ],
    };
}
