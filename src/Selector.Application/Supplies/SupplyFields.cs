using Selector.Engine.Supplies;
using Selector.Storage;

namespace Selector.Application.Supplies;

/// <summary>Fields of a supply that no stage declares, and what may be written at all.</summary>
public static class SupplyFields
{
    /// <summary>The supply's name.</summary>
    public const string Name = "name";

    /// <summary>Id of the derating policy; empty for the standard one.</summary>
    public const string Policy = "policy";

    private const string FitPrefix = "fit.";

    /// <summary>Field that holds the fitting of a position: "fit.C1".</summary>
    public static string Fit(string position) => FitPrefix + position;

    public static bool IsFit(string field) => field.StartsWith(FitPrefix, StringComparison.Ordinal);

    /// <summary>Position of a fitting field.</summary>
    public static string PositionOf(string field) => field[FitPrefix.Length..];

    public static bool IsRequirement(string field) => !IsFit(field) && field is not (Name or Policy);

    /// <summary>The text that stands in a field that was never written.</summary>
    public static string Unwritten(Registry registry, string field) =>
        registry.Fields.FirstOrDefault(f => f.Key == field)?.Default ?? "";

    /// <summary>Why a text may not be stored in a field; null when it may. What is wrong in the trade is not refused here: it is kept and said beside the field.</summary>
    public static string? Refusal(Registry registry, string field, string text, string by)
    {
        if (text.Length > Limits.Text)
        {
            return $"The text is {text.Length} characters long; at most {Limits.Text} are kept. Shorten it.";
        }

        if (RefusalOf(by) is { } nobody)
        {
            return nobody;
        }

        if (!PlainText.IsKept(text))
        {
            return "The text has characters that cannot be stored. Type it again without them.";
        }

        if (field == Name)
        {
            return string.IsNullOrWhiteSpace(text) ? "A supply needs a name. Type one."
                : text.Length > Limits.Name ? $"The name is {text.Length} characters long; at most {Limits.Name} are kept. Shorten it."
                : null;
        }

        var known = field == Policy
            || (IsFit(field) && field.Length <= Limits.Field && PositionOf(field).All(IsPositionSign) && field.Length > FitPrefix.Length)
            || registry.Fields.Any(f => f.Key == field);
        return known ? null : $"There is no field \u201c{PlainText.Short(field)}\u201d.";
    }

    /// <summary>Why somebody may not be named in the log; null when they may.</summary>
    public static string? RefusalOf(string by) => by.Length is >= 1 and <= Limits.Name && PlainText.IsKept(by)
        ? null
        : $"The name of who edits must have 1 to {Limits.Name} characters, all of which can be stored.";

    private static bool IsPositionSign(char c) => char.IsAsciiLetterOrDigit(c) || c is '-' or '_' or '.';
}
