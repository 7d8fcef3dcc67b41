namespace Selector.Application.Supplies;

/// <summary>A wish to change one field.</summary>
/// <param name="Field">Key of a requirement field, <see cref="SupplyFields.Name"/>, <see cref="SupplyFields.Policy"/>, or "fit." and a position.</param>
/// <param name="Old">The text that the editor saw; the edit is only applied while it still stands. Null: whatever stands.</param>
/// <param name="New">The text that shall stand.</param>
/// <param name="By">Who.</param>
public readonly record struct Edit(string Field, string? Old, string New, string By);
