using Selector.Engine.Circuits;
using Selector.Engine.Parts;
using Selector.Engine.Quantities;
using Selector.Engine.Supplies;

namespace Selector.Documents.Sheets;

/// <summary>A part in the words that purchasing needs.</summary>
internal static class PartWords
{
    /// <summary>Family, the ratings that describe it, technology and package: "electrolytic capacitor, 4700 µF, 35 V".</summary>
    public static string Description(Fitting fitting)
    {
        var part = fitting.Part;
        var ratings = part.Family.Ratings
            .Zip(part.Ratings)
            .Where(r => r.First.InDescription && !double.IsNaN(r.Second))
            .Select(r => Rating(r.First, r.Second));
        string[] rest = [.. ratings, part.Technology, part.Package];
        return string.Join(", ", rest.Where(w => w.Length > 0).Prepend(part.Family.Name));
    }

    /// <summary>What hinders an order: a part that is going out, or that the catalogue does not hold.</summary>
    public static string Standing(Part part) => string.Join(", ", new[]
    {
        part.Lifecycle switch
        {
            Lifecycle.NotForNewDesigns => "not for new designs",
            Lifecycle.LastBuy => "last buy",
            Lifecycle.Obsolete => "obsolete",
            _ => "",
        },
        part.Id == 0 ? "typed in, not in the catalogue" : "",
    }.Where(w => w.Length > 0));

    /// <summary>
    /// The ratings below which no replacement may be accepted, with the stress that asks for each; of several stresses on one
    /// rating the one that asks for most.
    /// </summary>
    public static IEnumerable<string> LeastRatings(LedgerPosition position) => position.Rows
        .Where(r => r.LeastRating > 0 && r.Spec is not null)
        .GroupBy(RatingKey, StringComparer.Ordinal)
        .Select(g => g.MaxBy(r => r.LeastRating)!)
        .Select(r => $"{r.Name} \u2265\u202f{QuantityWriter.Write(r.LeastRating!.Value, r.Spec!.Unit)}");

    private static string RatingKey(LedgerRow row) => row.Spec!.Bound switch
    {
        Bound.Rating r => r.Key,
        Bound.Limit l => l.Key,
        _ => row.Kind,
    };

    private static string Rating(RatingSpec spec, double value) => spec.IsChoice
        ? value >= 0 && value < spec.Choices.Length ? spec.Choices[(int)value] : ""
        : QuantityWriter.Write(value, spec.Unit, 4, trim: true);
}
