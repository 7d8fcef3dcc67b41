namespace Selector.Web.Session;

/// <summary>Why a text that somebody typed does not stand in its field. It stays in the box until they decide.</summary>
/// <param name="Typed">What they typed.</param>
/// <param name="Stands">What stands instead; null when the text was refused and nothing else is in its way.</param>
/// <param name="Words">In a sentence.</param>
public sealed record FieldTrouble(string Typed, string? Stands, string Words);
