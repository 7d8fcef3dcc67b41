using System.Collections.Immutable;

namespace Selector.Engine.Corners;

/// <summary>A part of the time that a supply spends at one everyday condition.</summary>
/// <param name="Share">Of all the time, above 0, at most 1.</param>
/// <param name="Axes">Values by axis; the others stand at their nominal.</param>
public sealed record ProfilePoint(double Share, ImmutableDictionary<string, double> Axes);
