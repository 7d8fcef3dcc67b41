using Selector.Engine.Parts;
using Selector.Storage.Entities;

namespace Selector.Application.Catalogue;

/// <summary>Parts as rows of the store, both ways.</summary>
internal static class PartRows
{
    public static PartRecord Row(Part part)
    {
        var row = new PartRecord { Family = part.Family.Id, Maker = part.Maker, OrderingCode = part.OrderingCode, Ratings = "", Prices = "" };
        Copy(part, row);
        return row;
    }

    /// <summary>Writes everything but the key into a row; the context notices by itself whether anything changed.</summary>
    public static void Copy(Part part, PartRecord row)
    {
        row.ShopNumber = part.ShopNumber;
        row.Technology = part.Technology;
        row.Package = part.Package;
        row.Lifecycle = part.Lifecycle;
        row.Stock = part.Stock;
        row.LeastOrder = part.LeastOrder;
        row.Multiple = part.Multiple;
        row.Ratings = RatingsText.Format(part.Family, part.Ratings);
        row.Prices = PricesText.Format(part.Prices);
        row.Source = part.Source;
        row.Search = string.Join(' ', part.Maker, part.OrderingCode, part.ShopNumber, part.Package).ToLowerInvariant();
    }

    /// <exception cref="System.Text.Json.JsonException">The row was written by a later version of this program.</exception>
    public static Part Part(PartRecord row, FamilySpec family) => new()
    {
        Id = row.Id,
        Family = family,
        Maker = row.Maker,
        OrderingCode = row.OrderingCode,
        ShopNumber = row.ShopNumber,
        Technology = row.Technology,
        Package = row.Package,
        Lifecycle = row.Lifecycle,
        Stock = row.Stock,
        LeastOrder = row.LeastOrder,
        Multiple = row.Multiple,
        Ratings = RatingsText.Parse(row.Ratings, family),
        Prices = PricesText.Parse(row.Prices),
        Source = row.Source,
    };
}
