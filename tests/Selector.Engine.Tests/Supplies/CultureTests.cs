using System.Globalization;
using Selector.Engine.Circuits;
using Selector.Engine.Supplies;
using Selector.Engine.Tests.Support;

namespace Selector.Engine.Tests.Supplies;

public class CultureTests
{
    [Fact]
    public void A_ledger_is_the_same_to_the_bit_in_five_cultures_and_three_runs()
    {
        Assert.Equal("1,5", In("de-DE", () => 1.5.ToString(CultureInfo.CurrentCulture)));
        var expected = In("", Print);

        foreach (var culture in (string[])["en-GB", "de-DE", "fr-FR", "tr-TR", "ar-SA"])
        {
            for (var run = 0; run < 3; run++)
            {
                Assert.Equal(expected, In(culture, Print));
            }
        }
    }

    private static string Print()
    {
        var requirement = Requirement.Empty.With("sense", "bank").With(CommonFields.LoadFull, "1,5 A");
        var ledger = Assessor.Assess(Standard.Registry, DemoParts.Fitted(requirement), TestPolicy.Industrial, Budget.Standard);
        Assert.NotEmpty(ledger.Positions);
        return string.Join('\n', ledger.Rows.Select(r => string.Join('|',
            r.Id, r.Verdict, Bits(r.Stress), Bits(r.Allowed), Bits(r.Margin), Bits(r.LeastRating), r.Corner, r.Reason)));
    }

    private static string Bits(double? value) =>
        value is { } v ? BitConverter.DoubleToInt64Bits(v).ToString("x", CultureInfo.InvariantCulture) : "-";

    private static string In(string culture, Func<string> work)
    {
        var before = CultureInfo.CurrentCulture;
        try
        {
            CultureInfo.CurrentCulture = new CultureInfo(culture);
            return work();
        }
        finally
        {
            CultureInfo.CurrentCulture = before;
        }
    }
}
