namespace Selector.Engine.Circuits.StepDown;

/// <summary>A step-down converter with its output terminals shorted, SI units. The output capacitor takes no part.</summary>
/// <param name="Frequency">Switching frequency with the output shorted (folded back where the regulator does so), Hz; 100 to 1e8.</param>
/// <param name="InputVoltage">V; 1e-3 to 1e5.</param>
/// <param name="SwitchDrop">V; 0 to 1e5.</param>
/// <param name="SwitchResistance">Ohm; 0 to 1e6.</param>
/// <param name="DiodeThreshold">V; 0 to 1e3.</param>
/// <param name="DiodeSlope">Ohm; 0 to 1e6.</param>
/// <param name="Inductance">H; 1e-10 to 1e3.</param>
/// <param name="CoilResistance">Ohm; 0 to 1e6.</param>
/// <param name="LoopResistance">Sense resistors, leads and the short itself, ohm; 0 to 1e6.</param>
/// <param name="CurrentLimit">Coil peak at which the regulator ends the on-time, at its greatest, A; 1e-6 to 1e6.</param>
/// <param name="LeastOnTime">On-time that the regulator cannot go below, s; 0 to less than <paramref name="MaxDuty"/> of a period.</param>
/// <param name="SkipsPulses">Whether it leaves out whole pulses while the current is too high.</param>
/// <param name="MaxDuty">Greatest duty; above 0, at most 1.</param>
public readonly record struct ShortCircuitCase(
    double Frequency,
    double InputVoltage,
    double SwitchDrop,
    double SwitchResistance,
    double DiodeThreshold,
    double DiodeSlope,
    double Inductance,
    double CoilResistance,
    double LoopResistance,
    double CurrentLimit,
    double LeastOnTime,
    bool SkipsPulses,
    double MaxDuty = 1)
{
    /// <summary>Whether every field lies in its range; false for NaN.</summary>
    internal bool IsInRange =>
        new ConverterCase(
            Frequency, InputVoltage, MaxDuty, SwitchDrop, SwitchResistance, DiodeThreshold, DiodeSlope, Inductance,
            CoilResistance, 1e-6, 0, 0, OutputLoad.Current, CurrentLimit) is { PartsAreInRange: true, DutyIsInRange: true }
        && LoopResistance is >= 0 and <= 1e6
        && CurrentLimit >= 1e-6
        && LeastOnTime >= 0
        && LeastOnTime * Frequency < MaxDuty;
}
