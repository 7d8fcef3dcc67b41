using Selector.Engine.Circuits;
using Selector.Engine.Supplies;

namespace Selector.Engine.Corners;

/// <summary>
/// Finds the worst condition of every stress. Axes with a proven direction stand at their end; the others are searched, axis by
/// axis, at both ends and inside, until no axis makes it worse.
/// </summary>
public sealed class CornerSearch
{
    private const int MostRounds = 4;
    private const double GoldenShare = 0.3819660112501051;
    private const double Worth = 1e-7;
    private const int MostSections = 16;

    /// <summary>A flat top is found to its square: a thousandth of the range leaves less than a millionth of the height.</summary>
    private const double SectionEnd = 1e-3;

    /// <summary>Step inwards, as a share of the range, that tells whether an end is a maximum.</summary>
    private const double EndStep = 1e-3;

    /// <summary>Relative difference below which two corners are equally bad.</summary>
    private const double Tie = 1e-7;

    /// <summary>Relative change from end to end below which an axis is not searched further: a tenth of what the corner is stated to.</summary>
    private const double Asleep = 1e-5;

    /// <summary>Relative change below which an axis is not mentioned in words.</summary>
    private const double Felt = 1e-3;

    private readonly SupplyModel _model;
    private readonly ConditionPool _pool;

    public CornerSearch(SupplyModel model, ConditionPool pool)
    {
        _model = model;
        _pool = pool;
    }

    /// <summary>The worst condition per stress; null where no condition could be solved.</summary>
    /// <param name="severities">One per stress of the model.</param>
    /// <param name="failed">Per stress, a condition at its corner that has no solution; null when there is none.</param>
    public Condition?[] Worst(IReadOnlyList<Severity> severities, out Condition?[] failed)
    {
        var stresses = _model.Stresses.Length;
        failed = new Condition?[stresses];
        for (var s = 0; s < stresses; s++)
        {
            foreach (var searchedHigh in (ReadOnlySpan<bool>)[false, true])
            {
                var start = _pool.At(Vertex(s, severities[s], searchedHigh));
                if (!start.Solved)
                {
                    failed[s] = start;
                }
            }
        }

        var worst = new Condition?[stresses];
        for (var s = 0; s < stresses; s++)
        {
            worst[s] = Climb(s, severities[s]);
        }

        // What one stress's climb uncovered may be worse for another than its own climb's end; a tie keeps the own corner.
        for (var s = 0; s < stresses; s++)
        {
            if (worst[s] is { } own && WorstOfPool(severities[s]) is { } found
                && severities[s].Of(found) > severities[s].Of(own) + Tie * Math.Abs(severities[s].Of(own)))
            {
                worst[s] = found;
            }
        }

        return worst;
    }

    /// <summary>Direction in which severity grows with an axis: the stress's own, joined with that of what is allowed.</summary>
    public Push Toward(int stress, int axis, Severity severity)
    {
        var push = _model.Directions.OfStress(stress, axis);
        if (_model.Stresses[stress].Spec.Side == Side.Floor)
        {
            push = Directions.Then(push, Push.Falls);
        }

        return axis == _model.AmbientAxis && severity.FallsWithTemperature
            ? Directions.Join(push, Push.Rises)
            : push;
    }

    /// <summary>
    /// Whether an axis is worth a word at a corner: it bears on the stress, and nothing that was solved shows that moving it to
    /// its other end leaves the stress as it is.
    /// </summary>
    public bool Speaks(int stress, int axis, Severity severity, Condition at)
    {
        var spec = _model.Axes[axis];
        if (spec.IsFixed || Toward(stress, axis, severity) == Push.None)
        {
            return false;
        }

        var other = (double[])at.Axes.Clone();
        other[axis] = at.Axes[axis] > spec.Range.Low ? spec.Range.Low : spec.Range.High;
        return _pool.Known(other) is not { Solved: true } moved
            || Math.Abs(severity.Of(moved) - severity.Of(at)) > Felt * Math.Abs(severity.Of(at));
    }

    private double[] Vertex(int stress, Severity severity, bool searchedHigh)
    {
        var axes = new double[_model.Axes.Length];
        for (var a = 0; a < axes.Length; a++)
        {
            var axis = _model.Axes[a];
            axes[a] = Toward(stress, a, severity) switch
            {
                Push.Rises => axis.Range.High,
                Push.Falls => axis.Range.Low,
                Push.Unproven => searchedHigh ? axis.Range.High : axis.Range.Low,
                _ => axis.Nominal,
            };
        }

        return axes;
    }

