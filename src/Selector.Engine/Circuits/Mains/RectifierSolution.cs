namespace Selector.Engine.Circuits.Mains;

/// <summary>What is asked of a solution.</summary>
public enum RectifierDetail
{
    /// <summary>Means, RMS values and powers: what other stages need while loops are being closed. The rest stays 0.</summary>
    Loop,

    /// <summary>Everything.</summary>
    All,
}

/// <summary>The start of a search, taken from a neighbouring solution; NaN where there is none.</summary>
/// <param name="Voltage">On the ideal capacitor at the start of a pulse, V.</param>
/// <param name="Slope">Of the map's error there.</param>
public readonly record struct RectifierStart(double Voltage, double Slope);

/// <summary>
/// Periodic steady state of a rectifier, SI units. Means and RMS values are over one line period; RMS includes DC; the bus is
/// taken at the terminals of the reservoir, ESR included.
/// </summary>
public struct RectifierSolution
{
    /// <summary>Bus voltage, V.</summary>
    public double BusMean, BusMax, BusMin, BusRipplePeakToPeak, BusRippleRms;

    /// <summary>Mean load current, A.</summary>
    public double LoadMean;

    /// <summary>Current of one diode, A.</summary>
    public double DiodePeak, DiodeAverage, DiodeRms;

    /// <summary>Largest reverse voltage of any diode, V.</summary>
    public double DiodeReversePeak;

    /// <summary>RMS current of the winding, or of one half of it, A.</summary>
    public double SecondaryRms;

    /// <summary>RMS current of the reservoir, and of its component at the ripple frequency, A.</summary>
    public double CapacitorRms, CapacitorFundamentalRms;

    /// <summary>Length of one pulse above a hundredth of its peak over half a line period; a half wave can exceed 1.</summary>
    public double ConductionFraction;

    /// <summary>Power, W; apparent power, VA; their ratio, 0 when no power flows.</summary>
    public double SourcePower, SourceApparent, PowerFactor;

    /// <summary>Power, W: load, all windings, one diode, ESR.</summary>
    public double LoadPower, WindingLoss, DiodeLoss, EsrLoss;

    /// <summary>Start and end of the pulse after the zero crossing of its own half-wave, s; equal when none flows.</summary>
    public double PulseStart, PulseEnd;

    /// <summary>Where the search for a neighbouring case begins.</summary>
    public RectifierStart Next;

    internal readonly bool IsFinite => double.IsFinite(
        BusMean + BusMax + BusMin + BusRippleRms + LoadMean + DiodePeak + DiodeAverage + DiodeRms + DiodeReversePeak + SecondaryRms
        + CapacitorRms + CapacitorFundamentalRms + ConductionFraction + SourcePower + SourceApparent + LoadPower + WindingLoss
        + DiodeLoss + EsrLoss + PulseStart + PulseEnd);
}
