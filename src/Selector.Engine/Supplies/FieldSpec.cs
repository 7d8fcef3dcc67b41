using System.Collections.Immutable;
using Selector.Engine.Quantities;

namespace Selector.Engine.Supplies;

/// <summary>One field of the requirement: form, JSON and interface come from it.</summary>
/// <param name="Key">Unique; lower case, dots and hyphens: "mains.voltage".</param>
/// <param name="Label">As printed above the box.</param>
/// <param name="Unit">Unit of the number; ignored for a choice.</param>
/// <param name="Range">Values outside are refused.</param>
/// <param name="Default">Text that stands in a new supply.</param>
/// <param name="Help">One sentence.</param>
public sealed record FieldSpec(string Key, string Label, Unit Unit, Interval Range, string Default, string Help)
{
    /// <summary>Heading under which the title block keeps it.</summary>
    public required string Group { get; init; }

    /// <summary>Closed list of words; empty for a quantity.</summary>
    public ImmutableArray<FieldChoice> Choices { get; init; } = [];

    /// <summary>Whole numbers only.</summary>
    public bool Whole { get; init; }

    /// <summary>Shown only when this says so; null for always. A hidden field keeps its text.</summary>
    public Func<RequirementValues, bool>? Shown { get; init; }

    public bool IsChoice => !Choices.IsEmpty;
}

/// <summary>A word of a choice: as stored and as printed.</summary>
public sealed record FieldChoice(string Key, string Label);

/// <summary>What must hold among several fields.</summary>
/// <param name="Keys">The fields, the one that gets the message first; only asked when all are valid and shown.</param>
/// <param name="Holds">True when consistent; values in the order of <paramref name="Keys"/>.</param>
/// <param name="Message">What is wrong and what to do.</param>
public sealed record FieldCheck(ImmutableArray<string> Keys, Func<ImmutableArray<double>, bool> Holds, string Message);
