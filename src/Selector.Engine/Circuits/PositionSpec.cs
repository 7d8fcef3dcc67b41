using System.Collections.Immutable;
using Selector.Engine.Parts;

namespace Selector.Engine.Circuits;

/// <summary>One place in the circuit that a part must fill.</summary>
/// <param name="Id">Designator: "C1"; several equal places are written "D1-D4".</param>
/// <param name="Role">What it does, in words.</param>
/// <param name="Family">Family of the part.</param>
/// <param name="Quantity">How many equal places the designator stands for.</param>
/// <param name="StandIn">
/// Ratings by key of the part that is imagined while the position is empty, so that the rest can be solved: the hand-book
/// starting value. Only what the circuit needs; never a limit, so that nothing can pass by it.
/// </param>
public sealed record PositionSpec(string Id, string Role, string Family, int Quantity, ImmutableDictionary<string, double> StandIn)
{
    /// <summary>Technologies of the family that suit the place; empty for all.</summary>
    public ImmutableArray<string> Technologies { get; init; } = [];

    /// <summary>Whether a part may stand here, whatever its ratings.</summary>
    public bool Takes(Part part) => part.Family.Id == Family && (Technologies.IsEmpty || Technologies.Contains(part.Technology));

    /// <summary>Why the stand-in has these values, for the sheet.</summary>
    public string StandInReason { get; init; } = "";
}

/// <summary>Something of a position that this version does not compute. It is listed, and there is no overall pass while it is.</summary>
/// <param name="Position">Designator, also of a part that has no position yet.</param>
/// <param name="What">The stress, in words.</param>
public sealed record NotAssessed(string Position, string What);
