using Selector.Engine.Quantities;

namespace Selector.Engine.Parts.Families;

/// <summary>Film and ceramic capacitors.</summary>
public static class FilmCapacitorFamily
{
    public const string Id = "film-capacitor";
    public const string Capacitance = "capacitance";
    public const string Tolerance = "tolerance";
    public const string Voltage = "voltage";
    public const string Ripple = "ripple_current";
    public const string Esr = "esr_high";
    public const string BiasLoss = "bias_loss";
    public const string TemperatureMax = "temperature_max";

    public static FamilySpec Spec { get; } = new(Id, "film or ceramic capacitor", "film and ceramic capacitors",
    [
        new(Capacitance, "capacitance", Units.Farad, new(1e-12, 1e-2), "Nominal, without bias.") { Required = true, InDescription = true },
        new(Tolerance, "tolerance", Units.Percent, Range.Fraction, "Symmetric; blank counts as 20 %."),
        new(Voltage, "voltage", Units.Volt, new(1, 10_000), "Rated DC voltage.") { Required = true, InDescription = true },
        new(Ripple, "ripple current", Units.Ampere, new(1e-3, 1000), "Greatest rms current at 100 kHz."),
        new(Esr, "ESR at 100 kHz", Units.Ohm, new(1e-5, 1e3), "Greatest."),
        new(BiasLoss, "bias loss", Units.Percent, Range.Fraction, "Share of the capacitance lost at the rated voltage; blank counts as none for film."),
        new(TemperatureMax, "upper temperature", Units.Celsius, new(40, 200), "Upper category temperature."),
    ])
    {
        Technologies = ["polyester film", "ceramic"],
        Arrangements = [new(ArrangementKind.Parallel, 4)],
    };
}
