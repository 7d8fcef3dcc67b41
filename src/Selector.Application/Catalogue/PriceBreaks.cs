using System.Collections.Immutable;
using System.Globalization;
using Selector.Engine.Parts;

namespace Selector.Application.Catalogue;

/// <summary>Prices by quantity as a cell: "1:0.85 10:0.72 100:0.61". Money is read as decimal digits into whole ten-thousandths; no binary fraction is ever between.</summary>
internal static class PriceBreaks
{
    private const int Places = 4;
    private const long Unit = 10_000;

    /// <summary>Dearer than any part, and far from where sums over a build would overflow.</summary>
    private const long Dearest = 1_000_000 * Unit;

    public static string Format(ImmutableArray<PriceBreak> breaks) =>
        string.Join(' ', breaks.Select(b => string.Create(CultureInfo.InvariantCulture, $"{b.From}:{Money(b.TenThousandths)}")));

    /// <exception cref="FormatException">Says what is wrong.</exception>
    public static ImmutableArray<PriceBreak> Parse(string cell)
    {
        var breaks = ImmutableArray.CreateBuilder<PriceBreak>();
        foreach (var word in cell.Split(' ', StringSplitOptions.RemoveEmptyEntries))
        {
            var halves = word.Split(':');
            if (halves.Length != 2 || !int.TryParse(halves[0], NumberStyles.None, CultureInfo.InvariantCulture, out var from) || from < 1)
            {
                throw new FormatException($"\u201c{PlainText.Short(word)}\u201d is no quantity and price.");
            }

            if (breaks.Count > 0 && breaks[^1].From >= from)
            {
                throw new FormatException("The quantities do not rise.");
            }

            breaks.Add(new PriceBreak(from, Amount(halves[1])));
        }

        return breaks.ToImmutable();
    }

    private static long Amount(string text)
    {
        var halves = text.Split('.');
        var fraction = halves.Length == 2 ? halves[1] : "";
        var digits = halves.Length <= 2 && halves[0].Length > 0 && (halves[0] + fraction).All(char.IsAsciiDigit)
            && (halves.Length == 1 || fraction.Length > 0);
        if (!digits || fraction.Length > Places)
        {
            throw new FormatException($"\u201c{PlainText.Short(text)}\u201d is no price with a decimal point and at most four decimals.");
        }

        return long.TryParse(halves[0] + fraction.PadRight(Places, '0'), NumberStyles.None, CultureInfo.InvariantCulture, out var amount) && amount <= Dearest
            ? amount
            : throw new FormatException($"The price {PlainText.Short(text)} is too high.");
    }

    /// <summary>At least two decimals, as money is written; more where they are needed.</summary>
    private static string Money(long tenThousandths)
    {
        var fraction = (tenThousandths % Unit).ToString("D4", CultureInfo.InvariantCulture);
        var kept = fraction[..2] + fraction[2..].TrimEnd('0');
        return string.Create(CultureInfo.InvariantCulture, $"{tenThousandths / Unit}.{kept}");
    }
}
