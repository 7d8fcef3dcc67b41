using System.Collections.Immutable;

namespace Selector.Engine.Supplies;

/// <summary>What the supply must do, as it was typed: field key to text. Drafts, undo and conflicts per field come free with it.</summary>
public sealed record Requirement(ImmutableSortedDictionary<string, string> Texts)
{
    public static Requirement Empty { get; } = new(ImmutableSortedDictionary.Create<string, string>(StringComparer.Ordinal));

    /// <summary>The text of a field, or its default where nothing was typed.</summary>
    public string Text(FieldSpec field) => Texts.TryGetValue(field.Key, out var text) ? text : field.Default;

    public Requirement With(string key, string text) => new(Texts.SetItem(key, text));
}
