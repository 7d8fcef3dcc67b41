using System.Collections.Immutable;
using System.Globalization;
using Selector.Documents.Model;
using Selector.Engine.Supplies;

namespace Selector.Documents.Sheets;

/// <summary>
/// The bill of materials by position. A part that fills several positions is ordered at the first of them, for all; the others
/// point there, so that the extended prices add up to the order and nothing is bought twice.
/// </summary>
internal static class BomTable
{
    private static readonly ImmutableArray<Column> Columns =
    [
        new("position", "Position", 42, NoteKey: "role"),
        new("quantity", "Qty", 24, Align.Right),
        new("ordering-code", "Maker and full ordering code", 98, NoteKey: "standing"),
        new("shop-number", "Shop number", 50),
        new("description", "Description", 104, NoteKey: "arrangement"),
        new("least-rating", "Least acceptable rating", 124),
        new("substitution", "Substitution", 52),
        new("needed", "Needed", 36, Align.Right),
        new("order", "Order", 46, Align.Right, "order-rule"),
        new("unit-price", "Unit price", 56, Align.Right),
        new("extended", "Extended", 62, Align.Right),
        new("price-date", "Price of", 48),
    ];

    public static Table Of(Ledger ledger, BuildSize build, ImmutableArray<OrderLine> lines)
    {
        var rows = ledger.Positions.Select(p => Position(p, build, lines)).ToImmutableArray();
        return new Table("bill-of-materials", "By position", Columns, [.. rows, .. Totals(lines)])
        {
            WhenEmpty = "The supply has no positions yet.",
            Closing = string.Create(CultureInfo.InvariantCulture, $"End of list: {rows.Length} {(rows.Length == 1 ? "position" : "positions")}."),
        };
    }

    private static Row Position(LedgerPosition position, BuildSize build, ImmutableArray<OrderLine> lines)
    {
        var fitting = position.Fitting;
        var pieces = OrderLine.Pieces(position);
        return new Row(
        [
            new TextCell(position.Spec.Id) { Strong = true, Note = position.Spec.Role },
            Whole(pieces),
            fitting is null
                ? new TextCell("to be chosen") { Strong = true }
                : new TextCell(fitting.Part.FullName) { Note = PartWords.Standing(fitting.Part) },
            new TextCell(fitting?.Part.ShopNumber ?? ""),
            fitting is null
                ? new TextCell(position.Spec.Family.Replace('-', ' '))
                : new TextCell(PartWords.Description(fitting)) { Note = fitting.Count > 1 ? fitting.Words : "" },
            Least(position),
            new TextCell(fitting?.Part.Family.SafetyCritical == true ? "no substitution" : "") { Strong = true },
            Whole(checked(pieces * build.Units)),
            .. Order(position, lines),
        ],
        StartsGroup: true);
    }

    private static TextCell Least(LedgerPosition position)
    {
        var ratings = string.Join('\n', PartWords.LeastRatings(position));
        return ratings.Length == 0 ? new("none computed", Tone.Quiet) : new(ratings);
    }

    private static Cell[] Order(LedgerPosition position, ImmutableArray<OrderLine> lines)
    {
        var dash = new TextCell("\u2013", Tone.Quiet);
        if (position.Fitting is not { } fitting)
        {
            return [dash, dash, dash, dash];
        }

        var line = lines.Single(l => l.IsFor(fitting.Part));
        if (line.Positions[0] != position.Spec.Id)
        {
            return [new TextCell("with " + line.Positions[0], Tone.Quiet), dash, dash, dash];
        }

        string[] notes = [line.Positions.Length > 1 ? "for " + string.Join(", ", line.Positions) : "", PriceCells.Rule(fitting.Part)];
        return
        [
            Whole(line.Quantity.Ordered) with { Note = string.Join("; ", notes.Where(n => n.Length > 0)) },
            PriceCells.Unit(line),
            PriceCells.Extended(line),
            PriceCells.Date(line),
        ];
    }

    private static IEnumerable<Row> Totals(ImmutableArray<OrderLine> lines) =>
        Sums("Build", "as ordered, with spares and multiples", PriceCells.Extended(lines), lines)
            .Concat(Sums("One supply", "its pieces at the price of the order", PriceCells.OneSupply(lines), lines));

    private static IEnumerable<Row> Sums(
        string what, string how, IReadOnlyList<(string Currency, long Sum)> sums, ImmutableArray<OrderLine> lines)
    {
        var without = PriceCells.Without(lines);
        var description = without.Length == 0 ? how : $"{how}; {without}";
        return sums.Select((s, i) => new Row(
        [
            Cell.Empty, Cell.Empty,
            new TextCell(what) { Strong = true },
            Cell.Empty, Cell.Empty,
            new TextCell(i == 0 ? description : "", Tone.Quiet),
            Cell.Empty, Cell.Empty, Cell.Empty, Cell.Empty,
            new NumberCell(Money.Write(s.Sum, s.Currency)),
            Cell.Empty,
        ],
        StartsGroup: i == 0) { IsTotal = true });
    }

    private static NumberCell Whole(int number) => new(number.ToString(CultureInfo.InvariantCulture));
}
