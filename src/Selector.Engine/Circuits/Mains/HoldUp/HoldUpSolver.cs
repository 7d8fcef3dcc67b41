using Selector.Engine.Circuits.Mains.Transient;

namespace Selector.Engine.Circuits.Mains.HoldUp;

/// <summary>
/// The mains fails at the start of a positive half-wave, for half a cycle, for a whole one, or for good; what it feeds draws on.
/// Conventions of the reference family F9.
/// </summary>
public static class HoldUpSolver
{
    /// <summary>Line cycles after the failure in which the supply must have recovered or given up.</summary>
    private const double Recovery = 3;

    /// <summary>Line cycles after which a bus that has not reached the lock-out never will.</summary>
    private const double Longest = 5000;

    /// <summary>
    /// BadInput outside the ranges of <see cref="RectifierCase"/> or for a lock-out that is not above nothing; NoOperatingPoint when
    /// there is no steady state, or the bus does not even reach the lock-out.
    /// </summary>
    public static SolveStatus Solve(in HoldUpCase c, in Budget budget, out HoldUpSolution solution)
    {
        solution = default;
        if (!(c.LockOut > 0 && double.IsFinite(c.LockOut)))
        {
            return SolveStatus.BadInput;
        }

        var status = RectifierSolver.Solve(c.Circuit, budget, out var steady);
        return status == SolveStatus.Solved ? Solve(c, steady, budget, out solution) : status;
    }

    /// <summary>The same where the steady state is known.</summary>
    public static SolveStatus Solve(in HoldUpCase c, in RectifierSolution steady, in Budget budget, out HoldUpSolution solution)
    {
        solution = new HoldUpSolution { BusMean = steady.BusMean, BusMax = steady.BusMax, BusMin = steady.BusMin };
        if (c.LockOut >= steady.BusMax || steady.PulseEnd <= steady.PulseStart)
        {
            return SolveStatus.NoOperatingPoint;
        }

        var period = 1 / c.Circuit.Frequency;
        var status = After(c, steady, period / 2, Recovery, false, budget, out var half, out solution.VoltageAtRemoval);
        if (status == SolveStatus.Solved)
        {
            (solution.LeastInHalf, solution.BelowLockOut, solution.RechargePeak) = (half.Least, half.Below, half.Peak);
            solution.Survives = half.Least >= c.LockOut;
            status = After(c, steady, period, Recovery, false, budget, out var whole, out _);
            solution.LeastInWhole = whole.Least;
        }

        if (status == SolveStatus.Solved)
        {
            status = After(c, steady, double.PositiveInfinity, Longest, true, budget, out var ever, out _);
            solution.RideFromRemoval = ever.LockOutAt - period;
            solution.RideFromTop = ever.LockOutAt - ever.TopAt;
        }

        return status != SolveStatus.Solved ? status : solution.IsFinite ? SolveStatus.Solved : SolveStatus.NoOperatingPoint;
    }

    /// <summary>Only the least bus when half a cycle is missed, V.</summary>
    public static SolveStatus LeastInHalf(in RectifierCase circuit, in Budget budget, out double least)
    {
        least = 0;
        var status = RectifierSolver.Solve(circuit, budget, out var steady);
        if (status != SolveStatus.Solved || steady.PulseEnd <= steady.PulseStart)
        {
            return status == SolveStatus.Solved ? SolveStatus.NoOperatingPoint : status;
        }

        status = After(new HoldUpCase(circuit, steady.BusMin), steady, 0.5 / circuit.Frequency, 1.5, false, budget, out var watch, out _);
        least = watch.Least;
        return status != SolveStatus.Solved || double.IsFinite(least) ? status : SolveStatus.NoOperatingPoint;
    }

    private static SolveStatus After(
        in HoldUpCase c, in RectifierSolution steady, double off, double cycles, bool untilLockOut, in Budget budget, out HoldUpWatch watch, out double voltage)
    {
        // One cycle of the steady state brings the run from the start of a pulse to the zero crossing before the next positive one.
        var period = 1 / c.Circuit.Frequency;
        var run = new TransientRun(c.Circuit, 0, steady.PulseStart, steady.Next.Voltage) { EmfOffFrom = period, EmfOffTo = period + off };
        watch = new HoldUpWatch(period, period, c.LockOut, untilLockOut);
        var status = run.Run(period, ref watch, budget);
        voltage = run.U;
        return status == SolveStatus.Solved ? run.Run(period + cycles * period, ref watch, budget) : status;
    }
}
