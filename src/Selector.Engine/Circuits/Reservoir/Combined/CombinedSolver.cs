using Selector.Engine.Circuits.Mains;

namespace Selector.Engine.Circuits.Reservoir.Combined;

/// <summary>
/// Steady state of rectifier and converter on one reservoir, switching cycle by switching cycle over whole line periods until one
/// repeats the last. Conventions of the reference family F4. The judge of the quicker sum that the ledger uses: see RippleWeight.
/// </summary>
public static class CombinedSolver
{
    private const int StepsOfSwitch = 10;
    private const int MostPeriods = 400;
    private const double Settled = 1e-7;

    /// <summary>
    /// BadInput outside the ranges of <see cref="CombinedCase"/>; NoOperatingPoint when the bus gives out; OutOfBudget when it does not
    /// settle. Where the switching frequency is no multiple of the mains' the line period is cut to whole switching cycles.
    /// </summary>
    public static SolveStatus Solve(in CombinedCase c, in Budget budget, out CombinedSolution solution)
    {
        solution = default;
        if (!c.IsInRange)
        {
            return SolveStatus.BadInput;
        }

        if (!Start(c, budget, out var state))
        {
            return SolveStatus.NoOperatingPoint;
        }

        var circuit = new CombinedCircuit(c);
        var cycles = (int)Math.Round(c.Frequency / c.Rectifier.Frequency);
        var period = 1 / c.Rectifier.Frequency;
        for (var i = 0; i < MostPeriods; i++)
        {
            if (budget.Cancel.IsCancellationRequested)
            {
                return SolveStatus.Cancelled;
            }

            var before = state;
            Line(c, circuit, ref state, cycles, period, null);
            if (!double.IsFinite(state.Bus + state.Coil + state.Output) || state.Bus <= 0)
            {
                return SolveStatus.NoOperatingPoint;
            }

            if (Moved(before, state) <= Settled)
            {
                var sums = new CombinedSums(c, circuit, cycles, period);
                Line(c, circuit, ref state, cycles, period, sums);
                solution = sums.Solution();
                return solution.IsFinite ? SolveStatus.Solved : SolveStatus.BadInput;
            }
        }

        return SolveStatus.OutOfBudget;
    }

    /// <summary>A bus from the rectifier alone with the mean current of the converter, and a coil that carries the load.</summary>
    private static bool Start(in CombinedCase c, in Budget budget, out CombinedState state)
    {
        var peak = Math.Sqrt(2) * c.Rectifier.SecondaryRms - c.Rectifier.DiodesInPath * c.Rectifier.DiodeThreshold;
        state = default;
        if (!(peak > 0))
        {
            return false;
        }

        var duty = c.FeedForward > 0 ? Math.Min(1, c.FeedForward / peak) : c.Duty;
        var status = RectifierSolver.Solve(c.Rectifier with { LoadKind = LoadKind.Current, Load = duty * c.Load }, budget, out var alone);
        var bus = status == SolveStatus.Solved ? alone.BusMean : 0.8 * peak;
        state = new CombinedState { Bus = bus, Coil = c.Load, Output = Math.Max(0, duty * (bus - c.SwitchDrop) - c.CoilResistance * c.Load) };
        return true;
    }

    private static double Moved(in CombinedState a, in CombinedState b) => Math.Max(
        Math.Abs(a.Bus - b.Bus) / Math.Abs(b.Bus),
        Math.Max(Math.Abs(a.Output - b.Output) / Math.Max(1e-3, Math.Abs(b.Output)), Math.Abs(a.Coil - b.Coil) / Math.Max(1e-3, Math.Abs(b.Coil))));

    /// <summary>One line period, from a zero crossing of the mains on.</summary>
    private static void Line(in CombinedCase c, in CombinedCircuit circuit, ref CombinedState s, int cycles, double period, CombinedSums? sums)
    {
        // Whole cycles fill the period: where they do not by themselves, the switch is a hair faster or slower.
        var cycle = period / cycles;
        for (var k = 0; k < cycles; k++)
        {
            var t = k * cycle;
            var duty = c.FeedForward > 0 ? FedForward(c, circuit, s, t, cycle) : c.Duty;
            if (duty > 0)
            {
                Phase(circuit, ref s, t, duty * cycle, CoilPath.Switch, sums);
            }

            if (duty < 1)
            {
                Off(circuit, ref s, t + duty * cycle, (1 - duty) * cycle, sums);
            }
        }
    }

    /// <summary>The switch opens where the ramp of the cycle times the reservoir's voltage of that very moment meets the setting.</summary>
    private static double FedForward(in CombinedCase c, in CombinedCircuit circuit, in CombinedState s, double t, double cycle)
    {
        var duty = Math.Clamp(c.FeedForward / s.Bus, 0, 1);
        for (var i = 0; i < 3; i++)
        {
            var end = circuit.Step(s, t, duty * cycle, CoilPath.Switch);
            duty = end.Bus > 0 ? Math.Clamp(c.FeedForward / end.Bus, 0, 1) : 1;
        }

        return duty;
    }

    private static void Phase(in CombinedCircuit circuit, ref CombinedState s, double t, double length, CoilPath path, CombinedSums? sums)
    {
        var h = length / StepsOfSwitch;
        for (var i = 0; i < StepsOfSwitch; i++)
        {
            var next = circuit.Step(s, t + i * h, h, path);
            sums?.Add(s, next, t + i * h, h, path);
            s = next;
        }
    }

    /// <summary>Through the diode, and at rest from where the coil current has come to nothing.</summary>
    private static void Off(in CombinedCircuit circuit, ref CombinedState s, double t, double length, CombinedSums? sums)
    {
        var h = length / StepsOfSwitch;
        for (var i = 0; i < StepsOfSwitch; i++)
        {
            var path = s.Coil > 0 ? CoilPath.Diode : CoilPath.Rests;
            var next = circuit.Step(s, t + i * h, h, path);
            if (path == CoilPath.Diode && next.Coil < 0)
            {
                var part = h * s.Coil / (s.Coil - next.Coil);
                var zero = circuit.Step(s, t + i * h, part, path);
                zero.Coil = 0;
                sums?.Add(s, zero, t + i * h, part, path);
                next = circuit.Step(zero, t + i * h + part, h - part, CoilPath.Rests);
                sums?.Add(zero, next, t + i * h + part, h - part, CoilPath.Rests);
            }
            else
            {
                sums?.Add(s, next, t + i * h, h, path);
            }

            s = next;
        }
    }
}
