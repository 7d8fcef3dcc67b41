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
    private const double Worth = 1e-6;
    private const int MostSections = 18;

    /// <summary>Times that a seeming top is doubted.</summary>
    private const int MostCuts = 2;


    /// <summary>A flat top is found to its square: a thousandth of the range leaves less than a millionth of the height.</summary>
    private const double SectionEnd = 1e-3;

    /// <summary>Step inwards, as a share of the range, that tells whether an end is a maximum.</summary>
    private const double EndStep = 2e-3;

    /// <summary>Relative difference below which two corners are equally bad.</summary>
    private const double Tie = 1e-6;

    /// <summary>Relative change from end to end below which an axis is not searched further: a tenth of what the corner is stated to.</summary>
    private const double Asleep = 2e-5;

    /// <summary>Share of what is allowed below which a stress decides nothing: its own two vertices are corner enough.</summary>
    private const double Slight = 0.03;

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
    public Condition?[] Worst(IReadOnlyList<Severity> severities, out Condition?[] failed) => Worst(severities, null, out failed);

    /// <summary>
    /// The same with the whole search only for some stresses; the others get the worst of what was solved for those, which is a
    /// corner, but perhaps not their own worst.
    /// </summary>
    /// <param name="severities">One per stress of the model.</param>
    /// <param name="focus">Places of the stresses to search for; null for all.</param>
    /// <param name="failed">As above.</param>
    public Condition?[] Worst(IReadOnlyList<Severity> severities, IReadOnlySet<int>? focus, out Condition?[] failed)
    {
        var stresses = _model.Stresses.Length;
        failed = new Condition?[stresses];
        for (var s = 0; s < stresses; s++)
        {
            if (focus?.Contains(s) == false || IsProfile(s))
            {
                continue;
            }

            foreach (var searchedHigh in (ReadOnlySpan<bool>)[false, true])
            {
                var start = At(s, Vertex(s, severities[s], searchedHigh));
                if (!start.Solved)
                {
                    failed[s] = start;
                }
            }
        }

        var worst = new Condition?[stresses];
        for (var s = 0; s < stresses; s++)
        {
            worst[s] = IsProfile(s) ? OverProfile(s) : focus?.Contains(s) == false ? null : Climb(s, severities[s]);
        }

        // What one stress's climb uncovered may be worse for another than its own climb's end; a tie keeps the own corner.
        for (var s = 0; s < stresses; s++)
        {
            if (IsProfile(s))
            {
                continue;
            }

            var found = WorstOfPool(severities[s]);
            if (worst[s] is not { } own
                || (found is not null && severities[s].Of(found) > severities[s].Of(own) + Tie * Math.Abs(severities[s].Of(own))))
            {
                worst[s] = found;
            }

            if (worst[s] is { } none && double.IsNegativeInfinity(severities[s].Of(none)))
            {
                failed[s] ??= none with { Status = SolveStatus.BadInput };
                worst[s] = null;
            }
        }

        return worst;
    }

    private bool IsProfile(int stress) => !_model.Stresses[stress].Spec.Profile.IsEmpty;

    /// <summary>
    /// The harmonic mean of a stress over the conditions of its profile, as a condition of its own; null when one of them has no
    /// solution.
    /// </summary>
    private Condition? OverProfile(int stress)
    {
        var sum = 0.0;
        Condition? last = null;
        foreach (var point in _model.Stresses[stress].Spec.Profile)
        {
            var at = At(stress, [.. _model.Axes.Select(a => point.Axes.TryGetValue(a.Id, out var value) ? value : a.Nominal)]);
            if (!at.Solved)
            {
                return null;
            }

            // What has no life at one of them has none at all.
            sum += at.Stresses[stress] > 0 ? point.Share / at.Stresses[stress] : double.PositiveInfinity;
            last = at;
        }

        if (last is null)
        {
            return null;
        }

        var stresses = (double[])last.Stresses.Clone();
        stresses[stress] = 1 / sum;
        return last with { Stresses = stresses };
    }

    /// <summary>Direction in which severity grows with an axis: the stress's own, joined with that of what is allowed.</summary>
    public Push Toward(int stress, int axis, Severity severity)
    {
        var push = _model.Directions.OfStress(stress, axis);
        if (_model.Stresses[stress].Spec.Side == Side.Floor)
        {
            push = Directions.Then(push, Push.Falls);
        }

        return !severity.FallsWithTemperature ? push
            : severity.TemperatureLink >= 0 ? Directions.Join(push, _model.Directions.OfLink(severity.TemperatureLink, axis))
            : axis == _model.AmbientAxis ? Directions.Join(push, Push.Rises)
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

        if (severity.IsBounded(best) && severity.Of(best) < Slight)
        {
            return best;
        }

        Span<bool> asleep = stackalloc bool[_model.Axes.Length];
        for (var round = 0; round < MostRounds; round++)
        {
            var before = severity.Of(best);
            for (var a = 0; a < _model.Axes.Length; a++)
            {
                best = Toward(stress, a, severity) switch
                {
                    Push.Rises => Worse(best, Moved(stress, best, a, _model.Axes[a].Range.High), severity),
                    Push.Falls => Worse(best, Moved(stress, best, a, _model.Axes[a].Range.Low), severity),
                    Push.Unproven when !asleep[a] => Along(stress, best, a, severity, round, out asleep[a]),
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
        var (low, high) = (At(stress, Vertex(stress, severity, false)), At(stress, Vertex(stress, severity, true)));
        var own = !low.Solved ? high : !high.Solved || severity.Of(low) >= severity.Of(high) ? low : high;
        var found = WorstOfPool(severity);
        return own.Solved && (found is null || severity.Of(found) <= severity.Of(own) + Tie * Math.Abs(severity.Of(own))) ? own : found;
    }

    /// <summary>The worst point of one searched axis through a condition.</summary>
    /// <param name="asleep">From end to end the stress hardly moves: later rounds need not ask again.</param>
    private Condition Along(int stress, Condition through, int a, Severity severity, int round, out bool asleep)
    {
        var axis = _model.Axes[a];
        asleep = axis.IsFixed;
        if (axis.IsFixed)
        {
            return through;
        }

        var (low, high) = (Moved(stress, through, a, axis.Range.Low), Moved(stress, through, a, axis.Range.High));
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

        if (axis.Probes == 0)
        {
            return best;
        }

        var step = axis.Range.Width / (axis.Probes + 1.0);
        for (var probe = 1; probe <= axis.Probes; probe++)
        {
            best = Worse(best, Moved(stress, through, a, axis.Range.Low + probe * step), severity);
        }

        return Inside(stress, best, a, step, severity);
    }

    /// <summary>
    /// A maximum between two ends, by parabolas through the worst point and its neighbours. At an end a parabola through the three
    /// points there, or else a small step, tells whether severity grows inwards.
    /// </summary>
    private Condition Inside(int stress, Condition best, int a, double step, Severity severity)
    {
        var range = _model.Axes[a].Range;
        var middle = Math.Clamp(best.Axes[a], range.Low + step, range.High - step);
        var (low, mid, high) = (Moved(stress, best, a, middle - step), Moved(stress, best, a, middle), Moved(stress, best, a, middle + step));
        if (best == low && !(Top(low, mid, high, a, severity) > low.Axes[a]))
        {
            (mid, high) = (Moved(stress, best, a, low.Axes[a] + EndStep * range.Width), mid);
        }
        else if (best == high && !(Top(low, mid, high, a, severity) < high.Axes[a]))
        {
            (low, mid) = (mid, Moved(stress, best, a, high.Axes[a] - EndStep * range.Width));
        }

        best = Worse(best, mid, severity);
        var (cuts, halved) = (0, high.Axes[a] - low.Axes[a]);
        for (var i = 1; i <= MostSections && low.Solved && mid.Solved && high.Solved; i++)
        {
            var (x, left, right) = (mid.Axes[a], mid.Axes[a] - low.Axes[a], high.Axes[a] - mid.Axes[a]);
            var at = Top(low, mid, high, a, severity);
            if (!(at > low.Axes[a] && at < high.Axes[a]))
            {
                break;
            }

            // A smooth top is found to its square; at a kink parabolas creep or stop short, and the wider side is cut instead.
            var flat = Math.Abs(at - x) < SectionEnd * range.Width;
            if (flat && cuts++ == MostCuts)
            {
                break;
            }

            if (flat || (i % 3 == 0 && left + right > halved / 2))
            {
                at = left > right ? x - GoldenShare * left : x + GoldenShare * right;
            }

            halved = i % 3 == 0 ? left + right : halved;
            var found = Moved(stress, best, a, at);
            best = Worse(best, found, severity);
            if (!found.Solved)
            {
                break;
            }

            var (lower, upper) = at < x ? (found, mid) : (mid, found);
            (low, mid, high) = severity.Of(lower) >= severity.Of(upper) ? (low, lower, upper) : (lower, upper, high);
        }

        return best;
    }

    /// <summary>Where the parabola through three points is highest; NaN where it has no top.</summary>
    private static double Top(Condition low, Condition mid, Condition high, int a, Severity severity)
    {
        var (x, y) = (mid.Axes[a], severity.Of(mid));
        var (dl, dh) = (x - low.Axes[a], high.Axes[a] - x);
        var (fl, fh) = ((y - severity.Of(low)) / dl, (severity.Of(high) - y) / dh);
        var bend = (fh - fl) / (dl + dh);
        return bend < 0 ? x - (fl + bend * dl) / (2 * bend) : double.NaN;
    }

    private Condition Moved(int stress, Condition from, int axis, double value)
    {
        if (from.Axes[axis] == value)
        {
            return from;
        }

        var axes = (double[])from.Axes.Clone();
        axes[axis] = value;
        return At(stress, axes);
    }

    private Condition At(int stress, double[] axes) => _pool.At(axes, stress);

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
