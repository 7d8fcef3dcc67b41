using System.Collections.Immutable;
using Selector.Engine.Circuits;
using Selector.Engine.Corners;
using Selector.Engine.Derating;
using Selector.Engine.Supplies;

namespace Selector.Engine.Ranking;

/// <summary>
/// Looks at a trial at the corners of the supply as it is fitted now. Each is a legitimate condition, so the worst margin found
/// there is an upper bound of the trial's margin: a trial that lacks here lacks, whatever its own corners are.
/// </summary>
internal sealed class Screen
{
    /// <summary>A trial that lacks by this much is not looked at further.</summary>
    private const double Hopeless = -0.5;

    /// <summary>Stresses at other positions that a trial can move and that are searched for with it: only the tightest decides.</summary>
    private const int TightestElsewhere = 4;

    private readonly SupplyModel _model;
    private readonly Policy _policy;
    private readonly string _position;
    private readonly int _ordinal;
    private readonly (double[] Axes, int[] OnDemand)[] _corners;

    public Screen(SupplyModel model, Ledger now, Policy policy, string position)
    {
        _model = model;
        _policy = policy;
        _position = position;
        _ordinal = model.PositionOrdinal(position);
        var places = model.Stresses.Select((r, i) => (r, i)).ToDictionary(x => x.r.Spec.Id, x => x.i, StringComparer.Ordinal);
        _corners =
        [
            .. now.Rows
                .Where(r => r.At.Count == model.Axes.Length)
                .OrderByDescending(r => r.Position == position)
                .GroupBy(r => string.Join('|', r.At.Values.Select(v => v.ToString("R", System.Globalization.CultureInfo.InvariantCulture))))
                .Select(g => (
                    model.Axes.Select(a => g.First().At[a.Id]).ToArray(),
                    g.Select(r => places[r.Id]).Where(i => model.Stages[model.Stresses[i].Stage].OnDemand).ToArray())),
        ];
    }

    /// <summary>What the screen found.</summary>
    /// <param name="Pool">The conditions that it solved, for the search that follows.</param>
    /// <param name="Margin">Upper bound of the trial's own margin; null when no own stress can be judged.</param>
    /// <param name="Stress">The stress that sets it.</param>
    /// <param name="Focus">Stresses worth a search: the trial's own, and the tightest elsewhere.</param>
    public sealed record Finding(ConditionPool Pool, double? Margin, StressSpec? Stress, IReadOnlySet<int> Focus);

    /// <summary>Looks at a trial.</summary>
    public Finding Look(ImmutableSortedDictionary<string, Fitting> fittings, CancellationToken cancel)
    {
        var pool = new ConditionPool(_model, new SupplySolver(_model, fittings), Budget.Until(cancel));
        var margins = new double[_model.Stresses.Length];
        Array.Fill(margins, double.PositiveInfinity);
        Severity[] severities =
        [
            .. _model.Stresses.Select((s, i) => new Severity(_model, i, fittings.GetValueOrDefault(s.Spec.Position), _policy)),
        ];
        var worst = -1;
        var fails = false;
        foreach (var (axes, onDemand) in _corners)
        {
            var at = pool.At(axes);
            fails |= !at.Solved;
            foreach (var stress in onDemand)
            {
                pool.At(axes, stress);
            }

            for (var i = 0; at.Solved && i < margins.Length; i++)
            {
                if (severities[i].Allowed(at) is var allowed && !double.IsNaN(allowed))
                {
                    margins[i] = Math.Min(margins[i], 1 - severities[i].Of(at, allowed));
                    worst = IsOwn(i) && (worst < 0 || margins[i] < margins[worst]) ? i : worst;
                }
            }

            if (worst >= 0 && margins[worst] < Hopeless)
            {
                break;
            }
        }

        // Where the supply has no solution with a trial, every stress that it moves is looked at: each may be the one without.
        var tightest = Enumerable.Range(0, margins.Length).Where(i => !IsOwn(i) && IsMoved(i)).OrderBy(i => margins[i])
            .Take(fails ? int.MaxValue : TightestElsewhere);
        var focus = Enumerable.Range(0, margins.Length).Where(IsOwn).Concat(tightest).ToHashSet();
        return new Finding(pool, worst < 0 ? null : margins[worst], worst < 0 ? null : _model.Stresses[worst].Spec, focus);
    }

    /// <summary>Whether the value of a stress elsewhere rests on any rating of the position's part.</summary>
    private bool IsMoved(int stress) => _model.Directions.RatingsOf(stress).Any(r => r.Position == _ordinal);

    private bool IsOwn(int stress) => _model.Stresses[stress].Spec.Position == _position;
}
