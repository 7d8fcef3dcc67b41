namespace Selector.Engine.Circuits.Mains.Exponential;

/// <summary>
/// Periodic steady state of a rectifier with exponential diodes: an L-stable implicit method along each pulse, closed form between
/// pulses, and the secant on the map from pulse to pulse. Slower than the piecewise-linear solver; for cases where the knee counts.
/// </summary>
public static class ExponentialSolver
{
    private const double Tolerance = 1e-9;
    private const int MostCycles = 60;

    /// <summary>
    /// BadInput outside the ranges of case and diode, or where pulses run into each other; NoOperatingPoint when the source cannot
    /// carry the load.
    /// </summary>
    public static SolveStatus Solve(in ExponentialCase c, in Budget budget, out RectifierSolution solution)
    {
        solution = default;
        if (!(c.Circuit with { DiodeThreshold = 0, DiodeSlope = Math.Max(c.Circuit.DiodeSlope, 1e-6) }).IsInRange || !c.Diode.IsInRange || !(c.Damping > 0))
        {
            return SolveStatus.BadInput;
        }

        var path = new ExponentialPath(c);
        var loop = path.Loop;
        if (loop.Kind != LoadKind.Resistance && loop.Load == 0)
        {
            solution = RectifierFigures.Unloaded(loop, c.Circuit.Arrangement);
            return SolveStatus.Solved;
        }

        var pulse = new ExponentialPulse();
        var status = Find(path, pulse, budget, out var next);
        if (status != SolveStatus.Solved)
        {
            return status;
        }

        solution = ExponentialFigures.Of(c, path, pulse, next);
        return solution.IsFinite ? SolveStatus.Solved : SolveStatus.NoOperatingPoint;
    }

    private static SolveStatus Find(in ExponentialPath path, ExponentialPulse pulse, in Budget budget, out double next)
    {
        // From a charged reservoir down: the map is concave, so that the secant stays above the fixed point.
        var x = 0.9 * path.Loop.Peak;
        var (before, errorBefore) = (double.NaN, double.NaN);
        next = double.NaN;
        for (var i = 0; i < MostCycles; i++)
        {
            if (budget.Cancel.IsCancellationRequested)
            {
                return SolveStatus.Cancelled;
            }

            var start = Begin(path, x);
            if (double.IsNaN(start) || !pulse.Run(path, start, x))
            {
                return SolveStatus.NoOperatingPoint;
            }

            var status = Rest(path, pulse, out next, out var voltage);
            if (status != SolveStatus.Solved)
            {
                return status;
            }

            var error = voltage - x;
            if (Math.Abs(error) <= Tolerance * path.Loop.Peak)
            {
                return SolveStatus.Solved;
            }

            var slope = double.IsNaN(before) ? double.NaN : (error - errorBefore) / (x - before);
            (before, errorBefore) = (x, error);
            var guess = slope < -1e-9 ? x - error / slope : voltage;
            x = guess > 0.3 * x && guess < path.Loop.Peak ? guess : voltage;
        }

        return SolveStatus.OutOfBudget;
    }

    /// <summary>Where the emf meets the resting bus on its way up.</summary>
    private static double Begin(in ExponentialPath path, double u)
    {
        var sine = path.Loop.TerminalAtRest(u) / path.Loop.Peak;
        return sine is >= 0 and < 1 ? Math.Asin(sine) / path.Loop.Omega : double.NaN;
    }

    /// <summary>From the end of a pulse to where the next half-wave meets the bus.</summary>
    private static SolveStatus Rest(in ExponentialPath path, ExponentialPulse pulse, out double next, out double voltage)
    {
        var loop = path.Loop;
        var rest = new BlockedStretch(loop, pulse.End, pulse.EndVoltage);
        var (low, high) = (pulse.End, loop.Cycle + Math.PI / (2 * loop.Omega));
        (next, voltage) = (double.NaN, double.NaN);
        if (!(Above(rest, loop, low) <= 0))
        {
            return SolveStatus.BadInput;
        }

        for (var i = 0; i < 60; i++)
        {
            var middle = (low + high) / 2;
            (low, high) = Above(rest, loop, middle) > 0 ? (low, middle) : (middle, high);
        }

        var bus = rest.Terminal(high, out _);
        if (!(bus > 0) || (loop.Kind == LoadKind.Power && bus <= loop.Collapsed))
        {
            return SolveStatus.NoOperatingPoint;
        }

        (next, voltage) = (high, rest.Ideal(bus));
        return SolveStatus.Solved;
    }

    /// <summary>The next half-wave over the bus, V; a bus that is gone counts as below.</summary>
    private static double Above(in BlockedStretch rest, in ChargingPath loop, double t)
    {
        var v = rest.Terminal(t, out _);
        return t < loop.Cycle ? -1 : double.IsNaN(v) ? 1 : loop.Peak * Math.Sin(loop.Omega * (t - loop.Cycle)) - v;
    }
}
