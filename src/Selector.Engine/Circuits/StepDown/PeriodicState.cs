namespace Selector.Engine.Circuits.StepDown;

/// <summary>
/// Finds the periodic steady state without stepping through time: the state at turn-on is the fixed point of the affine map
/// over one period. In discontinuous conduction the map also depends on the diode's conduction time, the one unknown that is
/// left to search.
/// </summary>
internal static class PeriodicState
{
    /// <summary>
    /// The orbit at one duty. Solved, OutOfBudget, Cancelled, or NoOperatingPoint where no conduction time returns the coil
    /// current to zero.
    /// </summary>
    public static SolveStatus Find(
        in ConverterCase c, in ConverterPhases phases, double duty, in Budget budget, out PeriodicOrbit orbit)
    {
        var period = 1 / c.Frequency;
        var on = duty * period;
        var off = duty == 1 ? 0 : period - on;
        orbit = new() { OnTime = on, DiodeTime = off };
        phases.On.Transition(on, out var onMatrix, out var onOffset);
        phases.Diode.Transition(off, out var offMatrix, out var offOffset);
        var once = offMatrix * onMatrix;
        orbit.AtTurnOn = once.FixedPoint(offMatrix * onOffset + offOffset);
        orbit.AtTurnOff = onMatrix * orbit.AtTurnOn + onOffset;
        orbit.AtDiodeEnd = orbit.AtTurnOn;
        if (orbit.AtTurnOn.Coil >= 0 || off == 0)
        {
            return SolveStatus.Solved;
        }

        var search = new DiodeEnd(phases, onMatrix, onOffset, on, off);
        // The step that a driven coil takes in the on time: what a current must be small against to count as zero.
        var scale = phases.OnSource * on / c.Inductance;
        var status = BracketedRoot.Find(
            ref search, 0, off, 1, AveragedLaw.DiodeTime(c, duty), 1e-14 * off, 1e-13 * scale, budget, out _);
        orbit = search.Orbit;
        return status == SolveStatus.Solved && !(Math.Abs(orbit.AtDiodeEnd.Coil) <= 1e-6 * scale)
            ? SolveStatus.NoOperatingPoint
            : status;
    }

    /// <summary>Mean terminal voltage of the orbit, V, from the balances of coil flux and capacitor charge, without integrals.</summary>
    public static double OutputMean(in ConverterCase c, in ConverterPhases phases, in PeriodicOrbit orbit)
    {
        var sum = Driven(c, phases.OnSource, phases.OnResistance, orbit.OnTime, orbit.AtTurnOff - orbit.AtTurnOn)
            + Driven(c, phases.DiodeSource, phases.DiodeResistance, orbit.DiodeTime, orbit.AtDiodeEnd - orbit.AtTurnOff);
        if (orbit.IdleTime > 0)
        {
            var fall = orbit.AtTurnOn.Capacitor - orbit.AtDiodeEnd.Capacitor;
            sum += c.LoadKind == OutputLoad.Current
                ? (orbit.AtDiodeEnd.Capacitor + fall / 2 - c.Esr * c.Load) * orbit.IdleTime
                : -c.Load * c.Capacitance * fall;
        }

        return sum * c.Frequency;
    }

    // Volt-seconds at the terminals: what the source gives, less what coil and series resistance take.
    private static double Driven(in ConverterCase c, double source, double resistance, double time, in StateVector change)
    {
        var flux = c.Inductance * change.Coil;
        var drop = resistance * c.Capacitance * change.Capacitor;
        return c.LoadKind == OutputLoad.Current
            ? (source - resistance * c.Load) * time - flux - drop
            : (source * time - flux - drop) / (1 + resistance / c.Load);
    }

    /// <summary>
    /// Coil current at the end of a trial conduction time, in the state that would then repeat with the coil set to zero.
    /// </summary>
    private struct DiodeEnd(in ConverterPhases phases, in StateMatrix onMatrix, in StateVector onOffset, double on, double off)
        : IRootFunction
    {
        private readonly ConverterPhases phases = phases;
        private readonly StateMatrix onMatrix = onMatrix;
        private readonly StateVector onOffset = onOffset;

        public PeriodicOrbit Orbit = default;

        public double At(double x, out double slope)
        {
            phases.Diode.Transition(x, out var diodeMatrix, out var diodeOffset);
            phases.Idle.Transition(off - x, out var idleMatrix, out var idleOffset);
            // The idle matrix has no coil column, which is what sets the current to zero.
            var toEnd = diodeMatrix * onMatrix;
            var endOffset = diodeMatrix * onOffset + diodeOffset;
            Orbit.AtTurnOn = (idleMatrix * toEnd).FixedPoint(idleMatrix * endOffset + idleOffset);
            Orbit.AtTurnOff = onMatrix * Orbit.AtTurnOn + onOffset;
            Orbit.AtDiodeEnd = toEnd * Orbit.AtTurnOn + endOffset;
            Orbit.OnTime = on;
            Orbit.DiodeTime = x;
            Orbit.IdleTime = off - x;
            // At the root the turn-on voltage is stationary in the conduction time, so the coil's own slope is the whole one.
            slope = phases.Diode.Rate.Row1.Dot(Orbit.AtDiodeEnd - phases.Diode.Equilibrium);
            return Orbit.AtDiodeEnd.Coil;
        }
    }
}
