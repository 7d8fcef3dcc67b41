using System.Collections.Immutable;
using System.Globalization;
using Selector.Documents.Model;
using Selector.Engine.Circuits;
using Selector.Engine.Derating;
using Selector.Engine.Quantities;
using Selector.Engine.Supplies;

namespace Selector.Documents.Sheets;

/// <summary>The body of the derating sheet: one row for each stress of each position.</summary>
internal static class LedgerTable
{
    private static readonly ImmutableArray<Column> Columns =
    [
        new("position", "Position", 40),
        new("part", "Part", 82),
        new("stress", "Stress", 68),
        new("worst-corner", "Worst corner", 98),
        new("value", "Value", 46, Align.Right),
        new("rating", "Rating", 74, Align.Right, "rating-basis"),
        new("clause", "Clause", 106, NoteKey: "clause-document"),
        new("allowed", "Allowed", 48, Align.Right),
        new("scale", "0 to rating", 62),
        new("margin", "Margin", 44, Align.Right, "kelvin-left"),
        new("margin-without-derating", "Without derating", 46, Align.Right),
        new("verdict", "Verdict", 78),
    ];

    public static Table Of(PaperInput input)
    {
        var rows = input.Ledger.Positions.SelectMany(p => Rows(input, p)).ToImmutableArray();
        return new Table("derating", "Every stress at its worst corner", Columns, rows)
        {
            WhenEmpty = "No position has been assessed.",
            Closing = string.Create(CultureInfo.InvariantCulture, $"End of list: {rows.Length} {(rows.Length == 1 ? "row" : "rows")}."),
        };
    }

    private static IEnumerable<Row> Rows(PaperInput input, LedgerPosition position)
    {
        var first = true;
        foreach (var row in position.Rows.Where(r => r.Verdict != Verdict.NotAssessed))
        {
            yield return new Row(Cells(input, position, row, first), first) { AtTop = Cells(input, position, row, true) };
            first = false;
        }
    }

    private static ImmutableArray<Cell> Cells(PaperInput input, LedgerPosition position, LedgerRow row, bool first)
    {
        var unit = row.Spec?.Unit ?? Units.One;
        return
        [
            new TextCell(row.Position, first ? Tone.Plain : Tone.Quiet) { Strong = first },
            first ? Part(position) : Cell.Empty,
            new TextCell(row.Name),
            new TextCell(row.Corner),
            Number(row.Stress, unit),
            Rating(input, position, row, unit),
            Clause(row),
            Number(row.Allowed, unit),
            new ScaleCell(Scale(row)),
            Number(row.Margin, Units.Percent) with { Note = row.KelvinLeft is { } k ? QuantityWriter.Write(k, Units.Kelvin) : "" },
            Number(row.MarginUnderated, Units.Percent),
            VerdictWords.Of(row),
        ];
    }

    private static TextCell Part(LedgerPosition position) => position.Fitting is { } fitting
        ? new(fitting.Part.FullName) { Note = fitting.Count > 1 ? fitting.Words : "" }
        : new("to be chosen", Tone.Quiet) { Note = position.Spec.Role };

    private static Cell Rating(PaperInput input, LedgerPosition position, LedgerRow row, Unit unit)
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
        Bound.Rating r => $"{RatingName(position, r.Key)}, {(row.Clause?.Basis == RatingBasis.AtTemperature ? "at temperature" : "as printed")}",
        Bound.Limit l => $"{RatingName(position, l.Key)}, limit",
        Bound.Required r => $"required: {input.Requirement.Find(r.Field)?.Field.Label ?? r.Field}",
        _ => "",
    };

    private static string RatingName(LedgerPosition position, string key) =>
        position.Fitting?.Part.Family.Ratings.FirstOrDefault(r => r.Key == key)?.Name ?? key.Replace('_', ' ');

    private static TextCell Clause(LedgerRow row) => row.Clause is { } clause
        ? new(clause.Operator.Words) { Note = Source(clause) }
        : new(row.Spec?.Bound switch
        {
            Bound.Limit => "limit of the part, not derated",
            Bound.Required => "the requirement itself",
            _ => "no clause",
        }, Tone.Quiet);

    private static string Source(Clause clause)
    {
        var place = clause.Place is "" or "none" ? "" : ", " + clause.Place;
        return $"{clause.Document}{place}; {Certainty(clause.Certainty)}";
    }

    private static string Certainty(Certainty certainty) => certainty switch
    {
        Engine.Derating.Certainty.SeenAtIssuer => "seen at the issuer",
        Engine.Derating.Certainty.SecondHand => "second-hand",
        Engine.Derating.Certainty.FromMemory => "from memory",
        _ => "common practice",
    };

    private static PointerScale? Scale(LedgerRow row) => row.Spec?.Side == Side.Floor
        ? PointerScale.Floor(row.Stress, row.Allowed)
        : PointerScale.Ceiling(row.Stress, row.Allowed, row.Rating);

    private static Cell Number(double? value, Unit unit) =>
        value is { } v ? new NumberCell(QuantityWriter.Write(v, unit)) : new TextCell("\u2013", Tone.Quiet);
}
