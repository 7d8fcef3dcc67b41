using System.Collections.Immutable;
using Selector.Engine.Parts;
using Selector.Engine.Supplies;

namespace Selector.Engine.Ranking;

/// <summary>Where a candidate stands.</summary>
public enum Standing
{
    /// <summary>Its own stresses and those that it moves elsewhere keep the least margin.</summary>
    Holds,
    Lacks,
    NotRated,
    NotCovered,
    NotUsable,
}

/// <summary>A part on trial in a position, with the supply solved again around it.</summary>
/// <param name="Fitting">The part and its arrangement.</param>
/// <param name="Standing">Which group it ranks in.</param>
/// <param name="Own">Its own stresses.</param>
/// <param name="Limiting">The own row with the smallest margin; null when none has one.</param>
/// <param name="Elsewhere">The worst row that it moves at another position; null when it moves none.</param>
/// <param name="UnitPrice">Ten-thousandths for one supply, at the quantity that the build orders; null when unknown.</param>
/// <param name="Extended">Ten-thousandths for the whole build; null when unknown.</param>
/// <param name="Reason">For what does not hold: the stress and by how much, or the missing data by name.</param>
public sealed record Candidate(
    Fitting Fitting,
    Standing Standing,
    ImmutableArray<LedgerRow> Own,
    LedgerRow? Limiting,
    LedgerRow? Elsewhere,
    long? UnitPrice,
    long? Extended,
    string Reason)
{
    public Part Part => Fitting.Part;

    /// <summary>For a part that lacks too much to be solved whole: no more than this. Null when the margins are exact.</summary>
    public double? MarginAtMost { get; init; }

    /// <summary>The smallest margin of own rows and of those that it moves elsewhere.</summary>
    public double? LeastMargin => Limiting?.Margin is { } own
        ? Math.Min(own, Elsewhere?.Margin ?? own)
        : Elsewhere?.Margin ?? MarginAtMost;
}

/// <summary>All candidates of a position, best first.</summary>
public sealed record Ranking(string Position, ImmutableArray<Candidate> Candidates)
{
    public int Holding => Candidates.Count(c => c.Standing == Standing.Holds);
}
