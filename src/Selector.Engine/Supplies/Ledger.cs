using System.Collections.Immutable;
using Selector.Engine.Circuits;
using Selector.Engine.Derating;

namespace Selector.Engine.Supplies;

/// <summary>The finding on one stress.</summary>
public enum Verdict
{
    Holds,
    Lacks,

    /// <summary>Nothing is allowed under the conditions, or the circuit has no operating point at a corner.</summary>
    NotUsable,

    /// <summary>The part's data do not say enough.</summary>
    NotRated,

    /// <summary>The policy has no clause for it.</summary>
    NotCovered,

    /// <summary>This version does not compute it.</summary>
    NotAssessed,

    /// <summary>The position is empty; what a part would have to stand is given.</summary>
    NoPart,

    /// <summary>Nothing is asked of the part.</summary>
    NoDemand,
}

/// <summary>One row of the ledger: a position's stress at its worst corner. Numbers are finite or absent.</summary>
public sealed record LedgerRow
{
    public required string Position { get; init; }

    /// <summary>Trade term of the stress, or "not-assessed".</summary>
    public required string Kind { get; init; }

    public required string Name { get; init; }

    public required Verdict Verdict { get; init; }

    /// <summary>Null for what is not assessed.</summary>
    public StressSpec? Spec { get; init; }

    /// <summary>Computed stress (or, for a floor, computed value) at the worst corner.</summary>
    public double? Stress { get; init; }

    /// <summary>What the clause lets the part carry there; for a floor what is required.</summary>
    public double? Allowed { get; init; }

    /// <summary>The rating itself, before any derating.</summary>
    public double? Rating { get; init; }

    /// <summary>Section "margin" of the definitions: 1 - stress/allowed, or its counterpart for floors and temperatures.</summary>
    public double? Margin { get; init; }

    /// <summary>The margin if nothing were derated.</summary>
    public double? MarginUnderated { get; init; }

    /// <summary>For temperatures: kelvins left.</summary>
    public double? KelvinLeft { get; init; }

    /// <summary>Least rating that would hold, where the clause can be turned round.</summary>
    public double? LeastRating { get; init; }

    public Clause? Clause { get; init; }

    /// <summary>The worst corner in words: "mains +10 %, 1.500 A, 45 °C".</summary>
    public string Corner { get; init; } = "";

    /// <summary>Value of every axis at the worst corner, by axis.</summary>
    public ImmutableSortedDictionary<string, double> At { get; init; } = ImmutableSortedDictionary<string, double>.Empty;

    /// <summary>Direction of every axis that reaches the stress, with the proof or "searched".</summary>
    public ImmutableArray<AxisFinding> Axes { get; init; } = [];

    /// <summary>What is missing or wrong, for the verdicts that need a word: "needs ESR at 100 Hz".</summary>
    public string Reason { get; init; } = "";

    public string Id => $"{Position}.{Kind}";
}

/// <summary>How an axis bears on a stress.</summary>
public sealed record AxisFinding(string Axis, Push Push, string Why);

/// <summary>A position with what fills it and its limiting row.</summary>
/// <param name="Spec">The place.</param>
/// <param name="Fitting">Null while it is empty.</param>
/// <param name="Rows">Its stresses, in the order of the stage.</param>
public sealed record LedgerPosition(PositionSpec Spec, Fitting? Fitting, ImmutableArray<LedgerRow> Rows)
{
    /// <summary>The row with the smallest margin among those that have one; null when none has.</summary>
    public LedgerRow? Limiting => Rows.Where(r => r.Margin is not null).MinBy(r => r.Margin);
}

/// <summary>How many rows got which verdict.</summary>
public sealed record Counts(int Hold, int Lack, int NotRated, int NotAssessed, int NotCovered, int NotUsable, int Empty, int Assumed)
{
    /// <summary>Only when everything is assessed, rated and covered, and holds.</summary>
    public bool Passes => Lack + NotRated + NotAssessed + NotCovered + NotUsable + Empty == 0 && Hold > 0;
}

/// <summary>The assessment of a supply: every position and stress at its worst corner under the policy.</summary>
/// <param name="Positions">In the order of the signal path.</param>
/// <param name="NotAssessed">What is left out and belongs to no position of this supply.</param>
/// <param name="Counts">Verdicts counted; the papers begin with them.</param>
/// <param name="Policy">Name and version.</param>
/// <param name="Cautions">From the stages.</param>
/// <param name="Fault">Why nothing could be solved; null when it was.</param>
public sealed record Ledger(
    ImmutableArray<LedgerPosition> Positions,
    ImmutableArray<LedgerRow> NotAssessed,
    Counts Counts,
    string Policy,
    ImmutableArray<string> Cautions,
    string? Fault)
{
    /// <summary>Every row, position by position, what is not assessed last.</summary>
    public IEnumerable<LedgerRow> Rows => Positions.SelectMany(p => p.Rows).Concat(NotAssessed);
}
