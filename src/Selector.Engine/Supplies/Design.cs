using System.Collections.Immutable;
using Selector.Engine.Parts;

namespace Selector.Engine.Supplies;

/// <summary>How a part fills a position.</summary>
/// <param name="Part">From the catalogue or typed in.</param>
/// <param name="Kind">One, or several equal parts in parallel or series.</param>
/// <param name="Count">How many; 1 for <see cref="ArrangementKind.One"/>.</param>
public sealed record Fitting(Part Part, ArrangementKind Kind = ArrangementKind.One, int Count = 1)
{
    public static Fitting Parallel(Part part, int count) =>
        count == 1 ? new(part) : new(part, ArrangementKind.Parallel, count);

    /// <summary>"one", "4 in parallel".</summary>
    /// <summary>A rating of the whole fitting: the part's own, or what several in parallel make of it; NaN when not given.</summary>
    public double Rating(string key) => Part[key] * (Kind == ArrangementKind.Parallel && Part.Family.InParallel is { } factor ? factor(key, Count) : 1);

    public string Words => Kind switch
    {
        ArrangementKind.Parallel => $"{Count} in parallel",
        ArrangementKind.Series => $"{Count} in series",
        _ => "one",
    };
}

/// <summary>A supply as it is being designed: requirement and the parts that fill its positions.</summary>
public sealed record Design(Requirement Requirement, ImmutableSortedDictionary<string, Fitting> Fittings)
{
    public static Design Empty { get; } = new(Requirement.Empty, ImmutableSortedDictionary.Create<string, Fitting>(StringComparer.Ordinal));

    public Design Fit(string position, Fitting fitting) => this with { Fittings = Fittings.SetItem(position, fitting) };
}
