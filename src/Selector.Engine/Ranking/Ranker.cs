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
        var trials = parts.SelectMany(p => Arrangements.Of(p)).ToArray();
        var ledgers = new Ledger[trials.Length];
        Parallel.For(0, trials.Length, new ParallelOptions { CancellationToken = cancel }, i =>
            ledgers[i] = Assessor.Assess(model, fittings.SetItem(position, trials[i]), policy, Budget.Until(cancel)));

        var moved = MovedRows(ledgers, position);
        var spec = model.Positions[model.PositionOrdinal(position)];
        var candidates = trials.Select((t, i) => Candidate(model, spec, t, ledgers[i], moved)).Order(CandidateOrder.Best);
        return new Ranking(position, [.. candidates]);
    }

    /// <summary>Rows at other positions whose margin differs from candidate to candidate.</summary>
    private static HashSet<string> MovedRows(Ledger[] ledgers, string position) => ledgers
        .SelectMany(l => l.Rows)
        .Where(r => r.Position != position && r.Margin is not null)
        .GroupBy(r => r.Id, StringComparer.Ordinal)
        .Where(g => g.Max(r => r.Margin) - g.Min(r => r.Margin) > Moved)
        .Select(g => g.Key)
        .ToHashSet(StringComparer.Ordinal);

    private static Candidate Candidate(SupplyModel model, PositionSpec spec, Fitting trial, Ledger ledger, HashSet<string> moved)
    {
        var own = ledger.Positions.Single(p => p.Spec.Id == spec.Id).Rows
            .Where(r => r.Verdict != Verdict.NotAssessed).ToImmutableArray();
        var limiting = own.Where(r => r.Margin is not null).MinBy(r => r.Margin);
        var elsewhere = ledger.Rows
            .Where(r => r.Position != spec.Id && r.Margin is not null && moved.Contains(r.Id))
            .MinBy(r => r.Margin);
        var order = OrderQuantity.Of(
            trial.Part, spec.Quantity * trial.Count,
            (int)model.Requirement[CommonFields.Units], model.Requirement[CommonFields.Spares]);
        var least = model.Requirement[CommonFields.LeastMargin];
        var (standing, reason) = Stand(own, limiting, elsewhere, least);
        return new Candidate(
            trial, standing, own, limiting, elsewhere, order.Unit * (spec.Quantity * trial.Count), order.Extended, reason);
    }

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
