namespace Selector.Engine.Circuits.Mains;

/// <summary>
/// Periodic steady state of a rectifier with capacitor input: conduction edges located, closed form between them, and the fixed
/// point of the map from pulse to pulse found by the secant.
/// </summary>
public static class RectifierSolver
{
    private const double ChargedStart = 0.85;
    private const double Tolerance = 1e-9;
    private const int PlainCycles = 4_000;

    /// <summary>Charge into the reservoir that may be missing, as a share, before a solution is no solution.</summary>
    private const double Unbalanced = 1e-3;

    /// <summary>
    /// Solves a case. BadInput outside the ranges that <see cref="RectifierCase"/> states, where the two halves of a centre tap would
    /// conduct together for want of any pause, or where the current rings to zero within a half-wave; NoOperatingPoint when the source cannot carry the load.
    /// </summary>
    /// <param name="c">The case.</param>
    /// <param name="budget">Bound on cycles of the secant, and the caller's wish.</param>
    /// <param name="solution">Finite when solved.</param>
    public static SolveStatus Solve(in RectifierCase c, in Budget budget, out RectifierSolution solution) =>
        Solve(c, budget, new RectifierStart(double.NaN, double.NaN), RectifierDetail.All, out solution);

    /// <summary>The same, from a neighbouring solution and in the detail that is needed; both save work and change nothing else.</summary>
    public static SolveStatus Solve(
        in RectifierCase c, in Budget budget, in RectifierStart from, RectifierDetail detail, out RectifierSolution solution)
    {
        solution = default;
        if (!c.IsInRange)
        {
            return SolveStatus.BadInput;
        }

        var path = new ChargingPath(c);
        var top = path.Peak - path.Drop;
        if (c.LoadKind != LoadKind.Resistance && c.Load == 0)
        {
            solution = RectifierFigures.Unloaded(path, c.Arrangement);
            return SolveStatus.Solved;
        }

        if (top <= 0)
        {
            return SolveStatus.NoOperatingPoint;
        }

        Span<ChargingPiece> pieces = stackalloc ChargingPiece[PulseTrain.MostPieces];
        var train = new PulseTrain(path, pieces);
        var start = from.Voltage > 0 && from.Voltage < top ? from : new RectifierStart(ChargedStart * top, double.NaN);
        var status = Find(ref train, path, start, top, budget, out var slope);
        if (status != SolveStatus.Solved)
        {
            return status;
        }

        if (train.RunsOn && c.Arrangement == RectifierArrangement.CentreTap && path.Inductance > 0)
        {
            return SolveStatus.BadInput;
        }

        solution = RectifierFigures.Of(c, path, train, pieces, detail);
        solution.Next = new RectifierStart(train.NextVoltage, slope);
        if (!solution.IsFinite || (detail == RectifierDetail.All && c.LoadKind == LoadKind.Power && solution.BusMin <= path.Collapsed))
        {
            return SolveStatus.NoOperatingPoint;
        }

        // Leakage and a small reservoir can ring the current to zero more than once in a half-wave. That is no supply, and this
        // model has one pulse: the charge that then fails to balance gives it away.
        var charge = solution.DiodeAverage * (path.PulsesPerPeriod == 2 ? 2 : 1);
        return Math.Abs(charge - solution.LoadMean) <= Unbalanced * Math.Abs(solution.LoadMean) ? SolveStatus.Solved : SolveStatus.BadInput;
    }

    private static SolveStatus Find(
        ref PulseTrain train, in ChargingPath path, in RectifierStart start, double top, in Budget budget, out double slope)
    {
        var (x, before, errorBefore) = (start.Voltage, double.NaN, double.NaN);
        slope = start.Slope;
        for (var i = 0; i < budget.Iterations; i++)
        {
            if (budget.Cancel.IsCancellationRequested)
            {
                return SolveStatus.Cancelled;
            }

            if (!Cycle(ref train, x))
            {
                return Plainly(ref train, path, ChargedStart * top, budget);
            }

            if (train.RunsOn)
            {
                return Plainly(ref train, path, x, budget);
            }

            var error = train.NextVoltage - x;
            if (Math.Abs(error) <= Tolerance * top)
            {
                return SolveStatus.Solved;
            }

            // The map is concave: a secant from above the fixed point cannot fall below it. Anything else goes one plain cycle on.
            slope = double.IsNaN(before) ? slope : (error - errorBefore) / (x - before);
            var next = slope < -1e-9 ? x - error / slope : train.NextVoltage;
            (before, errorBefore) = (x, error);
            x = next > 0.3 * x && next < top ? next : train.NextVoltage;
        }

        return SolveStatus.OutOfBudget;
    }

    /// <summary>
    /// Cycle by cycle as the circuit itself would: for pulses that run on into each other, whose state is not one number, and to
    /// tell a collapse from a step too far.
    /// </summary>
    private static SolveStatus Plainly(ref PulseTrain train, in ChargingPath path, double u, in Budget budget)
    {
        var start = train.NaturalStart(u);
        for (var i = 0; i < PlainCycles; i++)
        {
            if (budget.Cancel.IsCancellationRequested)
            {
                return SolveStatus.Cancelled;
            }

            if (double.IsNaN(start) || !train.Run(start, u))
            {
                return SolveStatus.NoOperatingPoint;
            }

            if (Math.Abs(train.NextVoltage - u) <= Tolerance * path.Peak && Math.Abs(train.NextStart - start) <= Tolerance * path.Cycle)
            {
                return SolveStatus.Solved;
            }

            (start, u) = (train.NextStart, train.NextVoltage);
        }

        return SolveStatus.OutOfBudget;
    }

    private static bool Cycle(ref PulseTrain train, double u) => train.NaturalStart(u) is var start && !double.IsNaN(start) && train.Run(start, u);
}
