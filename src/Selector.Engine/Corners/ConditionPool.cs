using Selector.Engine.Circuits;
using Selector.Engine.Supplies;

namespace Selector.Engine.Corners;

/// <summary>
/// Every condition that was solved for one supply, each once. All stresses share it: a condition that was solved for one is a
/// legitimate corner for all, so the stated corner of a stress is never milder than anything that was looked at.
/// </summary>
public sealed class ConditionPool
{
    private readonly SupplyModel _model;
    private readonly SupplySolver _solver;
    private readonly Budget _budget;
    private readonly Dictionary<double[], Condition> _solved = new(new SameAxes());
    private readonly double[] _weights;

    public ConditionPool(SupplyModel model, SupplySolver solver, in Budget budget)
    {
        _model = model;
        _solver = solver;
        _budget = budget;
        _weights = [.. model.Axes.Select(a => a.IsFixed ? 0 : (a.EndsOnly ? 20 : a.Probes > 1 ? 4 : 1) / a.Range.Width)];
    }

    public IEnumerable<Condition> All => _solved.Values;

    public int Count => _solved.Count;

    /// <summary>A condition that was solved already; null when it was not.</summary>
    public Condition? Known(double[] axes) => _solved.GetValueOrDefault(axes);

    /// <summary>Solves at these axes, or recalls it.</summary>
    /// <param name="axes">A value for every axis.</param>
    /// <exception cref="OperationCanceledException">The caller no longer wants the answer.</exception>
    public Condition At(double[] axes)
    {
        if (_solved.TryGetValue(axes, out var known))
        {
            return known;
        }

        var links = new double[_model.Links.Length];
        if (Nearest(axes) is { } near)
        {
            near.Links.CopyTo(links, 0);
        }
        else
        {
            _solver.Start(links);
        }

        var stresses = new double[_model.Stresses.Length];
        var status = _solver.Solve(axes, links, stresses, _budget);
        if (status == SolveStatus.Cancelled)
        {
            throw new OperationCanceledException(_budget.Cancel);
        }

        var condition = new Condition((double[])axes.Clone(), status, links, stresses);
        _solved.Add(condition.Axes, condition);
        return condition;
    }

    /// <summary>The same with a stress of a stage that is solved on demand only, and all of that stage, filled in.</summary>
    /// <exception cref="OperationCanceledException">The caller no longer wants the answer.</exception>
    public Condition At(double[] axes, int stress)
    {
        var condition = At(axes);
        var stage = _model.Stresses[stress].Stage;
        if (condition.Solved && _model.Stages[stage].OnDemand && double.IsNaN(condition.Stresses[stress])
            && _solver.Fill(stage, condition.Axes, condition.Links, condition.Stresses, _budget) == SolveStatus.Cancelled)
        {
            throw new OperationCanceledException(_budget.Cancel);
        }

        return condition;
    }

    /// <summary>The solved condition whose loops are likely to stand closest: an axis that switches the circuit counts most.</summary>
    private Condition? Nearest(double[] axes)
    {
        Condition? nearest = null;
        var least = double.PositiveInfinity;
        foreach (var c in _solved.Values)
        {
            var distance = 0.0;
            for (var a = 0; a < axes.Length && distance < least; a++)
            {
                distance += _weights[a] * Math.Abs(axes[a] - c.Axes[a]);
            }

            if (distance < least && c.Solved)
            {
                (nearest, least) = (c, distance);
            }
        }

        return nearest;
    }

    private sealed class SameAxes : IEqualityComparer<double[]>
    {
        public bool Equals(double[]? x, double[]? y) => x.AsSpan().SequenceEqual(y);

        public int GetHashCode(double[] axes)
        {
            var hash = new HashCode();
            foreach (var a in axes)
            {
                hash.Add(a);
            }

            return hash.ToHashCode();
        }
    }
}
