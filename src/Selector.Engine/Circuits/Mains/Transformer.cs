namespace Selector.Engine.Circuits.Mains;

/// <summary>
/// A mains transformer as its data sheet gives it, turned into what one working winding shows: no-load voltage, resistance, leakage.
/// Zero stands for what a sheet does not give. A sheet gives the no-load voltage and the resistance, or the rated voltage, the rated
/// power or current and the regulation.
/// </summary>
/// <param name="PrimaryVoltage">Nominal, V.</param>
/// <param name="Halves">Secondary halves, 1 or 2.</param>
/// <param name="NoLoad">Of one half, V.</param>
/// <param name="Resistance">Of one half with its share of the primary, ohm.</param>
/// <param name="MeasuredAt">Temperature at which resistance or regulation was measured, °C.</param>
/// <param name="Leakage">Of one half, H.</param>
/// <param name="RatedVoltage">Of one half at rated load, V.</param>
/// <param name="RatedPower">VA of all halves.</param>
/// <param name="RatedCurrent">Rms of one half, A.</param>
/// <param name="Regulation">No-load over rated voltage, less one.</param>
/// <param name="ShortCircuitVoltage">Share of the nominal voltage that drives rated current into a short.</param>
/// <param name="PrimaryResistance">Cold, ohm.</param>
/// <param name="Frequency">For which the leakage is worked out, Hz.</param>
public readonly record struct Transformer(
    double PrimaryVoltage, double Halves, double NoLoad, double Resistance, double MeasuredAt, double Leakage, double RatedVoltage,
    double RatedPower, double RatedCurrent, double Regulation, double ShortCircuitVoltage, double PrimaryResistance, double Frequency)
{
    /// <summary>Leakage reactance over resistance where the sheet says nothing: for the valley only. Common practice, no source.</summary>
    private const double TypicalReactance = 0.3;

    /// <summary>Primary and secondary are wound for equal loss. Common practice, no source.</summary>
    private const double PrimaryShare = 0.5;

    /// <summary>No-load voltage of one half, V; 0 when the sheet gives too little.</summary>
    public double Voltage => NoLoad > 0 ? NoLoad : RatedVoltage * (1 + Regulation);

    /// <summary>Rated rms current of one half, A; 0 when the sheet gives too little.</summary>
    public double Current => RatedCurrent > 0 ? RatedCurrent : Rated > 0 ? RatedPower / (Halves * Rated) : 0;

    /// <summary>Turns of one half over those of the primary.</summary>
    public double Turns => PrimaryVoltage > 0 ? Voltage / PrimaryVoltage : 0;

    private double Rated => RatedVoltage > 0 ? RatedVoltage : Regulation > 0 ? NoLoad / (1 + Regulation) : 0;

    /// <summary>Resistance in series with one half while it alone conducts, at the temperature of the measurement, ohm.</summary>
    public double HalfResistance => Resistance > 0 ? Resistance : Split(WholeResistance).Half;

    /// <summary>Resistance of all halves in series with the whole primary, ohm.</summary>
    public double SeriesResistance => Resistance > 0 ? Halves * Resistance : WholeResistance;

    /// <summary>Resistance of the primary alone, cold or as measured, ohm.</summary>
    public double Primary => PrimaryResistance > 0 ? PrimaryResistance
        : Turns > 0 ? PrimaryShare * SeriesResistance / (Halves * Turns * Halves * Turns) : 0;

    /// <summary>Whether the sheet gives the leakage or the short-circuit voltage.</summary>
    public bool LeakageIsKnown => Leakage > 0 || ShortCircuitVoltage > 0;

    /// <summary>Leakage of one half, H: as given, from the short-circuit voltage, or the usual one.</summary>
    public double HalfLeakage
    {
        get
        {
            if (Leakage > 0)
            {
                return Leakage;
            }

            var omega = 2 * Math.PI * Frequency;
            if (!(ShortCircuitVoltage > 0 && Current > 0))
            {
                return TypicalReactance * HalfResistance / omega;
            }

            var impedance = ShortCircuitVoltage * Halves * Voltage / Current;
            return Math.Sqrt(Math.Max(0, impedance * impedance - SeriesResistance * SeriesResistance)) / omega / Halves;
        }
    }

    /// <summary>By the drop from no load to rated current, all halves in series.</summary>
    private double WholeResistance => Current > 0 ? Halves * Math.Max(0, Voltage - Rated) / Current : 0;

    /// <summary>The primary's part of a resistance does not halve with the winding: it goes with the square of the turns.</summary>
    private (double Half, double Primary) Split(double whole)
    {
        var primary = PrimaryResistance > 0 ? Math.Min(whole, PrimaryResistance * Halves * Turns * Halves * Turns) : PrimaryShare * whole;
        return ((whole - primary) / Halves + primary / (Halves * Halves), primary);
    }
}
