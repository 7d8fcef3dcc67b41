using System.Collections.Immutable;
using Selector.Engine.Circuits;
using Selector.Engine.Corners;
using Selector.Engine.Derating;
using Selector.Engine.Quantities;

namespace Selector.Engine.Supplies;

/// <summary>Turns the worst condition of one stress into its row of the ledger: verdict, margins, corner in words.</summary>
internal sealed class RowMaker(
    SupplyModel model, CornerSearch search, IReadOnlyDictionary<string, Fitting> fittings, Severity severity, int stress)
{
    private StressSpec Spec => model.Stresses[stress].Spec;

    public LedgerRow Make(Condition? worst, Condition? failed)
    {
        var bare = new LedgerRow
        {
            Position = Spec.Position,
            Kind = Spec.Kind,
            Name = Spec.Name,
            Spec = Spec,
            Verdict = Verdict.NotUsable,
            Clause = severity.Clause,
            Axes = Findings(),
        };
        if (failed is not null || worst is null)
        {
            return bare with
            {
                Corner = failed is null ? "" : AllAxes(failed),
                At = failed is null ? bare.At : Axes(failed),
                Reason = Say(failed?.Status ?? SolveStatus.NoOperatingPoint),
            };
        }

        var solved = bare with
        {
            Stress = worst.Stresses[stress],
            Corner = Words(worst),
            At = Axes(worst),
            Rating = double.IsNaN(severity.Rating) ? null : severity.Rating,
        };
        return Judge(solved, worst);
    }

    private LedgerRow Judge(LedgerRow row, Condition worst)
    {
        if (MissingForValue() is { Length: > 0 } missing)
        {
            return row with { Verdict = Verdict.NotRated, Stress = null, Reason = "needs " + missing };
        }

        var fitted = fittings.ContainsKey(Spec.Position);
        if (Spec.Bound is Bound.Rating && severity.Clause is null)
        {
            return row with { Verdict = Verdict.NotCovered, Reason = "the policy has no clause for it" };
        }

        row = row with { LeastRating = LeastRating(row.Stress!.Value, worst) };
        if (!fitted && Spec.Bound is not Bound.Required)
        {
            return row with { Verdict = Verdict.NoPart, Reason = "no part fitted" };
        }

        if (double.IsNaN(severity.Rating))
        {
            return row with { Verdict = Verdict.NotRated, Reason = "needs " + severity.RatingSpec!.Name };
        }

        if (severity.MissingOfCurve is { } curve)
        {
            return row with { Verdict = Verdict.NotRated, Reason = "needs " + severity.Part!.Family.Rating(curve).Name };
        }

        return WithMargin(row, worst, fitted);
    }

    private LedgerRow WithMargin(LedgerRow row, Condition worst, bool fitted)
    {
        var allowed = severity.Allowed(worst);
        var margin = 1 - severity.Of(worst, allowed);
        var underated = 1 - severity.Of(worst, severity.RatingAt(worst));
        row = row with
        {
            Allowed = allowed,
            Margin = double.IsFinite(margin) ? margin : null,
            MarginUnderated = double.IsFinite(underated) ? underated : null,
            KelvinLeft = Spec.Side == Side.Temperature ? allowed - row.Stress : null,
        };
        if (Partial() is { Length: > 0 } partial)
        {
            return row with { Verdict = Verdict.NotRated, Margin = null, MarginUnderated = null, KelvinLeft = null, Reason = partial };
        }

        if (row.Margin is null)
        {
            return fitted
                ? row with { Verdict = Verdict.NotUsable, Reason = "nothing is allowed under these conditions" }
                : row with { Verdict = Verdict.NoPart, Reason = "no part fitted" };
        }

        if (Spec.Side == Side.Ceiling && row.Stress <= 0)
        {
            return row with { Verdict = fitted ? Verdict.NoDemand : Verdict.NoPart, Margin = null, MarginUnderated = null };
        }

        if (Spec.IsMatch && row.Margin >= 0)
        {
            return row with { Verdict = fitted ? Verdict.Holds : Verdict.NoPart, Margin = null, MarginUnderated = null };
        }

        return row with { Verdict = !fitted ? Verdict.NoPart : row.Margin >= 0 ? Verdict.Holds : Verdict.Lacks };
    }

    private double? LeastRating(double value, Condition worst)
    {
        if (Spec.Side == Side.Floor || Spec.Bound is Bound.Required)
        {
            return null;
        }

        var least = severity.Clause is null ? value : severity.Clause.Operator.LeastRating(value, severity.Temperature(worst));
        return least is { } l && double.IsFinite(l) ? l : null;
    }

    /// <summary>Ratings that the value rests on and a fitted part does not give, in words.</summary>
    private string MissingForValue()
    {
        var missing = new List<string>();
        foreach (var (p, c) in model.Directions.RatingsOf(stress).Order())
        {
            var position = model.Positions[p];
            if (fittings.GetValueOrDefault(position.Id) is { } fitting
                && double.IsNaN(fitting.Part.Ratings[c])
                && !HasFallback(p, c))
            {
                missing.Add($"{fitting.Part.Family.Ratings[c].Name} of {position.Id}");
            }
        }

        return string.Join(", ", missing);
    }

    private bool HasFallback(int position, int column)
    {
        for (var stage = 0; stage < model.Stages.Length; stage++)
        {
            foreach (var source in model.Wiring.Inputs(stage))
            {
                if (source.Kind == InputKind.Column && source.Index == position && source.Column == column && double.IsNaN(source.Fallback))
                {
                    return false;
                }
            }
        }

        return true;
    }

    /// <summary>What the stage had to leave out of the value for want of data.</summary>
    private string Partial() => string.Join(", ", Spec.Needs
        .Where(n => fittings.TryGetValue(n.Position, out var f) && n.IsMissing(f.Part))
        .Select(n => $"needs {model.Registry.Family(model.Positions[model.PositionOrdinal(n.Position)].Family).Rating(n.Key).Name} of {n.Position} ({n.Without})"));

    private ImmutableArray<AxisFinding> Findings()
    {
        if (!Spec.Profile.IsEmpty)
        {
            return [];
        }

        var spec = model.Stages[model.Stresses[stress].Stage];
        return
        [
            .. Enumerable.Range(0, model.Axes.Length)
                .Select(a => (Axis: model.Axes[a], Push: search.Toward(stress, a, severity)))
                .Where(x => x.Push != Push.None && !x.Axis.IsFixed)
                .Select(x => new AxisFinding(x.Axis.Id, x.Push, x.Push == Push.Unproven ? "searched" : Proof(x.Axis.Id))),
        ];

        string Proof(string axis) => Spec.On.FirstOrDefault(d => d.Input == InputId.Axis(axis))?.Proof
            ?? "by way of " + string.Join(", ", Spec.On.Where(d => d.Input.Kind == InputKind.Link && d.Push is Push.Rises or Push.Falls).Select(d => d.Proof).Distinct(StringComparer.Ordinal));
    }

    private string Words(Condition at)
    {
        if (!Spec.Profile.IsEmpty)
        {
            return string.Join("; ", Spec.Profile.Select(p => string.Join(", ", p.Axes.Select(a => model.Axes.First(x => x.Id == a.Key).Words(a.Value)).Prepend(QuantityWriter.Write(p.Share, Units.Percent) + " of the time"))));
        }

        // A shorted output has no load to speak of.
        var shorted = Enumerable.Range(0, model.Axes.Length).Any(a => model.Axes[a].Id == CommonFields.ShortAxis && at.Axes[a] > 0.5);
        return string.Join(", ", Enumerable.Range(0, model.Axes.Length)
            .Where(a => search.Speaks(stress, a, severity, at) && !(shorted && model.Axes[a].Id == CommonFields.LoadAxis))
            .Select(a => model.Axes[a].Words(at.Axes[a]))
            .Where(w => w.Length > 0));
    }

    private string AllAxes(Condition at) => string.Join(", ", Enumerable.Range(0, model.Axes.Length)
        .Where(a => !model.Axes[a].IsFixed)
        .Select(a => model.Axes[a].Words(at.Axes[a]))
        .Where(w => w.Length > 0));

    private ImmutableSortedDictionary<string, double> Axes(Condition at) => Enumerable.Range(0, model.Axes.Length)
        .ToImmutableSortedDictionary(a => model.Axes[a].Id, a => at.Axes[a], StringComparer.Ordinal);

    private static string Say(SolveStatus status) => status switch
    {
        SolveStatus.NoOperatingPoint => "no operating point: the source cannot give what is asked",
        SolveStatus.ThermalRunaway => "thermal runaway: the loss grows faster than the cooling carries away",
        SolveStatus.OutOfBudget => "no solution within the bound on work",
        _ => "the data of the fitted parts are outside what the model covers",
    };
}
