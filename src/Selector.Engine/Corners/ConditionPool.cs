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
    private double[]? _lastLinks;

    public ConditionPool(SupplyModel model, SupplySolver solver, in Budget budget)
    {
        _model = model;
        _solver = solver;
        _budget = budget;
    }

    public IEnumerable<Condition> All => _solved.Values;

    public int Count => _solved.Count;

    /// <summary>A condition that was solved already; null when it was not.</summary>
    public Condition? Known(double[] axes) => _solved.GetValueOrDefault(axes);

    /// <summary>Solves at these axes, or recalls it.</summary>
    /// <exception cref="OperationCanceledException">The caller no longer wants the answer.</exception>
    public Condition At(double[] axes)
    {
        if (_solved.TryGetValue(axes, out var known))
        {
            return known;
        }

        var links = new double[_model.Links.Length];
        if (_lastLinks is null)
        {
            _solver.Start(links);
        }
        else
        {
            _lastLinks.CopyTo(links, 0);
        }

        var stresses = new double[_model.Stresses.Length];
        var status = _solver.Solve(axes, links, stresses, _budget);
        if (status == SolveStatus.Cancelled)
        {
            throw new OperationCanceledException(_budget.Cancel);
        }

        if (status == SolveStatus.Solved)
        {
            _lastLinks = links;
        }

        var condition = new Condition((double[])axes.Clone(), status, links, stresses);
        _solved.Add(condition.Axes, condition);
        return condition;
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
