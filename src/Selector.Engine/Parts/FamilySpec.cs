using System.Collections.Frozen;
using System.Collections.Immutable;

namespace Selector.Engine.Parts;

/// <summary>A kind of part, whole: its ratings, what must be consistent among them, and how many may be fitted in one position.</summary>
/// <param name="Id">Lower case, hyphens: "rectifier-diode". Names the CSV file and the address.</param>
/// <param name="Name">In the singular: "rectifier diode".</param>
/// <param name="Plural">In the plural: "rectifier diodes".</param>
/// <param name="Ratings">In the order of form and file.</param>
public sealed record FamilySpec(string Id, string Name, string Plural, ImmutableArray<RatingSpec> Ratings)
{
    private readonly FrozenDictionary<string, int> _ordinals =
        Ratings.Select((r, i) => (r.Key, i)).ToFrozenDictionary(x => x.Key, x => x.i, StringComparer.Ordinal);

    /// <summary>Technologies that the policies tell apart; the first is the default.</summary>
    public ImmutableArray<string> Technologies { get; init; } = [""];

    /// <summary>What must hold among the ratings of one part.</summary>
    public ImmutableArray<CrossCheck> Checks { get; init; } = [];

    /// <summary>Fittings besides a single part.</summary>
    public ImmutableArray<ArrangementRule> Arrangements { get; init; } = [];

    /// <summary>
    /// What n equal parts in parallel make of a rating, as a factor by key and n, where they act as one larger part; null where the
    /// stages reckon with the single parts themselves.
    /// </summary>
    public Func<string, int, double>? InParallel { get; init; }

    /// <summary>How the part changes over its life.</summary>
    public ImmutableArray<Drift> Ageing { get; init; } = [];

    /// <summary>A part that local approvals or this product's safety rest on: purchasing may not substitute it.</summary>
    public bool SafetyCritical { get; init; }

    /// <summary>Place of a rating among the columns.</summary>
    /// <exception cref="KeyNotFoundException">The family has no such rating.</exception>
    public int Ordinal(string key) => _ordinals.TryGetValue(key, out var i)
        ? i : throw new KeyNotFoundException($"Family {Id} has no rating '{key}'.");

    public RatingSpec Rating(string key) => Ratings[Ordinal(key)];
}

/// <summary>A relation among the ratings of one part.</summary>
/// <param name="Keys">Ratings that it looks at; it is only asked when all are given.</param>
/// <param name="Holds">True when consistent; the values come in the order of <paramref name="Keys"/>.</param>
/// <param name="Message">What is wrong and what to do, when it is not.</param>
public sealed record CrossCheck(ImmutableArray<string> Keys, Func<ImmutableArray<double>, bool> Holds, string Message)
{
    /// <summary>Asked even when ratings are missing; they come as NaN. For data of which one or the other must be given.</summary>
    public bool EvenIfMissing { get; init; }
}

/// <summary>How several equal parts may fill one position.</summary>
public enum ArrangementKind
{
    One,
    Parallel,
    Series,
}

/// <summary>A permitted arrangement of equal parts.</summary>
public sealed record ArrangementRule(ArrangementKind Kind, int Most);

/// <summary>A drift over life, as a factor on a rating at the end of life.</summary>
/// <param name="Key">The rating that drifts.</param>
/// <param name="Factor">Value at end of life over value when new.</param>
/// <param name="Source">Where the figure comes from.</param>
public sealed record Drift(string Key, double Factor, string Source);
