using System.Collections.Immutable;
using Selector.Engine.Quantities;

namespace Selector.Engine.Parts;

/// <summary>
/// One column of a family: what a data sheet says of a part. Form field, CSV column, filter and column storage are made from it.
/// </summary>
/// <param name="Key">Unique in its family; lower case letters, digits and underscore.</param>
/// <param name="Name">As it stands before the number, in words.</param>
/// <param name="Unit">Unit of the number; <see cref="Units.One"/> for a choice.</param>
/// <param name="Range">Values outside are refused at entry.</param>
/// <param name="Help">One sentence: what it is, and at which conditions the maker states it.</param>
public sealed record RatingSpec(string Key, string Name, Unit Unit, Interval Range, string Help)
{
    /// <summary>Without it the part is of no use to the family; an import refuses the row.</summary>
    public bool Required { get; init; }

    /// <summary>Words that stand for 0, 1, 2, ...; empty for a number.</summary>
    public ImmutableArray<string> Choices { get; init; } = [];

    /// <summary>Part of the short description on the ledger and the bill of materials, such as "4700 µF 35 V".</summary>
    public bool InDescription { get; init; }

    /// <summary>The maker's own fall with temperature, null where the rating is flat to the part's limit.</summary>
    public TemperatureFall? Fall { get; init; }

    public bool IsChoice => !Choices.IsEmpty;

    /// <summary>Heading in files: the key and the unit, "capacitance_farad"; a choice or pure number has the key alone.</summary>
    public string Column => IsChoice || Unit == Units.One ? Key : $"{Key}_{Unit.Key}";
}

/// <summary>A rating that is full up to one temperature and falls in a straight line to nothing at another, both columns of the same family in °C.</summary>
/// <param name="KneeKey">Column with the highest temperature of the full rating.</param>
/// <param name="ZeroKey">Column with the temperature at which nothing is left.</param>
public sealed record TemperatureFall(string KneeKey, string ZeroKey);
