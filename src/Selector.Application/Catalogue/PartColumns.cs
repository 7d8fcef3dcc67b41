using System.Collections.Immutable;
using Selector.Engine.Parts;

namespace Selector.Application.Catalogue;

/// <summary>Headings of a catalogue file: those of every family, then one for each of its ratings.</summary>
public static class PartColumns
{
    public const string Maker = "maker";
    public const string OrderingCode = "ordering_code";
    public const string ShopNumber = "shop_number";
    public const string Technology = "technology";
    public const string Package = "package";
    public const string Lifecycle = "lifecycle";
    public const string Stock = "stock";
    public const string LeastOrder = "least_order";
    public const string Multiple = "multiple";
    public const string Currency = "currency";
    public const string PriceDate = "price_date";
    public const string PriceBreaks = "price_breaks";
    public const string Source = "source";

    public static ImmutableArray<string> Common { get; } =
    [
        Maker, OrderingCode, ShopNumber, Technology, Package, Lifecycle, Stock, LeastOrder, Multiple, Currency, PriceDate, PriceBreaks, Source,
    ];

    public static ImmutableArray<string> Of(FamilySpec family) => [.. Common, .. family.Ratings.Select(r => r.Column)];

    /// <summary>Headings without which no row of the family can be good.</summary>
    public static ImmutableArray<string> Needed(FamilySpec family) =>
        [Maker, OrderingCode, .. family.Ratings.Where(r => r.Required).Select(r => r.Column)];
}
