using System.Globalization;
using Selector.Engine.Parts;
using Selector.Engine.Supplies;

namespace Selector.Application.Supplies;

/// <summary>A fitting as read from its text.</summary>
/// <param name="Fitting">Null for an empty position and for a fault.</param>
/// <param name="Fault">What is wrong and what to do; null when nothing is.</param>
public readonly record struct FittingReading(Fitting? Fitting, string? Fault);

/// <summary>
/// The text of a fitting in the log of a supply: "part 123", "part 123 parallel 4", "typed {...} series 2", or empty for none. A
/// catalogue part is named by its number alone, so that its ratings are always those of the catalogue as it is now.
/// </summary>
public static class FittingText
{
    private const string PartWord = "part";
    private const string TypedWord = "typed";

    public static string Format(Fitting? fitting)
    {
        if (fitting is null)
        {
            return "";
        }

        var part = fitting.Part.Id != 0
            ? string.Create(CultureInfo.InvariantCulture, $"{PartWord} {fitting.Part.Id}")
            : $"{TypedWord} {TypedPart.Format(fitting.Part)}";
        return fitting.Kind switch
        {
            ArrangementKind.Parallel => string.Create(CultureInfo.InvariantCulture, $"{part} parallel {fitting.Count}"),
            ArrangementKind.Series => string.Create(CultureInfo.InvariantCulture, $"{part} series {fitting.Count}"),
            _ => part,
        };
    }

    /// <summary>Reads a fitting. A part that is gone, or an arrangement that its family does not allow, is a fault in words.</summary>
    public static FittingReading Parse(string text, CatalogueSnapshot catalogue, Registry registry)
    {
        ArgumentNullException.ThrowIfNull(text);
        ArgumentNullException.ThrowIfNull(catalogue);
        var body = text.Trim();
        if (body.Length == 0)
        {
            return default;
        }

        var (part, rest, fault) = body.StartsWith(TypedWord + " ", StringComparison.Ordinal)
            ? Typed(body, registry)
            : Numbered(body, catalogue);
        return part is null ? new(null, fault) : Arrange(part, rest);
    }

    private static (Part? Part, string[] Words, string? Fault) Numbered(string body, CatalogueSnapshot catalogue)
    {
        var words = body.Split(' ', StringSplitOptions.RemoveEmptyEntries);
        if (words.Length < 2 || words[0] != PartWord || !Whole(words[1], out var id) || id == 0)
        {
            return (null, [], $"\u201c{PlainText.Short(body)}\u201d is no fitting. Choose a part again.");
        }

        return catalogue.Find(id) is { } part
            ? (part, words[2..], null)
            : (null, [], $"Part {id} is no longer in the catalogue. Choose another.");
    }

    private static (Part? Part, string[] Words, string? Fault) Typed(string body, Registry registry)
    {
        var end = body.LastIndexOf('}') + 1;
        if (end <= TypedWord.Length)
        {
            return (null, [], "The typed-in part is incomplete. Type it again.");
        }

        var (part, fault) = TypedPart.Parse(body[TypedWord.Length..end], registry);
        return (part, body[end..].Split(' ', StringSplitOptions.RemoveEmptyEntries), fault);
    }

    private static FittingReading Arrange(Part part, string[] words)
    {
        if (words.Length == 0)
        {
            return new(new Fitting(part), null);
        }

        ArrangementKind? kind = words[0] switch
        {
            "parallel" => ArrangementKind.Parallel,
            "series" => ArrangementKind.Series,
            _ => null,
        };
        if (kind is null || words.Length != 2 || !Whole(words[1], out var count) || count == 0)
        {
            return new(null, "The arrangement is not understood. Choose the part again.");
        }

        if (count == 1)
        {
            return new(new Fitting(part), null);
        }

        var rule = part.Family.Arrangements.FirstOrDefault(a => a.Kind == kind);
        return rule is null ? new(null, $"A {part.Family.Name} may not be fitted in {words[0]}. Fit one.")
            : count > rule.Most ? new(null, $"At most {rule.Most} may be fitted in {words[0]}. Fit fewer.")
            : new(new Fitting(part, kind.Value, count), null);
    }

    private static bool Whole(string text, out int value) =>
        int.TryParse(text, NumberStyles.None, CultureInfo.InvariantCulture, out value);
}
