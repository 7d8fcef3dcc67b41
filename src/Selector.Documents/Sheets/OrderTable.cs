using System.Collections.Immutable;
using System.Globalization;
using Selector.Documents.Model;

namespace Selector.Documents.Sheets;

/// <summary>The order by part: what purchasing copies into the order, each part once.</summary>
internal static class OrderTable
{
    private static readonly ImmutableArray<Column> Columns =
    [
        new("line", "Line", 24, Align.Right),
        new("ordering-code", "Maker and full ordering code", 150, NoteKey: "standing"),
        new("shop-number", "Shop number", 62),
        new("positions", "Positions", 110),
        new("one-supply", "One supply", 40, Align.Right),
        new("needed", "Needed", 44, Align.Right),
        new("order", "Order", 44, Align.Right, "order-rule"),
        new("stock", "In stock", 40, Align.Right),
        new("unit-price", "Unit price", 62, Align.Right),
        new("extended", "Extended", 72, Align.Right),
        new("price-date", "Price of", 54),
    ];

    public static Table Of(ImmutableArray<OrderLine> lines) => new("order", "Order by part", Columns,
        [.. lines.Select((line, i) => Line(line, i + 1)), .. Totals(lines)])
    {
        WhenEmpty = "No part is fitted, so nothing can be ordered.",
        Closing = string.Create(CultureInfo.InvariantCulture, $"End of list: {lines.Length} order {(lines.Length == 1 ? "line" : "lines")}."),
    };

    private static Row Line(OrderLine line, int number) => new(
    [
        Whole(number),
        new TextCell(line.Part.FullName) { Note = PartWords.Standing(line.Part) },
        new TextCell(line.Part.ShopNumber),
        new TextCell(string.Join(", ", line.Positions)),
        Whole(line.PerSupply),
        Whole(line.Quantity.Needed),
        Whole(line.Quantity.Ordered) with { Note = PriceCells.Rule(line.Part) },
        Whole(line.Part.Stock),
        PriceCells.Unit(line),
        PriceCells.Extended(line),
        PriceCells.Date(line),
    ]);

    private static IEnumerable<Row> Totals(ImmutableArray<OrderLine> lines) => PriceCells.Extended(lines).Select((sum, i) => new Row(
    [
        Cell.Empty,
        new TextCell("Order total") { Strong = true, Note = PriceCells.Without(lines) },
        Cell.Empty, Cell.Empty, Cell.Empty, Cell.Empty, Cell.Empty, Cell.Empty, Cell.Empty,
        new NumberCell(Money.Write(sum.Sum, sum.Currency)),
        Cell.Empty,
    ],
    StartsGroup: i == 0) { IsTotal = true });

    private static NumberCell Whole(int number) => new(number.ToString(CultureInfo.InvariantCulture));
}
