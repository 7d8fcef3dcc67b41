using System.Collections.Immutable;
using Selector.Engine.Circuits;
using Selector.Engine.Derating;
using Selector.Engine.Parts;
using Selector.Engine.Supplies;

namespace Selector.Engine.Ranking;

/// <summary>Ranks the parts of a catalogue for one position: each is fitted on trial and the whole supply solved again.</summary>
public static class Ranker
{
    /// <summary>A row elsewhere that no candidate moves by this much is not held against any of them.</summary>
    private const double Moved = 1e-3;

    /// <summary>Of those that lack already on the screen, so many of the nearest are solved whole, to say exactly by how much.</summary>
    private const int NearestAssessed = 24;

    /// <summary>Every part of the position's family in every arrangement that the family allows, best first.</summary>
    /// <param name="model">The supply.</param>
    /// <param name="fittings">What fills the positions now; the ranked position is replaced.</param>
    /// <param name="position">Designator.</param>
    /// <param name="parts">Parts of the position's family.</param>
    /// <param name="policy">The derating policy.</param>
    /// <param name="cancel">Stops the work between two solutions.</param>
    /// <exception cref="OperationCanceledException">The caller no longer wants the answer.</exception>
    public static Ranking Rank(
        SupplyModel model,
        ImmutableSortedDictionary<string, Fitting> fittings,
        string position,
        IReadOnlyList<Part> parts,
        Policy policy,
        CancellationToken cancel)
    {
        var spec = model.Positions[model.PositionOrdinal(position)];
        var trials = parts.Where(spec.Takes).SelectMany(Arrangements.Of).ToArray();
        var least = model.Requirement[CommonFields.LeastMargin];
        var options = new ParallelOptions { CancellationToken = cancel };
        var screen = new Screen(model, Assessor.Assess(model, fittings, policy, Budget.Until(cancel)), policy, position);
        var found = new Screen.Finding[trials.Length];
        Parallel.For(0, trials.Length, options, i => found[i] = screen.Look(fittings.SetItem(position, trials[i]), cancel));

        var ledgers = new Ledger?[trials.Length];
        int[] whole = [.. Enumerable.Range(0, trials.Length).Where(i => !(found[i].Margin < least))];
        int[] nearest = [.. Enumerable.Range(0, trials.Length).Except(whole).OrderByDescending(i => found[i].Margin).Take(NearestAssessed)];
        int[] assessed = [.. whole, .. nearest];
        Parallel.For(0, assessed.Length, options, n =>
        {
            var i = assessed[n];
            ledgers[i] = Assessor.Assess(model, fittings.SetItem(position, trials[i]), policy, found[i].Pool, found[i].Focus);
        });

        var moved = MovedRows([.. ledgers.OfType<Ledger>()], position);
        var candidates = trials
            .Select((t, i) => ledgers[i] is { } ledger ? Assessed(model, spec, t, ledger, moved) : ScreenedOut(model, spec, t, found[i], least))
            .Order(CandidateOrder.Best);
        return new Ranking(position, [.. candidates]);
    }

    /// <summary>Rows at other positions whose margin differs from candidate to candidate.</summary>
    private static HashSet<string> MovedRows(IReadOnlyList<Ledger> ledgers, string position) => ledgers
        .SelectMany(l => l.Rows)
        .Where(r => r.Position != position && Counts(r))
        .GroupBy(r => r.Id, StringComparer.Ordinal)
        .Where(g => g.Max(r => r.Margin) - g.Min(r => r.Margin) > Moved)
        .Select(g => g.Key)
        .ToHashSet(StringComparer.Ordinal);

    /// <summary>What an empty position asks for is a matter of the part that will fill it.</summary>
    private static bool Counts(LedgerRow row) => row.Margin is not null && row.Verdict != Verdict.NoPart;

    private static Candidate Assessed(SupplyModel model, PositionSpec spec, Fitting trial, Ledger ledger, HashSet<string> moved)
    {
        var own = ledger.Positions.Single(p => p.Spec.Id == spec.Id).Rows
            .Where(r => r.Verdict != Verdict.NotAssessed).ToImmutableArray();
        var limiting = own.Where(r => r.Margin is not null).MinBy(r => r.Margin);
        var elsewhere = ledger.Rows
            .Where(r => r.Position != spec.Id && Counts(r) && moved.Contains(r.Id))
            .MinBy(r => r.Margin);
        var (standing, reason) = Stand(own, limiting, elsewhere, model.Requirement[CommonFields.LeastMargin]);
        var order = Order(model, spec, trial);
        return new Candidate(
            trial, standing, own, limiting, elsewhere, order.Unit * (spec.Quantity * trial.Count), order.Extended, reason);
    }

    /// <summary>A trial that lacks too much to be solved whole: its margin is known from above only.</summary>
    private static Candidate ScreenedOut(SupplyModel model, PositionSpec spec, Fitting trial, Screen.Finding bound, double least)
    {
        var margin = bound.Margin!.Value;
        var order = Order(model, spec, trial);
        var standing = double.IsFinite(margin) ? Standing.Lacks : Standing.NotUsable;
        var reason = double.IsFinite(margin)
            ? Lack(bound.Stress!.Name, margin, least) + " or more"
            : $"{bound.Stress!.Name}: nothing is allowed under these conditions";
        return new Candidate(trial, standing, [], null, null, order.Unit * (spec.Quantity * trial.Count), order.Extended, reason)
        {
            MarginAtMost = double.IsFinite(margin) ? margin : null,
        };
    }

    private static OrderQuantity Order(SupplyModel model, PositionSpec spec, Fitting trial) => OrderQuantity.Of(
        trial.Part, spec.Quantity * trial.Count, (int)model.Requirement[CommonFields.Units], model.Requirement[CommonFields.Spares]);

    private static (Standing Standing, string Reason) Stand(
        ImmutableArray<LedgerRow> own, LedgerRow? limiting, LedgerRow? elsewhere, double least)
    {
        if (own.FirstOrDefault(r => r.Verdict == Verdict.NotUsable) is { } unusable)
        {
            return (Standing.NotUsable, $"{unusable.Name}: {unusable.Reason}");
        }

        if (limiting is { Margin: { } margin } && margin < least)
        {
            return (Standing.Lacks, Lack(limiting.Name, margin, least));
        }

        if (elsewhere is { Margin: { } left } && left < least)
        {
            return (Standing.Lacks, Lack($"{elsewhere.Position} {elsewhere.Name}", left, least));
        }

        if (own.Where(r => r.Verdict == Verdict.NotRated).ToList() is { Count: > 0 } unrated)
        {
            return (Standing.NotRated, "not rated: " + string.Join("; ", unrated.Select(r => $"{r.Name} {r.Reason}").Distinct(StringComparer.Ordinal)));
        }

        return own.FirstOrDefault(r => r.Verdict == Verdict.NotCovered) is { } uncovered
            ? (Standing.NotCovered, $"{uncovered.Name}: not covered by the policy")
            : (Standing.Holds, "");
    }

    private static string Lack(string what, double margin, double least) => string.Create(
        System.Globalization.CultureInfo.InvariantCulture, $"{what} lacks {(least - margin) * 100:0.0} %");
}
