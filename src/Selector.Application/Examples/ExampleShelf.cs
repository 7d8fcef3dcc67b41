using System.Collections.Immutable;
using System.Globalization;
using Selector.Application.Supplies;
using Selector.Engine.Parts;

namespace Selector.Application.Examples;

/// <summary>The example supplies that come with the program, and how their parts are found in a catalogue.</summary>
public sealed class ExampleShelf
{
    public ExampleShelf()
        : this(Embedded.In("examples"))
    {
    }

    internal ExampleShelf(IEnumerable<(string Name, string Text)> files) => Examples = [.. files.Select(f => Example.Read(f.Name, f.Text))];

    public ImmutableArray<Example> Examples { get; }

    /// <summary>The texts of an example with its parts replaced by their numbers; what is not in the catalogue is left out and named.</summary>
    public static (ImmutableSortedDictionary<string, string> Texts, ImmutableArray<string> Missing) Resolve(Example example, CatalogueSnapshot catalogue)
    {
        ArgumentNullException.ThrowIfNull(example);
        ArgumentNullException.ThrowIfNull(catalogue);
        var texts = example.Texts.ToBuilder();
        var missing = ImmutableArray.CreateBuilder<string>();
        foreach (var (field, text) in example.Texts.Where(t => SupplyFields.IsFit(t.Key) && t.Value.Contains('|', StringComparison.Ordinal)))
        {
            if (Find(text, catalogue) is { } found)
            {
                texts[field] = found;
            }
            else
            {
                texts.Remove(field);
                missing.Add($"{example.Name}, {SupplyFields.PositionOf(field)}: {text} is not in the catalogue.");
            }
        }

        return (texts.ToImmutable(), missing.ToImmutable());
    }

    /// <summary>An ordering code may have spaces, so the whole rest is tried before an arrangement is split off.</summary>
    private static string? Find(string text, CatalogueSnapshot catalogue)
    {
        var bar = text.IndexOf('|', StringComparison.Ordinal);
        var (maker, rest) = (text[..bar].Trim(), text[(bar + 1)..].Trim());
        foreach (var (code, arrangement) in Splits(rest))
        {
            var part = catalogue.Families.OrderBy(f => f.Key, StringComparer.Ordinal).SelectMany(f => f.Value)
                .FirstOrDefault(p => p.Maker == maker && p.OrderingCode == code);
            if (part is not null)
            {
                return string.Create(CultureInfo.InvariantCulture, $"part {part.Id}{arrangement}");
            }
        }

        return null;
    }

    private static IEnumerable<(string Code, string Arrangement)> Splits(string rest)
    {
        yield return (rest, "");
        foreach (var word in (string[])[" parallel ", " series "])
        {
            if (rest.LastIndexOf(word, StringComparison.Ordinal) is > 0 and var at)
            {
                yield return (rest[..at].Trim(), rest[at..]);
            }
        }
    }
}
