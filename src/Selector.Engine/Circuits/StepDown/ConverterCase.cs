namespace Selector.Engine.Circuits.StepDown;

/// <summary>
/// A step-down converter at one fixed duty, all in SI units: ideal DC source; switch of <paramref name="SwitchDrop"/> +
/// <paramref name="SwitchResistance"/> while on, open while off; catch diode of <paramref name="DiodeThreshold"/> +
/// <paramref name="DiodeSlope"/> from ground to the switch node; coil with winding resistance; output capacitor with ESR and
/// ESL; load. Switching losses are not part of the circuit: see <see cref="SwitchingLoss"/>.
/// </summary>
/// <param name="Frequency">Switching frequency, Hz; 100 to 1e8.</param>
/// <param name="InputVoltage">V; 1e-3 to 1e5.</param>
/// <param name="Duty">Share of the period for which the switch is on; above 0, at most 1.</param>
/// <param name="SwitchDrop">Constant part of the switch's voltage, V; 0 to 1e5.</param>
/// <param name="SwitchResistance">Ohm; 0 to 1e6.</param>
/// <param name="DiodeThreshold">V; 0 to 1e3.</param>
/// <param name="DiodeSlope">Ohm; 0 to 1e6.</param>
/// <param name="Inductance">H; 1e-10 to 1e3.</param>
/// <param name="CoilResistance">Ohm; 0 to 1e6.</param>
/// <param name="Capacitance">F; 1e-13 to 10.</param>
/// <param name="Esr">Equivalent series resistance of the capacitor, ohm; 0 to 1e6.</param>
/// <param name="Esl">Equivalent series inductance of the capacitor, H; 0 (absent), or 1e-14 to 1e-4.</param>
/// <param name="LoadKind">Meaning of <paramref name="Load"/>.</param>
/// <param name="Load">A, 0 to 1e6; or ohm, 1e-6 to 1e9.</param>
public readonly record struct ConverterCase(
    double Frequency,
    double InputVoltage,
    double Duty,
    double SwitchDrop,
    double SwitchResistance,
    double DiodeThreshold,
    double DiodeSlope,
    double Inductance,
    double CoilResistance,
    double Capacitance,
    double Esr,
    double Esl,
    OutputLoad LoadKind,
    double Load)
{
    /// <summary>Whether every field but the duty lies in its range; false for NaN.</summary>
    internal bool PartsAreInRange =>
        Within(Frequency, 100, 1e8)
        && Within(InputVoltage, 1e-3, 1e5)
        && Within(SwitchDrop, 0, 1e5)
        && Within(SwitchResistance, 0, 1e6)
        && Within(DiodeThreshold, 0, 1e3)
        && Within(DiodeSlope, 0, 1e6)
        && Within(Inductance, 1e-10, 1e3)
        && Within(CoilResistance, 0, 1e6)
        && Within(Capacitance, 1e-13, 10)
        && Within(Esr, 0, 1e6)
        && (Esl == 0 || Within(Esl, 1e-14, 1e-4))
        && LoadKind switch
        {
            OutputLoad.Current => Within(Load, 0, 1e6),
            OutputLoad.Resistance => Within(Load, 1e-6, 1e9),
            _ => false,
        };

    /// <summary>Whether the duty lies above 0 and at most at 1; false for NaN.</summary>
    internal bool DutyIsInRange => Duty is > 0 and <= 1;

    private static bool Within(double value, double low, double high) => value >= low && value <= high;
}
