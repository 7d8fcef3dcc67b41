using System.Globalization;

namespace Selector.Documents.Sheets;

/// <summary>
/// Writes money that is kept in whole ten-thousandths. No step of it is a binary fraction: purchasing adds these figures up by
/// hand and must get the same sum.
/// </summary>
public static class Money
{
    private const long Whole = 10_000;
    private const long Cent = 100;

    /// <summary>Two decimals, or four where the amount has them: "1.26", "0.0375".</summary>
    public static string Write(long tenThousandths)
    {
        var (whole, rest) = Math.DivRem(tenThousandths, Whole);
        var sign = tenThousandths < 0 ? "-" : "";
        var fraction = Math.Abs(rest);
        var decimals = fraction % Cent == 0
            ? (fraction / Cent).ToString("00", CultureInfo.InvariantCulture)
            : fraction.ToString("0000", CultureInfo.InvariantCulture);
        return string.Create(CultureInfo.InvariantCulture, $"{sign}{whole.ToString(CultureInfo.InvariantCulture).TrimStart('-')}.{decimals}");
    }

    /// <summary>With its currency: "27.34 EUR"; the space does not break.</summary>
    public static string Write(long tenThousandths, string currency) =>
        currency.Length == 0 ? Write(tenThousandths) : $"{Write(tenThousandths)}\u00a0{currency}";

    /// <summary>Sums by currency, in the order of the codes; sums in different currencies are never added.</summary>
    public static IReadOnlyList<(string Currency, long Sum)> Sums(IEnumerable<(string Currency, long Amount)> amounts) =>
    [
        .. amounts.GroupBy(a => a.Currency, StringComparer.Ordinal)
            .OrderBy(g => g.Key, StringComparer.Ordinal)
            .Select(g => (g.Key, g.Aggregate(0L, (sum, a) => checked(sum + a.Amount)))),
    ];

    /// <summary>Sums in words: "27.34 EUR and 3.10 USD".</summary>
    public static string Words(IReadOnlyList<(string Currency, long Sum)> sums) =>
        sums.Count == 0 ? "no price known" : string.Join(" and ", sums.Select(s => Write(s.Sum, s.Currency)));
}
