using Selector.Engine.Quantities;

namespace Selector.Engine.Parts.Families;

/// <summary>Aluminium electrolytic capacitors.</summary>
public static class CapacitorFamily
{
    public const string Id = "electrolytic-capacitor";
    public const string Capacitance = "capacitance";
    public const string Tolerance = "tolerance";
    public const string Voltage = "voltage";
    public const string Surge = "surge_voltage";
    public const string Ripple = "ripple_current";
    public const string EsrLow = "esr_low";
    public const string EsrHigh = "esr_high";
    public const string TemperatureMax = "temperature_max";
    public const string Life = "life";
    public const string Diameter = "diameter";
    public const string Height = "height";

    public const string Esl = "esl";
    public const string EsrCold = "esr_cold";
    public const string RippleRise = "ripple_rise";

    /// <summary>ESR of a good part over the greatest that the sheet allows. Common practice, no source.</summary>
    public const double LeastOverGreatestEsr = 0.5;

    /// <summary>More cans than this are a different design.</summary>
    private const int MostInParallel = 2;

    public static FamilySpec Spec { get; } = new(Id, "electrolytic capacitor", "electrolytic capacitors",
    [
        new(Capacitance, "capacitance", Units.Farad, new(1e-8, 10), "Nominal, at 100 or 120 Hz.") { Required = true, InDescription = true },
        new(Tolerance, "tolerance", Units.Percent, Range.Fraction, "Symmetric tolerance of the capacitance when bought; blank counts as 20 %."),
        new(Voltage, "voltage", Units.Volt, new(1, 1000), "Rated DC voltage with ripple.") { Required = true, InDescription = true },
        new(Surge, "surge voltage", Units.Volt, new(1, 1200), "For short times only; never designed to."),
        new(Ripple, "ripple current", Units.Ampere, new(1e-3, 1000), "Rms at the upper category temperature and where the multiplier is 1."),
        new(EsrLow, "ESR at 100 Hz", Units.Ohm, new(1e-4, 1e3), "Greatest series resistance at 100 or 120 Hz, 20 °C."),
        new(EsrHigh, "ESR at 100 kHz", Units.Ohm, new(1e-4, 1e3), "Greatest series resistance or impedance at 100 kHz, 20 °C."),
        .. FrequencyMultiplier.Ratings,
        new(TemperatureMax, "upper temperature", Units.Celsius, new(40, 200), "Upper category temperature."),
        new(Esl, "series inductance", Units.Henry, new(1e-10, 1e-5), "Of the leads and the winding."),
        new(EsrCold, "cold ESR", Units.One, new(1, 100), "ESR at -10 °C over that at 20 °C; blank counts as 3."),
        new(RippleRise, "core rise", Units.Kelvin, new(0.5, 50), "Rise of the core at rated ripple current; blank counts as 5 K."),
        new(Life, "life", Units.Hour, new(100, 1e6), "At the upper temperature with rated ripple current."),
        new(Diameter, "diameter", Units.Millimetre, Range.Length, "Of the can."),
        new(Height, "height", Units.Millimetre, Range.Length, "Of the can, without leads."),
    ])
    {
        Technologies = ["aluminium electrolytic"],
        Arrangements = [new(ArrangementKind.Parallel, MostInParallel)],
        InParallel = (key, n) => key switch
        {
            Capacitance => n,
            EsrLow or EsrHigh or Esl => 1.0 / n,

            // The one with the least ESR carries most: beside others of the greatest it has twice their share.
            Ripple => 1 + (n - 1) * LeastOverGreatestEsr,
            _ => 1,
        },
        Checks =
        [
            new([Surge, Voltage], v => v[0] >= v[1], "The surge voltage is below the rated voltage: check both."),
            new([EsrLow, EsrHigh], v => v[1] <= v[0], "The ESR at 100 kHz is above that at 100 Hz: check both."),
        ],
        Ageing =
        [
            new(Capacitance, 0.8, "common practice, no source"),
            new(EsrLow, 2, "common practice, no source"),
            new(EsrHigh, 2, "common practice, no source"),
        ],
    };
}
