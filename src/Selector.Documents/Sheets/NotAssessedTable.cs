using System.Collections.Immutable;
using System.Globalization;
using Selector.Documents.Model;
using Selector.Engine.Supplies;

namespace Selector.Documents.Sheets;

/// <summary>What this version leaves out. It has its own list, since the checker must cover it by other means.</summary>
internal static class NotAssessedTable
{
    public static Table Of(Ledger ledger)
    {
        ImmutableArray<Row> rows =
        [
            .. ledger.Rows.Where(r => r.Verdict == Verdict.NotAssessed).Select(r => new Row(
            [
                new TextCell(r.Position) { Strong = true },
                new TextCell(r.Name),
                VerdictWords.Of(r),
                Cell.Empty,
            ])),
        ];
        return new Table(
            "not-assessed",
            "Not assessed: to be covered by other means",
            [new("position", "Position", 60), new("stress", "What is left out", 330), new("verdict", "Verdict", 100), new("covered-by", "Covered by, name and date", 250)],
            rows)
        {
            WhenEmpty = "Nothing is left out.",
            Closing = string.Create(CultureInfo.InvariantCulture, $"End of list: {rows.Length} not assessed."),
        };
    }
}
