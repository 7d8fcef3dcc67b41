using Selector.Documents.Model;
using Selector.Engine.Circuits;
using Selector.Engine.Derating;
using Selector.Engine.Quantities;
using Selector.Engine.Supplies;

namespace Selector.Documents.Sheets;

/// <summary>Cells of a row of the derating sheet: where the rating comes from and which clause takes what away from it.</summary>
internal static class LedgerCells
{
    public static TextCell Part(LedgerPosition position) => position.Fitting is { } fitting
        ? new(fitting.Part.FullName) { Note = fitting.Count > 1 ? fitting.Words : "" }
        : new("to be chosen", Tone.Quiet) { Note = position.Spec.Role };

    public static Cell Rating(PaperInput input, LedgerPosition position, LedgerRow row, Unit unit)
    {
        if (row.Rating is { } rating)
        {
            return new NumberCell(QuantityWriter.Write(rating, unit)) { Note = Basis(input, position, row) };
        }

        return row.LeastRating is { } least
            ? new NumberCell("\u2265\u202f" + QuantityWriter.Write(least, unit)) { Note = "least that would hold" }
            : new TextCell("\u2013", Tone.Quiet);
    }

    private static string Basis(PaperInput input, LedgerPosition position, LedgerRow row) => row.Spec?.Bound switch
    {
        Bound.Rating r when row.Clause?.Basis == RatingBasis.AtTemperature => Joined(Named(position, r.Key, row), "at temperature"),
        Bound.Rating r => Named(position, r.Key, row) is { Length: > 0 } name ? name : "as printed",
        Bound.Limit l => Joined(Named(position, l.Key, row), "limit"),
        Bound.Required r => $"required: {input.Requirement.Find(r.Field)?.Field.Label ?? r.Field}",
        _ => "",
    };

    private static string Joined(string name, string basis) => name.Length == 0 ? basis : $"{name}, {basis}";

    /// <summary>Name of the rating, unless the stress has just been called the same.</summary>
    private static string Named(LedgerPosition position, string key, LedgerRow row)
    {
        var name = position.Fitting?.Part.Family.Ratings.FirstOrDefault(r => r.Key == key)?.Name ?? key.Replace('_', ' ');
        return name == row.Name ? "" : name;
    }

    public static TextCell Clause(LedgerRow row) => row.Clause is { } clause
        ? new($"{clause.Operator.Words}; {Certainty(clause.Certainty)}") { Note = clause.Place is "" or "none" ? clause.Document : $"{clause.Document}, {clause.Place}" }
        : new(row.Spec?.Bound switch
        {
            Bound.Limit => "limit of the part, not derated",
            Bound.Required => "the requirement itself",
            _ => "no clause",
        }, Tone.Quiet);

    private static string Certainty(Certainty certainty) => certainty switch
    {
        Engine.Derating.Certainty.SeenAtIssuer => "seen at the issuer",
        Engine.Derating.Certainty.SecondHand => "second-hand",
        Engine.Derating.Certainty.FromMemory => "from memory",
        _ => "common practice",
    };

    public static PointerScale? Scale(LedgerRow row) => row.Spec?.Side == Side.Floor
        ? PointerScale.Floor(row.Stress, row.Allowed)
        : PointerScale.Ceiling(row.Stress, row.Allowed, row.Rating);

    public static Cell Number(double? value, Unit unit) =>
        value is { } v ? new NumberCell(QuantityWriter.Write(v, unit)) : new TextCell("\u2013", Tone.Quiet);
}
