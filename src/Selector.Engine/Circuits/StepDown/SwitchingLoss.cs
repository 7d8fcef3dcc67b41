namespace Selector.Engine.Circuits.StepDown;

/// <summary>
/// Losses of the regulator that the conduction model leaves out. Plain products, W from SI units; finite for finite inputs of
/// practical size. A loss whose data a part does not state must be named as missing, not entered as zero.
/// </summary>
public static class SwitchingLoss
{
    /// <summary>
    /// Loss in the switch where voltage and current cross in a straight line (the usual clamped-inductive commutation):
    /// V I t f / 2, with <paramref name="transitionTime"/> the sum of both transitions of a period, s.
    /// </summary>
    public static double Transition(double inputVoltage, double current, double transitionTime, double frequency) =>
        0.5 * inputVoltage * current * transitionTime * frequency;

    /// <summary>
    /// The same with each transition at its own current: turn-on at the coil's valley, turn-off at its peak, A; times in s.
    /// </summary>
    public static double Transition(
        double inputVoltage, double turnOnCurrent, double riseTime, double turnOffCurrent, double fallTime, double frequency) =>
        0.5 * inputVoltage * (turnOnCurrent * riseTime + turnOffCurrent * fallTime) * frequency;

    /// <summary>Reverse recovery of the catch diode, charge in C: V Q f, dissipated mostly in the switch.</summary>
    public static double Recovery(double inputVoltage, double recoveryCharge, double frequency) =>
        inputVoltage * recoveryCharge * frequency;

    /// <summary>The regulator's own supply current, A, from the input: Vin Iq.</summary>
    public static double Quiescent(double inputVoltage, double quiescentCurrent) => inputVoltage * quiescentCurrent;
}
