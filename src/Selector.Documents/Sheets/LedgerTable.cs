using System.Collections.Immutable;
using System.Globalization;
using Selector.Documents.Model;
using Selector.Engine.Quantities;
using Selector.Engine.Supplies;

namespace Selector.Documents.Sheets;

/// <summary>The body of the derating sheet: one row for each stress of each position.</summary>
internal static class LedgerTable
{
    private static readonly ImmutableArray<Column> Columns =
    [
        new("position", "Position", 39),
        new("part", "Part", 76),
        new("stress", "Stress", 66),
        new("worst-corner", "Worst corner", 94),
        new("value", "Value", 44, Align.Right),
        new("rating", "Rating", 70, Align.Right, "rating-basis"),
        new("clause", "Clause", 128, NoteKey: "clause-document"),
        new("allowed", "Allowed", 46, Align.Right),
        new("scale", "0 to rating", 74) { IsDrawn = true },
        new("margin", "Margin", 42, Align.Right, "kelvin-left"),
        new("margin-without-derating", "Without derating", 46, Align.Right),
        new("verdict", "Verdict", 76),
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
            first ? LedgerCells.Part(position) : Cell.Empty,
            new TextCell(row.Name),
            new TextCell(row.Corner),
            LedgerCells.Number(row.Stress, unit),
            LedgerCells.Rating(input, position, row, unit),
            LedgerCells.Clause(row),
            LedgerCells.Number(row.Allowed, unit),
            new ScaleCell(LedgerCells.Scale(row)),
            LedgerCells.Number(row.Margin, Units.Percent) with { Note = row.KelvinLeft is { } k ? QuantityWriter.Write(k, Units.Kelvin) : "" },
            LedgerCells.Number(row.MarginUnderated, Units.Percent),
            VerdictWords.Of(row),
        ];
    }
}
