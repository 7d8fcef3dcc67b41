using System.Collections.Immutable;
using System.Globalization;
using Selector.Documents.Model;
using Selector.Engine.Parts;

namespace Selector.Documents.Sheets;

/// <summary>Prices of order lines as cells. An unknown price is said in words and counted, never taken as nothing.</summary>
internal static class PriceCells
{
    public const string Unknown = "price unknown";

    public static Cell Unit(OrderLine line) => line.Quantity.Unit is { } unit
        ? new NumberCell(Money.Write(unit, line.Currency)) : new TextCell(Unknown);

    public static Cell Extended(OrderLine line) => line.Quantity.Extended is { } extended
        ? new NumberCell(Money.Write(extended, line.Currency)) : new TextCell("\u2013", Tone.Quiet);

    public static Cell Date(OrderLine line) => line.Quantity.Unit is null
        ? new TextCell("\u2013", Tone.Quiet)
        : new TextCell(line.Part.Prices.Date.Length == 0 ? "undated" : line.Part.Prices.Date);

    /// <summary>Why more is ordered than is needed: least order and multiple of the part.</summary>
    public static string Rule(Part part) => string.Join(", ", new[]
    {
        part.LeastOrder > 1 ? string.Create(CultureInfo.InvariantCulture, $"least {part.LeastOrder}") : "",
        part.Multiple > 1 ? string.Create(CultureInfo.InvariantCulture, $"in {part.Multiple}s") : "",
    }.Where(w => w.Length > 0));

    public static IReadOnlyList<(string Currency, long Sum)> Extended(IEnumerable<OrderLine> lines) => Money.Sums(
        lines.Where(l => l.Quantity.Extended is not null).Select(l => (l.Currency, l.Quantity.Extended!.Value)));

    public static IReadOnlyList<(string Currency, long Sum)> OneSupply(IEnumerable<OrderLine> lines) => Money.Sums(
        lines.Where(l => l.OneSupply is not null).Select(l => (l.Currency, l.OneSupply!.Value)));

    /// <summary>What a total leaves out; empty when it is complete.</summary>
    public static string Without(ImmutableArray<OrderLine> lines) => lines.Count(l => l.Quantity.Unit is null) switch
    {
        0 => "",
        1 => "without 1 line whose price is unknown",
        var n => string.Create(CultureInfo.InvariantCulture, $"without {n} lines whose price is unknown"),
    };
}
