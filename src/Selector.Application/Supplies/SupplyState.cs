using System.Collections.Immutable;
using Selector.Engine.Supplies;

namespace Selector.Application.Supplies;

/// <summary>A supply as it stands.</summary>
/// <param name="Number">Given by the store, never used again.</param>
/// <param name="Name">As the designer calls it.</param>
/// <param name="Texts">Requirement fields and fittings that were ever written, by key.</param>
/// <param name="Version">Counts up with every edit.</param>
/// <param name="EditedUtc">Time of the last edit.</param>
/// <param name="CanUndo">There is an edit to take back.</param>
/// <param name="CanRedo">There is an undo to take back.</param>
public sealed record SupplyState(
    int Number,
    string Name,
    ImmutableSortedDictionary<string, string> Texts,
    long Version,
    DateTime EditedUtc,
    bool CanUndo,
    bool CanRedo)
{
    /// <summary>Text of a requirement field: what was written, else its default.</summary>
    public string Text(FieldSpec field) => Requirement.Text(field);

    /// <summary>Text of the fitting of a position; empty for none.</summary>
    public string Fit(string position) => Texts.GetValueOrDefault(SupplyFields.Fit(position), "");

    /// <summary>The requirement texts, without fittings and policy.</summary>
    public Requirement Requirement => new(Texts.RemoveRange(Texts.Keys.Where(k => !SupplyFields.IsRequirement(k))));
}

/// <summary>A line of the list of supplies.</summary>
public sealed record SupplyLine(int Number, string Name, long Version, DateTime CreatedUtc, DateTime EditedUtc);
