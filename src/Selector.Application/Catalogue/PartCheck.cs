using Selector.Engine.Parts;
using Selector.Engine.Quantities;

namespace Selector.Application.Catalogue;

/// <summary>Whether a part may stand in a catalogue or supply: its family's own rules, in words.</summary>
internal static class PartCheck
{
    /// <summary>The first fault of a part; null when there is none.</summary>
    public static string? Fault(Part part)
    {
        if (string.IsNullOrWhiteSpace(part.Maker) || string.IsNullOrWhiteSpace(part.OrderingCode))
        {
            return "Maker and ordering code are needed.";
        }

        if (!part.Family.Technologies.Contains(part.Technology))
        {
            return Technology(part.Family, part.Technology);
        }

        for (var i = 0; i < part.Ratings.Length; i++)
        {
            if (Rating(part.Family.Ratings[i], part.Ratings[i]) is { } fault)
            {
                return fault;
            }
        }

        return Cross(part).Select(c => c.Message).FirstOrDefault();
    }

    public static string Technology(FamilySpec family, string technology) =>
        $"\u201c{PlainText.Short(technology)}\u201d is no technology of {family.Plural}. Write {Listed(family.Technologies)}.";

    /// <summary>What is wrong with one rating by itself.</summary>
    public static string? Rating(RatingSpec spec, double value) =>
        double.IsNaN(value) ? spec.Required ? $"The {spec.Name} is missing and every part of the family needs it. Give it from the data sheet." : null
        : spec.Range.Contains(value) ? null
        : $"The {spec.Name} of {Say(value, spec.Unit)} is outside {Say(spec.Range.Low, spec.Unit)} to {Say(spec.Range.High, spec.Unit)}. "
            + "Check the number and its prefix.";

    /// <summary>Relations among ratings that do not hold.</summary>
    public static IEnumerable<CrossCheck> Cross(Part part) => part.Family.Checks.Where(check =>
        (check.EvenIfMissing || check.Keys.All(part.Has)) && !check.Holds([.. check.Keys.Select(k => part[k])]));

    /// <summary>"a", "a or b", "a, b or c", in quotation marks.</summary>
    public static string Listed(IReadOnlyList<string> words)
    {
        var quoted = words.Select(w => w.Length == 0 ? "nothing" : $"\u201c{w}\u201d").ToList();
        return quoted.Count == 1 ? quoted[0] : string.Join(", ", quoted.Take(quoted.Count - 1)) + " or " + quoted[^1];
    }

    private static string Say(double value, Unit unit) => QuantityWriter.Write(value, unit, 4, trim: true);
}
