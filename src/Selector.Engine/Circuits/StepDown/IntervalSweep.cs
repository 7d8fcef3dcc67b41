namespace Selector.Engine.Circuits.StepDown;

/// <summary>
/// Integrates the closed-form signals of one interval by eight-point Gauss-Legendre panels and locates their extremes at the
/// zeros of their derivatives. The panels double in width from the start of the interval, because that is where fast modes
/// live; each mode's value doubles its time by one multiplication. Panels are short enough that the rule is exact to rounding.
/// </summary>
internal static class IntervalSweep
{
    // Pieces of four radians: beyond this many the circuit rings hundreds of times between two switching instants.
    private const int GreatestPieces = 512;

    // Time constants after which an exponential is below rounding.
    private const double SettledAfter = 40;

    /// <summary>
    /// Adds the interval of <paramref name="time"/> seconds from <paramref name="start"/>. False where the circuit rings more
    /// often within it than the model covers.
    /// </summary>
    public static bool Add(in LinearPhase phase, in StateVector start, double time, ref IntervalFigures figures)
    {
        if (!(time > 0))
        {
            return true;
        }

        phase.Signals(start, out var coil, out var terminal, out var capacitor);
        var modes = phase.Modes;
        var settling = modes.Fast < 0 ? SettledAfter / -modes.Fast : 0;
        if (settling > 0 && time > 8 * settling)
        {
            // Once the fast mode has died out the rest needs only the few panels of the slow pair.
            if (!AddPieces(modes, coil, terminal, capacitor, settling, ref figures))
            {
                return false;
            }

            var at = modes.At(settling) with { Fast = 0 };
            (coil, terminal, capacitor) = (
                coil.From(at, modes.Square), terminal.From(at, modes.Square), capacitor.From(at, modes.Square));
            modes = modes with { Fast = 0 };
            time -= settling;
        }

        return AddPieces(modes, coil, terminal, capacitor, time, ref figures);
    }

    // Where the circuit rings, panels must also be short against its period.
    private static bool AddPieces(
        in NaturalModes modes, in ModalSignal coil, in ModalSignal terminal, in ModalSignal capacitor, double time,
        ref IntervalFigures figures)
    {
        var pieces = Math.Ceiling(modes.Omega * time / 4);
        if (!(pieces <= GreatestPieces))
        {
            return false;
        }

        if (pieces <= 1)
        {
            AddPiece(modes, coil, terminal, capacitor, time, ref figures);
            return true;
        }

        var width = time / pieces;
        var square = modes.Square;
        for (var i = 0; i < pieces; i++)
        {
            var at = modes.At(i * width);
            AddPiece(
                modes, coil.From(at, square), terminal.From(at, square), capacitor.From(at, square), width, ref figures);
        }

        return true;
    }

    private static void AddPiece(
        in NaturalModes modes, in ModalSignal coil, in ModalSignal terminal, in ModalSignal capacitor, double time,
        ref IntervalFigures figures)
    {
        var doublings = 0;
        for (var reach = modes.FastestRate * time; reach > 2 && doublings < 60; reach /= 2)
        {
            doublings++;
        }

        var width = Math.ScaleB(time, -doublings);
        var nodes = GaussLegendre.Nodes;
        var weights = GaussLegendre.Weights;
        Span<ModeValues> values = stackalloc ModeValues[GaussLegendre.Points];
        for (var k = 0; k < GaussLegendre.Points; k++)
        {
            values[k] = modes.At(width * nodes[k]);
        }

        var watch = new ExtremeWatch(modes, coil, terminal, ref figures);
        var from = 0.0;
        for (var panel = 0; ; panel++)
        {
            for (var k = 0; k < GaussLegendre.Points; k++)
            {
                ref readonly var m = ref values[k];
                var (i, v) = (coil.At(m), terminal.At(m));
                figures.Weigh(width * weights[k], i, v, capacitor.At(m));
                watch.Pass(from + width * nodes[k], m, i, v, ref figures);
            }

            if (panel == doublings)
            {
                break;
            }

            // The panel from w to 2w has its nodes at w (1 + n): those of the whole from 0 to w, shifted by w.
            from += width;
            // Every later panel starts and ends at twice the times of the one before it.
            var shift = panel == 0 ? modes.At(from) : default;
            width *= panel == 0 ? 1 : 2;
            for (var k = 0; k < GaussLegendre.Points; k++)
            {
                values[k] = values[k].Then(panel == 0 ? shift : values[k], modes.Square);
            }
        }

        var end = modes.At(time);
        watch.Pass(time, end, coil.At(end), terminal.At(end), ref figures);
    }
}
