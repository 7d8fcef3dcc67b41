using System.Collections.Immutable;
using System.Globalization;
using Selector.Documents.Model;
using Selector.Engine.Supplies;

namespace Selector.Documents.Sheets;

/// <summary>What every paper of a supply has in common: cover, counts, requirement.</summary>
internal static class Common
{
    public static Cover Cover(PaperInput input) => new(
        string.Create(CultureInfo.InvariantCulture, $"Supply {input.SupplyNumber:0000}"),
        string.IsNullOrWhiteSpace(input.SupplyName) ? "unnamed" : input.SupplyName.Trim(),
        input.Issue,
        [
            new("Issue", input.Issue),
            new("Edited", input.Edited),
            new("Policy", input.Ledger.Policy, input.PolicyStanding),
            new("Engine version", input.Engine),
            .. input.Shop.Length == 0 ? [] : new Fact[] { new("Shop", input.Shop) },
        ],
        [new("Drawn", input.Drawn), new("Checked", input.Checked), new("Approved", input.Approved)])
    {
        Rests = [$"policy {input.Ledger.Policy}", $"engine {input.Engine}"],
    };

    /// <summary>Counts before anything else; a zero is shown too, so that nobody wonders whether it was counted.</summary>
    public static CountStrip Counts(Ledger ledger)
    {
        var c = ledger.Counts;
        return new(
        [
            Count(c.Hold, "hold", Mark.Full, Tone.Plain),
            Count(c.Lack, c.Lack == 1 ? "lacks" : "lack", Mark.Cross, Tone.Lacks),
            Count(c.NotUsable, "not usable", Mark.Cross, Tone.Lacks),
            Count(c.NotRated, "not rated", Mark.Open, Tone.Plain),
            Count(c.NotAssessed, "not assessed", Mark.Open, Tone.Plain),
            Count(c.NotCovered, "not covered", Mark.Open, Tone.Plain),
            Count(c.Assumed, "assumed", Mark.Open, Tone.Plain),
            Count(c.Empty, c.Empty == 1 ? "empty position" : "empty positions", Mark.Open, Tone.Plain),
        ],
        Summary(ledger));
    }

    public static FactGrid Requirement(RequirementValues requirement) => new(
        "requirement",
        [
            .. requirement.Fields.Where(f => f.Shown).Select(f => new Fact(
                f.Field.Label, f.Text, f.Fault is null ? f.Echo : "", f.Fault ?? "")),
        ]);

    private static CountItem Count(int count, string words, Mark mark, Tone tone) => count == 0
        ? new("0", words, Mark.None, Tone.Quiet)
        : new(count.ToString(CultureInfo.InvariantCulture), words, mark, tone);

    private static string Summary(Ledger ledger)
    {
        if (ledger.Fault is not null)
        {
            return "Nothing could be solved; see the fault below.";
        }

        var c = ledger.Counts;
        if (c.Passes)
        {
            return "Every stress that is listed is assessed, rated and covered, and holds.";
        }

        var open = c.NotRated + c.NotAssessed + c.NotCovered;
        var reasons = new List<string>();
        if (c.Lack + c.NotUsable > 0)
        {
            reasons.Add(Lacking(ledger));
        }

        if (open > 0)
        {
            reasons.Add(open == 1 ? "one stress has no finding" : string.Create(CultureInfo.InvariantCulture, $"{open} stresses have no finding"));
        }

        if (c.Empty > 0)
        {
            reasons.Add(c.Empty == 1 ? "one position is empty" : string.Create(CultureInfo.InvariantCulture, $"{c.Empty} positions are empty"));
        }

        return reasons.Count == 0 ? "No overall pass: nothing has been assessed." : $"No overall pass: {string.Join("; ", reasons)}.";
    }

    private static string Lacking(Ledger ledger)
    {
        var rows = ledger.Rows.Where(r => r.Verdict is Verdict.Lacks or Verdict.NotUsable).Select(r => $"{r.Position} {r.Name}").ToImmutableArray();
        const int Named = 3;
        var more = rows.Length > Named ? string.Create(CultureInfo.InvariantCulture, $" and {rows.Length - Named} more") : "";
        return $"{string.Join(", ", rows.Take(Named))}{more} {(rows.Length == 1 ? "does" : "do")} not hold";
    }
}
