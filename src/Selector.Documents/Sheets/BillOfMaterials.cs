using System.Collections.Immutable;
using System.Globalization;
using Selector.Documents.Model;
using Selector.Engine.Quantities;

namespace Selector.Documents.Sheets;

/// <summary>The paper for purchasing: what to order, how much of it, and what a replacement would have to stand.</summary>
public static class BillOfMaterials
{
    public const string Title = "Bill of materials";

    public static Report Build(PaperInput input)
    {
        var build = BuildSize.Of(input.Requirement);
        var lines = OrderLine.Of(input.Ledger, build);
        return new Report(Title, Common.Cover(input),
        [
            new("", [Common.Counts(input.Ledger), .. Fault(input), Order(input, build, lines)]),
            new("Requirement, as typed and as understood", [Common.Requirement(input.Requirement)]),
            new("", [Cautions.For(input.Ledger)]),
            new("", [new Paragraph(Rule), BomTable.Of(input.Ledger, build, lines)]),
            new("", [OrderTable.Of(lines)]),
        ]);
    }

    private const string Rule =
        "A replacement must reach every least acceptable rating named for the position, at the conditions of the derating sheet; reaching them is not enough " +
        "where the circuit works with the part itself, such as its resistance or inductance: ask the designer. A part marked \"no substitution\" is never replaced by purchasing.";

    private static ImmutableArray<Block> Fault(PaperInput input) =>
        input.Ledger.Fault is { } fault ? [new Paragraph("Not solved. " + fault) { Strong = true }] : [];

    private static CountStrip Order(PaperInput input, BuildSize build, ImmutableArray<OrderLine> lines)
    {
        var empty = input.Ledger.Positions.Count(p => p.Fitting is null);
        var unknown = lines.Count(l => l.Quantity.Unit is null);
        var spares = QuantityWriter.Write(build.Spares, Units.Percent, 3, trim: true);
        return new(
        [
            new(Whole(build.Units), build.Units == 1 ? "supply" : "supplies"),
            new(spares, "spares"),
            new(Whole(lines.Length), lines.Length == 1 ? "order line" : "order lines"),
            Open(empty, "to be chosen"),
            Open(unknown, unknown == 1 ? "price unknown" : "prices unknown"),
            .. PriceCells.Extended(lines).Select(s => new CountItem(Money.Write(s.Sum), $"{s.Currency} build")),
            .. PriceCells.OneSupply(lines).Select(s => new CountItem(Money.Write(s.Sum), $"{s.Currency} one supply")),
        ],
        Summary(build, empty, unknown));
    }

    private static string Summary(BuildSize build, int empty, int unknown)
    {
        string[] open =
        [
            build.Assumed,
            empty > 0 ? "The bill is not complete: parts are still to be chosen." : "",
            unknown > 0 ? "The sums leave out what has no price." : "",
        ];
        var words = string.Join(" ", open.Where(o => o.Length > 0));
        return words.Length > 0 ? words : "Every position is filled and every part has a price.";
    }

    private static CountItem Open(int count, string words) =>
        count == 0 ? new("0", words, Mark.None, Tone.Quiet) : new(Whole(count), words, Mark.Open);

    private static string Whole(int number) => number.ToString(CultureInfo.InvariantCulture);
}
