using System.Collections.Immutable;

namespace Selector.Engine.Parts;

/// <summary>A price from a quantity upwards, in ten-thousandths of the currency unit.</summary>
public readonly record struct PriceBreak(int From, long TenThousandths);

/// <summary>What a part costs by quantity. Money is kept in whole ten-thousandths so that sums are exact.</summary>
/// <param name="Currency">ISO 4217 code.</param>
/// <param name="Date">Day of the quotation, year-month-day; empty when unknown.</param>
/// <param name="Breaks">Rising in quantity.</param>
public sealed record PriceList(string Currency, string Date, ImmutableArray<PriceBreak> Breaks)
{
    public static PriceList None { get; } = new("", "", []);

    public bool IsKnown => !Breaks.IsEmpty;

    /// <summary>Price of one at the given quantity, in ten-thousandths; the first break also serves below its quantity. Null when there is no price.</summary>
    public long? UnitAt(int quantity)
    {
        if (Breaks.IsEmpty)
        {
            return null;
        }

        var price = Breaks[0].TenThousandths;
        foreach (var b in Breaks)
        {
            if (b.From <= quantity)
            {
                price = b.TenThousandths;
            }
        }

        return price;
    }
}
