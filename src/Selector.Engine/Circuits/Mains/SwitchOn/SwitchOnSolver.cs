using Selector.Engine.Circuits.Mains.Transient;

namespace Selector.Engine.Circuits.Mains.SwitchOn;

/// <summary>
/// Switch-on of a rectifier with an empty reservoir: edges located, closed form between them, so that first pulse, integrals and
/// charging time are exact for the piecewise-linear diodes. Conventions of the reference family F2.
/// </summary>
public static class SwitchOnSolver
{
    private const double ChargedShare = 0.95;

    /// <summary>A pulse has ended where its current is below this share of the largest one.</summary>
    private const double EndShare = 1e-4;

    /// <summary>Line cycles after which a reservoir that is still not charged is called that.</summary>
    private const double MostCycles = 2000;

    private const double Degree = Math.PI / 180;
    private const double Coarse = 5 * Degree;
    private const double Fine = 0.02 * Degree;

    /// <summary>
    /// Solves at the phase that the case states. BadInput outside the ranges of <see cref="RectifierCase"/>; NoOperatingPoint when
    /// the supply does not settle or never charges.
    /// </summary>
    /// <param name="c">The case.</param>
    /// <param name="train">Filled with the first pulses; may be empty. Those that did not come stay as they were.</param>
    /// <param name="budget">Bound on work.</param>
    /// <param name="solution">Finite when solved.</param>
    public static SolveStatus Solve(in SwitchOnCase c, Span<SwitchOnPulse> train, in Budget budget, out SwitchOnSolution solution)
    {
        solution = default;
        var status = RectifierSolver.Solve(c.Circuit, budget, out var steady);
        if (status != SolveStatus.Solved)
        {
            return status;
        }

        return Solve(c, steady.BusMean, train, budget, out solution);
    }

    /// <summary>The same where the mean bus of the steady state is known.</summary>
    public static SolveStatus Solve(in SwitchOnCase c, double steady, Span<SwitchOnPulse> train, in Budget budget, out SwitchOnSolution solution)
    {
        solution = default;
        if (!c.Circuit.IsInRange || !double.IsFinite(c.Phase) || !(c.LoadFrom >= 0) || !(steady > 0))
        {
            return SolveStatus.BadInput;
        }

        var period = 1 / c.Circuit.Frequency;
        var start = Start(c.Phase, period);
        var run = new TransientRun(c.Circuit, c.LoadFrom, start, 0);
        var watch = new SwitchOnWatch(start, period, ChargedShare * steady, train);
        var status = run.Run(start + MostCycles * period, ref watch, budget);
        if (status != SolveStatus.Solved)
        {
            return status;
        }

        if (double.IsNaN(watch.ChargedAt) || watch.Pulses == 0)
        {
            return SolveStatus.NoOperatingPoint;
        }

        watch.FirstEnd(EndShare, out var end, out var voltage);
        solution = new SwitchOnSolution
        {
            Phase = c.Phase,
            FirstPeak = watch.FirstPeak,
            FirstPeakAt = watch.FirstPeakAt - start,
            FirstEnd = end - start,
            VoltageAtFirstEnd = voltage,
            FirstHalfIntegral = watch.FirstHalfIntegral,
            FirstPulseIntegral = watch.FirstIntegral,
            GreatestPeak = watch.GreatestPeak,
            Steady = steady,
            CyclesTo95 = (watch.ChargedAt - start) / period,
        };
        return solution.IsFinite ? SolveStatus.Solved : SolveStatus.BadInput;
    }

    /// <summary>
    /// Phase with the largest current in the first line cycle (1.6 cycles for a half wave), rad: looked for every five degrees, then
    /// closed in on.
    /// </summary>
    public static SolveStatus WorstPhase(in SwitchOnCase c, in Budget budget, out double phase) => WorstPhase(c, Coarse, Fine, budget, out phase);

    /// <summary>The same with other steps: the peak is flat there, so that a degree costs less than a thousandth of it.</summary>
    internal static SolveStatus WorstPhase(in SwitchOnCase c, double coarse, double fine, in Budget budget, out double phase)
    {
        phase = 0;
        if (!c.Circuit.IsInRange || !(c.LoadFrom >= 0))
        {
            return SolveStatus.BadInput;
        }

        var whole = c.Circuit.Arrangement == RectifierArrangement.HalfWave ? 2 * Math.PI : Math.PI;
        var (best, highest) = (0.0, double.NegativeInfinity);
        for (var p = 0.0; p < whole - coarse / 2; p += coarse)
        {
            if (Peak(c, p, budget) is var peak && peak > highest)
            {
                (best, highest) = (p, peak);
            }
        }

        var (low, high) = (best - coarse, best + coarse);
        var (a, b) = (low + 0.381966011 * (high - low), high - 0.381966011 * (high - low));
        var (fa, fb) = (Peak(c, a, budget), Peak(c, b, budget));
        for (var i = 0; i < 24 && high - low > fine; i++)
        {
            if (fa > fb)
            {
                (high, b, fb) = (b, a, fa);
                a = low + 0.381966011 * (high - low);
                fa = Peak(c, a, budget);
            }
            else
            {
                (low, a, fa) = (a, b, fb);
                b = high - 0.381966011 * (high - low);
                fb = Peak(c, b, budget);
            }
        }

        phase = Math.Max(fa, fb) < highest ? best : fa > fb ? a : b;
        phase -= Math.Floor(phase / whole) * whole;
        return budget.Cancel.IsCancellationRequested ? SolveStatus.Cancelled
            : double.IsFinite(highest) && highest > 0 ? SolveStatus.Solved : SolveStatus.NoOperatingPoint;
    }

    private static double Peak(in SwitchOnCase c, double phase, in Budget budget)
    {
        var period = 1 / c.Circuit.Frequency;
        var start = Start(phase, period);
        var run = new TransientRun(c.Circuit, c.LoadFrom, start, 0);
        var watch = new PeakWatch(period);
        run.Run(start + (c.Circuit.Arrangement == RectifierArrangement.HalfWave ? 1.6 : 1) * period, ref watch, budget);
        return watch.Peak;
    }

    private static double Start(double phase, double period) => (phase / (2 * Math.PI) - Math.Floor(phase / (2 * Math.PI))) * period;
}
