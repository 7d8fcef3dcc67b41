namespace Selector.Engine.Circuits.StepDown;

/// <summary>
/// Follows coil current and terminal voltage through an interval and, wherever a derivative changes its sign between two
/// visits, finds the extreme in between.
/// </summary>
internal ref struct ExtremeWatch
{
    private readonly NaturalModes modes;
    private readonly ModalSignal coil, terminal, coilSlope, terminalSlope;
    private double lastTime, lastCoilSlope, lastTerminalSlope;

    /// <summary>Starts at the beginning of the interval, whose values count as visited.</summary>
    public ExtremeWatch(in NaturalModes modes, in ModalSignal coil, in ModalSignal terminal, ref IntervalFigures figures)
    {
        this.modes = modes;
        this.coil = coil;
        this.terminal = terminal;
        coilSlope = coil.Derivative(modes);
        terminalSlope = terminal.Derivative(modes);
        var start = new ModeValues(1, 1, 0);
        lastCoilSlope = coilSlope.At(start);
        lastTerminalSlope = terminalSlope.At(start);
        figures.Touch(coil.At(start), terminal.At(start));
    }

    /// <summary>Visits the time <paramref name="t"/>, later than the last one, with both signals' values there.</summary>
    public void Pass(double t, in ModeValues m, double coilNow, double terminalNow, ref IntervalFigures figures)
    {
        var nowCoil = coilSlope.At(m);
        var nowTerminal = terminalSlope.At(m);
        figures.Touch(coilNow, terminalNow);
        if (nowCoil * lastCoilSlope < 0)
        {
            TouchZero(coilSlope, lastTime, lastCoilSlope, t, nowCoil, ref figures);
        }

        if (nowTerminal * lastTerminalSlope < 0)
        {
            TouchZero(terminalSlope, lastTime, lastTerminalSlope, t, nowTerminal, ref figures);
        }

        (lastTime, lastCoilSlope, lastTerminalSlope) = (t, nowCoil, nowTerminal);
    }

    // Regula falsi with halving of the retained end; an extreme is flat, so a rough place gives its value to rounding.
    private readonly void TouchZero(
        in ModalSignal slope, double low, double lowValue, double high, double highValue, ref IntervalFigures figures)
    {
        var tolerance = 1e-9 * (high - low);
        var last = low;
        for (var i = 0; i < 40; i++)
        {
            var x = low + (high - low) * (lowValue / (lowValue - highValue));
            var m = modes.At(x);
            var value = slope.At(m);
            if (Math.Abs(x - last) <= tolerance || value == 0 || i == 39)
            {
                figures.Touch(coil.At(m), terminal.At(m));
                return;
            }

            if (value > 0 == lowValue > 0)
            {
                (low, lowValue, highValue) = (x, value, highValue / 2);
            }
            else
            {
                (high, highValue, lowValue) = (x, value, lowValue / 2);
            }

            last = x;
        }
    }
}
