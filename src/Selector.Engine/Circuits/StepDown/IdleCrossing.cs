namespace Selector.Engine.Circuits.StepDown;

/// <summary>Time during which a small coil current rises from, or falls to, its rest.</summary>
internal static class IdleCrossing
{
    /// <summary>
    /// Seconds within on and diode time for which the coil current is below <paramref name="level"/> amperes: from turn-on
    /// until it has risen to it, and from when it has fallen to it until the diode's end.
    /// </summary>
    public static double TimeBelow(in ConverterPhases phases, in PeriodicOrbit orbit, double level)
    {
        var time = 0.0;
        var first = orbit.AtTurnOn.Coil;
        if (first < level)
        {
            phases.On.Signals(orbit.AtTurnOn, out var coil, out _, out _);
            time += Reach(phases.On.Modes, coil, level, 0, orbit.OnTime);
        }

        if (orbit.AtDiodeEnd.Coil < level && orbit.DiodeTime > 0)
        {
            phases.Diode.Signals(orbit.AtTurnOff, out var coil, out _, out _);
            time += orbit.DiodeTime - Reach(phases.Diode.Modes, coil, level, orbit.DiodeTime, orbit.DiodeTime);
        }

        return time;
    }

    // Newton from the end of the interval where the current is small: it is all but straight up to a thousandth of its peak.
    private static double Reach(in NaturalModes modes, in ModalSignal coil, double level, double start, double time)
    {
        var slope = coil.Derivative(modes);
        var t = start;
        for (var i = 0; i < 8; i++)
        {
            var m = modes.At(t);
            var next = Math.Clamp(t + (level - coil.At(m)) / slope.At(m), 0, time);
            if (!(Math.Abs(next - t) > 1e-9 * time))
            {
                return double.IsFinite(next) ? next : start;
            }

            t = next;
        }

        return t;
    }
}
