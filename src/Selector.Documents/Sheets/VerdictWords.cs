using Selector.Documents.Model;
using Selector.Engine.Quantities;
using Selector.Engine.Supplies;

namespace Selector.Documents.Sheets;

/// <summary>The verdict of a row in words, shape and colour. The words stand alone; the rest confirms them.</summary>
public static class VerdictWords
{
    /// <summary>A margin below this is said to be close.</summary>
    public const double Close = 0.05;

    public static VerdictCell Of(LedgerRow row) => row.Verdict switch
    {
        Verdict.Holds when row.Margin < Close => new(Mark.Half, "holds, under 5\u202f%", Tone.Close),
        Verdict.Holds => new(Mark.Full, "holds", Tone.Plain),
        Verdict.Lacks when row.Margin is { } margin => new(Mark.Cross, "lacks " + Lack(-margin), Tone.Lacks),
        Verdict.Lacks => new(Mark.Cross, "lacks", Tone.Lacks),
        Verdict.NotUsable => new(Mark.Cross, With("not usable", row.Reason), Tone.Lacks),
        Verdict.NotRated => new(Mark.Open, With("not rated", row.Reason), Tone.Plain),
        Verdict.NotCovered => new(Mark.Open, With("not covered", row.Reason), Tone.Plain),
        Verdict.NotAssessed => new(Mark.Open, "not assessed", Tone.Plain),
        Verdict.NoPart => new(Mark.Open, "no part fitted", Tone.Plain),
        Verdict.NoDemand => new(Mark.Full, "no demand", Tone.Plain),
        _ => throw new ArgumentOutOfRangeException(nameof(row), row.Verdict, "Unknown verdict."),
    };

    private static string Lack(double share) => QuantityWriter.Write(share, Units.Percent, 2);

    private static string With(string verdict, string reason) => reason.Length == 0 ? verdict : $"{verdict}: {reason}";
}
