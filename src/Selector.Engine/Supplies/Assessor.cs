using System.Collections.Immutable;
using Selector.Engine.Circuits;
using Selector.Engine.Corners;
using Selector.Engine.Derating;

namespace Selector.Engine.Supplies;

/// <summary>Assesses a supply: every stress at its worst corner, held against what the policy allows.</summary>
public static class Assessor
{
    /// <summary>The ledger of a design whose requirement may still have faults: those are said instead of an assessment.</summary>
    /// <exception cref="OperationCanceledException">The caller no longer wants the answer.</exception>
    public static Ledger Assess(Registry registry, Design design, Policy policy, in Budget budget)
    {
        var requirement = RequirementReader.Read(registry, design.Requirement);
        return requirement.Ok
            ? Assess(SupplyModel.Build(registry, requirement), design.Fittings, policy, budget)
            : Unsolved(policy, string.Join(" ", requirement.Faults.Select(f => f.Fault)));
    }

    /// <summary>The ledger of a model with the given parts.</summary>
    /// <exception cref="OperationCanceledException">The caller no longer wants the answer.</exception>
    public static Ledger Assess(
        SupplyModel model, IReadOnlyDictionary<string, Fitting> fittings, Policy policy, in Budget budget)
    {
        var pool = new ConditionPool(model, new SupplySolver(model, fittings), budget);
        return Assess(model, fittings, policy, pool, null);
    }

    /// <summary>
    /// The same from conditions that are solved already, with the whole search only for some stresses: the rows of the others are
    /// true at the corner that they state, which may not be their worst.
    /// </summary>
    internal static Ledger Assess(
        SupplyModel model, IReadOnlyDictionary<string, Fitting> fittings, Policy policy, ConditionPool pool, IReadOnlySet<int>? focus)
    {
        Severity[] severities =
        [
            .. model.Stresses.Select((s, i) => new Severity(model, i, fittings.GetValueOrDefault(s.Spec.Position), policy)),
        ];
        var search = new CornerSearch(model, pool);
        var worst = search.Worst(severities, focus, out var failed);
        var rows = new LedgerRow[model.Stresses.Length];
        for (var i = 0; i < rows.Length; i++)
        {
            rows[i] = new RowMaker(model, search, fittings, severities[i], i).Make(worst[i], failed[i]);
        }

        return Assemble(model, fittings, policy, rows);
    }

    private static Ledger Assemble(
        SupplyModel model, IReadOnlyDictionary<string, Fitting> fittings, Policy policy, LedgerRow[] rows)
    {
        var known = model.Positions.Select(p => p.Id).ToHashSet(StringComparer.Ordinal);
        var open = model.Stages.SelectMany(s => s.NotAssessed).Select(Open).ToList();
        var positions = model.Positions
            .Select(p => new LedgerPosition(
                p,
                fittings.GetValueOrDefault(p.Id),
                [.. rows.Where(r => r.Position == p.Id), .. open.Where(o => o.Position == p.Id)]))
            .ToImmutableArray();
        var elsewhere = open.Where(o => !known.Contains(o.Position)).ToImmutableArray();
        return new Ledger(
            positions,
            elsewhere,
            Count([.. positions.SelectMany(p => p.Rows), .. elsewhere], positions),
            policy.Title,
            [.. model.Stages.SelectMany(s => s.View.Cautions).Distinct(StringComparer.Ordinal)],
            null);
    }

    private static LedgerRow Open(NotAssessed item) => new()
    {
        Position = item.Position,
        Kind = "not-assessed." + item.What,
        Name = item.What,
        Verdict = Verdict.NotAssessed,
        Reason = "not assessed",
    };

    private static Counts Count(ImmutableArray<LedgerRow> rows, ImmutableArray<LedgerPosition> positions)
    {
        int Of(Verdict v) => rows.Count(r => r.Verdict == v);
        return new Counts(
            Of(Verdict.Holds) + Of(Verdict.NoDemand),
            Of(Verdict.Lacks),
            Of(Verdict.NotRated),
            Of(Verdict.NotAssessed),
            Of(Verdict.NotCovered),
            Of(Verdict.NotUsable),
            positions.Count(p => p.Fitting is null),
            0);
    }

    private static Ledger Unsolved(Policy policy, string fault) =>
        new([], [], new Counts(0, 0, 0, 0, 0, 0, 0, 0), policy.Title, [], fault);
}
