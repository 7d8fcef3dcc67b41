using Selector.Engine.Parts;

namespace Selector.Engine.Ranking;

/// <summary>
/// Best first: those that keep the least margin by extended price, then stock, then part number; the rest by margin rounded to
/// 0.1 %, then the same. A part whose price is not known comes after those whose price is.
/// </summary>
public sealed class CandidateOrder : IComparer<Candidate>
{
    public static CandidateOrder Best { get; } = new();

    public int Compare(Candidate? x, Candidate? y)
    {
        ArgumentNullException.ThrowIfNull(x);
        ArgumentNullException.ThrowIfNull(y);
        var byStanding = x.Standing.CompareTo(y.Standing);
        if (byStanding != 0)
        {
            return byStanding;
        }

        if (x.Standing != Standing.Holds && Rounded(y).CompareTo(Rounded(x)) is not 0 and var byMargin)
        {
            return byMargin;
        }

        var byPrice = (x.Extended ?? long.MaxValue).CompareTo(y.Extended ?? long.MaxValue);
        return byPrice != 0 ? byPrice
            : y.Part.Stock.CompareTo(x.Part.Stock) is not 0 and var byStock ? byStock
            : string.CompareOrdinal(x.Part.OrderingCode, y.Part.OrderingCode) is not 0 and var byCode ? byCode
            : string.CompareOrdinal(x.Part.Maker, y.Part.Maker) is not 0 and var byMaker ? byMaker
            : x.Fitting.Count.CompareTo(y.Fitting.Count);
    }

    private static double Rounded(Candidate c) =>
        c.LeastMargin is { } m ? Math.Round(m, 3, MidpointRounding.AwayFromZero) : double.MinValue;
}