    private Condition? Climb(int stress, Severity severity)
    {
        if (Start(stress, severity) is not { } best)
        {
            return null;
        }

        Span<bool> asleep = stackalloc bool[_model.Axes.Length];
        for (var round = 0; round < MostRounds; round++)
        {
            var before = severity.Of(best);
            for (var a = 0; a < _model.Axes.Length; a++)
            {
                best = Toward(stress, a, severity) switch
                {
                    Push.Rises => Worse(best, Moved(best, a, _model.Axes[a].Range.High), severity),
                    Push.Falls => Worse(best, Moved(best, a, _model.Axes[a].Range.Low), severity),
                    Push.Unproven when !asleep[a] => Along(best, a, severity, round, out asleep[a]),
                    _ => best,
                };
            }

            if (!(severity.Of(best) > before + Worth * Math.Abs(before)))
            {
                break;
            }
        }

        return best;
    }

    /// <summary>The worse of the stress's own two vertices, or whatever in the pool is worse than both.</summary>
    private Condition? Start(int stress, Severity severity)
    {
        var (low, high) = (_pool.At(Vertex(stress, severity, false)), _pool.At(Vertex(stress, severity, true)));
        var own = !low.Solved ? high : !high.Solved || severity.Of(low) >= severity.Of(high) ? low : high;
        var found = WorstOfPool(severity);
        return own.Solved && (found is null || severity.Of(found) <= severity.Of(own) + Tie * Math.Abs(severity.Of(own))) ? own : found;
    }

    /// <summary>The worst point of one searched axis through a condition.</summary>
    /// <param name="asleep">From end to end the stress hardly moves: later rounds need not ask again.</param>
    private Condition Along(Condition through, int a, Severity severity, int round, out bool asleep)
    {
        var axis = _model.Axes[a];
        asleep = axis.IsFixed;
        if (axis.IsFixed)
        {
            return through;
        }

        var (low, high) = (Moved(through, a, axis.Range.Low), Moved(through, a, axis.Range.High));
        var best = Worse(Worse(through, low, severity), high, severity);
        if (low.Solved && high.Solved)
        {
            var level = Math.Abs(severity.Of(best));
            asleep = severity.Of(best) - Math.Min(severity.Of(low), severity.Of(high)) <= Asleep * level;
        }

        if (asleep || axis.EndsOnly || round > 1)
        {
            return best;
        }

        for (var probe = 1; probe <= axis.Probes; probe++)
        {
            best = Worse(best, Moved(through, a, axis.Range.At(probe / (axis.Probes + 1.0))), severity);
        }

        return axis.Probes > 0 && RisesInwards(best, a, severity) ? Inside(best, a, severity) : best;
    }

    /// <summary>Whether the worst point so far is inside already, or stands at an end from which severity grows inwards.</summary>
    private bool RisesInwards(Condition best, int a, Severity severity)
    {
        var range = _model.Axes[a].Range;
        if (best.Axes[a] > range.Low && best.Axes[a] < range.High)
        {
            return true;
        }

        var step = range.Width * (best.Axes[a] <= range.Low ? EndStep : -EndStep);
        return Worse(best, Moved(best, a, best.Axes[a] + step), severity) != best;
    }

    /// <summary>A maximum between two ends, closed in on by the golden section.</summary>
    private Condition Inside(Condition through, int a, Severity severity)
    {
        var axis = _model.Axes[a];
        var step = axis.Range.Width / (axis.Probes + 1.0);
        var (low, high) = (Math.Max(axis.Range.Low, through.Axes[a] - step), Math.Min(axis.Range.High, through.Axes[a] + step));
        var best = through;
        for (var i = 0; i < MostSections && high - low > SectionEnd * axis.Range.Width; i++)
        {
            var left = Moved(through, a, low + GoldenShare * (high - low));
            var right = Moved(through, a, high - GoldenShare * (high - low));
            best = Worse(Worse(best, left, severity), right, severity);
            if (left.Solved && (!right.Solved || severity.Of(left) > severity.Of(right)))
            {
                high = right.Axes[a];
            }
            else
            {
                low = left.Axes[a];
            }
        }

        return best;
    }

    private Condition Moved(Condition from, int axis, double value)
    {
        if (from.Axes[axis] == value)
        {
            return from;
        }

        var axes = (double[])from.Axes.Clone();
        axes[axis] = value;
        return _pool.At(axes);
    }

    private static Condition Worse(Condition best, Condition other, Severity severity) =>
        other.Solved && severity.Of(other) > severity.Of(best) ? other : best;

    private Condition? WorstOfPool(Severity severity)
    {
        Condition? worst = null;
        foreach (var c in _pool.All)
        {
            if (c.Solved && (worst is null || severity.Of(c) > severity.Of(worst)))
            {
                worst = c;
            }
        }

        return worst;
    }
}
