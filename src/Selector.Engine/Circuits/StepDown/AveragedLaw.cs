namespace Selector.Engine.Circuits.StepDown;

/// <summary>
/// The averaged step-down law with drops, neglecting ripple of the output and curvature of the coil current: first guesses for
/// the exact solver. Continuous: Vout + Vf + I R = D (Vin - Vsw + Vf), the volt-second balance. Discontinuous: the charge of the current's
/// triangle equals the load's, D² (Va - V)(Va + Vf) = 2 L f I (V + Vf) with Va = Vin - Vsw.
/// </summary>
internal static class AveragedLaw
{
    /// <summary>Conduction time of the diode in discontinuous conduction at one duty, s.</summary>
    public static double DiodeTime(in ConverterCase c, double duty)
    {
        var on = c.InputVoltage - c.SwitchDrop;
        var threshold = c.DiodeThreshold;
        var drive = duty * duty * (on + threshold);
        double output;
        if (c.LoadKind == OutputLoad.Current)
        {
            var k = 2 * c.Inductance * c.Frequency * c.Load;
            output = (drive * on - k * threshold) / (k + drive);
        }
        else
        {
            var k = 2 * c.Inductance * c.Frequency / c.Load;
            var half = (k * threshold + drive) / 2;
            output = drive * on / (half + Math.Sqrt(half * half + k * drive * on));
        }

        return duty / c.Frequency * (on - output) / (output + threshold);
    }

    /// <summary>
    /// Duty that gives a mean output voltage, and the slope dV/dD there, V: the smaller of the duties by the two laws, since
    /// discontinuous conduction lifts the output.
    /// </summary>
    public static double Duty(in ConverterCase c, double output, out double slope)
    {
        var on = c.InputVoltage - c.SwitchDrop;
        var threshold = c.DiodeThreshold;
        var current = c.LoadKind == OutputLoad.Current ? c.Load : output / c.Load;
        var swing = on + threshold + (c.DiodeSlope - c.SwitchResistance) * current;
        var continuous = (output + threshold + (c.DiodeSlope + c.CoilResistance) * current) / swing;
        var head = on - output;
        var discontinuous = Math.Sqrt(
            2 * c.Inductance * c.Frequency * current * (output + threshold) / (head * (on + threshold)));
        if (discontinuous < continuous)
        {
            var stiffness = 1 / head + 1 / (output + threshold)
                + (c.LoadKind == OutputLoad.Resistance ? 1 / output : 0);
            slope = 2 / (discontinuous * stiffness);
            return discontinuous;
        }

        slope = c.LoadKind == OutputLoad.Current ? swing : swing / (1 + (c.DiodeSlope + c.CoilResistance) / c.Load);
        return continuous;
    }
}
