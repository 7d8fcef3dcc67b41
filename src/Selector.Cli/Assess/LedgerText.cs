using System.Globalization;
using System.Text;
using Selector.Application.Assessing;
using Selector.Documents.Sheets;
using Selector.Engine.Quantities;
using Selector.Engine.Supplies;

namespace Selector.Cli.Assess;

/// <summary>The ledger as a table for a terminal: counts first, then one line for each row.</summary>
internal static class LedgerText
{
    private static readonly string[] Heads = ["position", "stress", "value", "allowed", "margin", "verdict", "corner"];

    public static string Of(OfflineAssessment assessment)
    {
        var ledger = assessment.Ledger;
        var text = new StringBuilder().Append(assessment.Name).Append(", ").AppendLine(ledger.Policy);
        foreach (var fault in assessment.Faults)
        {
            text.AppendLine(fault);
        }

        if (ledger.Fault is { } whole)
        {
            return text.AppendLine(whole).ToString();
        }

        var c = ledger.Counts;
        text.AppendLine(CultureInfo.InvariantCulture, $"{c.Hold} hold, {c.Lack} lack, {c.NotRated} not rated, {c.NotAssessed} not assessed, {c.NotCovered} not covered, {c.NotUsable} not usable, {c.Empty} empty").AppendLine();
        string[][] lines = [Heads, .. ledger.Rows.Select(Line)];
        var widths = Enumerable.Range(0, Heads.Length - 1).Select(i => lines.Max(l => l[i].Length)).ToArray();
        foreach (var line in lines)
        {
            for (var i = 0; i < widths.Length; i++)
            {
                text.Append(i is 2 or 3 or 4 ? line[i].PadLeft(widths[i]) : line[i].PadRight(widths[i])).Append("  ");
            }

            text.AppendLine(line[^1]);
        }

        return text.ToString();
    }

    private static string[] Line(LedgerRow row) =>
    [
        row.Position, row.Name, Say(row.Stress, row.Spec?.Unit), Say(row.Allowed, row.Spec?.Unit), Say(row.Margin, Units.Percent), VerdictWords.Of(row).Text, row.Corner,
    ];

    private static string Say(double? value, Unit? unit) => value is { } v && unit is not null ? QuantityWriter.Write(v, unit) : "";
}
