using Selector.Engine.Circuits.Mains;

namespace Selector.Engine.Circuits.Reservoir.Combined;

/// <summary>A rectifier whose reservoir feeds a step-down converter directly; SI units.</summary>
/// <param name="Rectifier">Its load is not read.</param>
/// <param name="Frequency">Of the switch, Hz; at least 20 times the mains', at most 1e7.</param>
/// <param name="Duty">Share of the period for which the switch is on, between 0 and 1; not read with feed-forward.</param>
/// <param name="FeedForward">Voltage by which the duty is divided: duty = this over the reservoir's voltage, V; 0 for a fixed duty.</param>
/// <param name="SwitchDrop">V.</param>
/// <param name="SwitchResistance">Ohm.</param>
/// <param name="DiodeThreshold">Of the catch diode, V.</param>
/// <param name="DiodeSlope">Of the catch diode, ohm.</param>
/// <param name="Inductance">H, above 0.</param>
/// <param name="CoilResistance">Ohm.</param>
/// <param name="Capacitance">At the output, F, above 0.</param>
/// <param name="Esr">At the output, ohm.</param>
/// <param name="Load">Constant current, A, above 0.</param>
public readonly record struct CombinedCase(
    RectifierCase Rectifier, double Frequency, double Duty, double FeedForward, double SwitchDrop, double SwitchResistance,
    double DiodeThreshold, double DiodeSlope, double Inductance, double CoilResistance, double Capacitance, double Esr, double Load)
{
    internal bool IsInRange =>
        (Rectifier with { LoadKind = LoadKind.Current, Load = Load }).IsInRange
        && Frequency >= 20 * Rectifier.Frequency && Frequency <= 1e7
        && (FeedForward > 0 ? FeedForward <= 1e6 : Duty is > 0 and < 1)
        && Within(SwitchDrop, 1e4) && Within(SwitchResistance, 1e6) && Within(DiodeThreshold, 1e4) && Within(DiodeSlope, 1e6)
        && Within(CoilResistance, 1e6) && Within(Esr, 1e6) && Load > 0 && Load <= 1e6
        && Inductance is >= 1e-10 and <= 1e3 && Capacitance is >= 1e-12 and <= 1e3;

    private static bool Within(double value, double most) => value >= 0 && value <= most;
}

/// <summary>
/// One line period of the steady state. The bus is taken at the terminals of the reservoir; low-frequency figures hold all Fourier
/// components below half the switching frequency.
/// </summary>
public struct CombinedSolution
{
    /// <summary>Bus, V, and the ideal reservoir inside it.</summary>
    public double BusMean, BusMax, BusMin, InsideMax, InsideMin;

    /// <summary>Reservoir current, A rms: all of it, below and above half the switching frequency, at the ripple and the switching frequency.</summary>
    public double CapacitorRms, CapacitorLow, CapacitorHigh, CapacitorRipple, CapacitorSwitching;

    /// <summary>One rectifier diode, and one winding or half, A.</summary>
    public double DiodePeak, DiodeRms, DiodeAverage, SecondaryRms;

    /// <summary>Into the converter, A; its mean and, through the switch, its rms.</summary>
    public double InputMean, SwitchRms;

    /// <summary>Output at the capacitor's terminals, V; coil, A.</summary>
    public double OutputMean, OutputRipple, CoilPeak, CoilRms;

    /// <summary>W.</summary>
    public double SourcePower, LoadPower;

    internal readonly bool IsFinite => double.IsFinite(
        BusMean + BusMax + BusMin + InsideMax + InsideMin + CapacitorRms + CapacitorLow + CapacitorHigh + CapacitorRipple + CapacitorSwitching
        + DiodePeak + DiodeRms + DiodeAverage + SecondaryRms + InputMean + SwitchRms + OutputMean + OutputRipple + CoilPeak + CoilRms + SourcePower + LoadPower);
}
