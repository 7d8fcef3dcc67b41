namespace Selector.Application.Supplies;

/// <summary>One entry of a supply's log, as shown.</summary>
/// <param name="Sequence">1, 2, 3, ... within the supply.</param>
/// <param name="Field">Which field.</param>
/// <param name="Old">Text before.</param>
/// <param name="New">Text after.</param>
/// <param name="By">Who.</param>
/// <param name="AtUtc">When.</param>
/// <param name="Undoes">The entry that it takes back; null for an edit of its own.</param>
public sealed record LogLine(int Sequence, string Field, string Old, string New, string By, DateTime AtUtc, int? Undoes);
