using Selector.Engine.Parts;

namespace Selector.Engine.Tests.Support;

/// <summary>Parts made of named ratings; what is not named is not given.</summary>
internal static class TestPart
{
    public static Part Of(FamilySpec family, string code, params (string Key, double Value)[] ratings) => new()
    {
        Family = family,
        Maker = "Test",
        OrderingCode = code,
        Technology = family.Technologies[0],
        Ratings =
        [
            .. family.Ratings.Select(r => ratings.Where(x => x.Key == r.Key).Select(x => x.Value).DefaultIfEmpty(double.NaN).Single()),
        ],
    };

    public static Part Priced(this Part part, long tenThousandths, int stock = 0) => part with
    {
        Prices = new PriceList("EUR", "2026-11-02", [new PriceBreak(1, tenThousandths)]),
        Stock = stock,
    };

    /// <summary>The same part with one rating changed.</summary>
    public static Part With(this Part part, string key, double value) => part with
    {
        Ratings = part.Ratings.SetItem(part.Family.Ordinal(key), value),
    };
}
