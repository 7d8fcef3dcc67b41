using Selector.Documents.Model;
using Selector.Documents.Sheets;
using Selector.Documents.Tests.Support;
using Selector.Engine.Supplies;

namespace Selector.Documents.Tests;

public class DeratingSheetTests
{
    private static readonly Report Sheet = DeratingSheet.Build(SampleLedger.Input);
    private static readonly Table Rows = Sheet.Tables.Single(t => t.Name == "derating");

    [Fact]
    public void A_lacking_row_says_everything()
    {
        var row = Find("C1", "ripple current, weighted");

        Assert.Equal(
            ["C1", "Arden LE4-472-35", "ripple current, weighted", "mains +10 %, 1.500 A, C new", "1.28\u202fA", "1.45\u202fA", "0.8 of rating; common practice", "1.16\u202fA", "", "-10.4\u202f%", "11.7\u202f%", "lacks 10\u202f%"],
            row.Cells.Select(c => c.Text));
        Assert.Equal("ripple current", row.Cells[5].Note);
        Assert.Equal("general industrial practice", row.Cells[6].Note);
        Assert.Equal(Tone.Lacks, Assert.IsType<VerdictCell>(row.Cells[11]).Tone);
    }

    [Fact]
    public void A_temperature_has_its_kelvins() => Assert.Equal("28.8\u202fK", Find("D1-D4", "junction temperature").Cells[9].Note);

    [Fact]
    public void The_clause_names_operator_certainty_document_and_place_and_the_rating_its_basis()
    {
        var row = Find("D5", "average current");

        Assert.Equal(("0.7 of rating; second-hand", "House rules for rectifiers, clause 4.2"), (row.Cells[6].Text, row.Cells[6].Note));
        Assert.Equal("at temperature", row.Cells[5].Note);
        Assert.Equal("as printed", Find("C1", "voltage").Cells[5].Note);
        Assert.Equal("required: Life", Find("C1", "life").Cells[5].Note);
    }

    [Theory]
    [InlineData("C1", "voltage", Mark.Half, Tone.Close, "holds, under 5\u202f%")]
    [InlineData("D5", "reverse voltage", Mark.Full, Tone.Plain, "holds")]
    [InlineData("D1-D4", "melting integral", Mark.Open, Tone.Plain, "not rated: needs surge integral of D1-D4")]
    [InlineData("U1", "duty at low bus", Mark.Open, Tone.Plain, "not covered: the policy has no clause for it")]
    [InlineData("U1", "least on-time", Mark.Cross, Tone.Lacks, "not usable: no operating point: the source cannot give what is asked")]
    [InlineData("R4", "voltage", Mark.Full, Tone.Plain, "no demand")]
    [InlineData("C3", "voltage", Mark.Open, Tone.Plain, "no part fitted")]
    public void The_words_carry_the_verdict(string position, string stress, Mark mark, Tone tone, string words) =>
        Assert.Equal(new VerdictCell(mark, words, tone), Find(position, stress).Cells[11]);

    [Fact]
    public void Every_row_of_the_ledger_is_on_the_sheet_once()
    {
        var left = Sheet.Tables.Single(t => t.Name == "not-assessed");

        Assert.Equal(SampleLedger.Whole.Rows.Count(), Rows.Rows.Length + left.Rows.Length);
        Assert.Equal(SampleLedger.Whole.Rows.Where(r => r.Verdict == Verdict.NotAssessed).Select(r => r.Name), left.Rows.Select(r => r.Cells[1].Text));
    }

    [Fact]
    public void Counts_are_those_of_the_ledger_and_come_first()
    {
        var strip = Assert.IsType<CountStrip>(Sheet.Sections[0].Blocks[0]);

        Assert.Equal(["22 hold", "3 lack", "1 not usable", "2 not rated", "4 not assessed", "1 not covered", "0 assumed", "1 empty position"], strip.Items.Select(i => $"{i.Value} {i.Words}"));
        Assert.StartsWith("No overall pass: C1 ripple current, weighted, ", strip.Summary, StringComparison.Ordinal);
    }

    [Fact]
    public void A_pass_is_only_said_of_a_whole_ledger()
    {
        var good = SampleLedger.Of([], [], SampleLedger.Whole.Positions.Single(p => p.Spec.Id == "L1"));

        Assert.True(good.Counts.Passes);
        Assert.StartsWith("Every stress", Summary(good), StringComparison.Ordinal);
        Assert.StartsWith("No overall pass", Summary(good with { Counts = good.Counts with { NotAssessed = 1 } }), StringComparison.Ordinal);
        Assert.StartsWith("No overall pass", Summary(SampleLedger.Of([], [])), StringComparison.Ordinal);
    }

    [Fact]
    public void A_fault_is_said_instead_of_an_assessment()
    {
        var sheet = DeratingSheet.Build(SampleLedger.EmptyInput);

        Assert.Contains(sheet.Sections[0].Blocks, b => b is Paragraph { Strong: true } p && p.Text.Contains("Output voltage: type a value.", StringComparison.Ordinal));
        Assert.Empty(sheet.Tables.First().Rows);
    }

    [Fact]
    public void Both_papers_warn_of_mains_stored_energy_heat_and_earth_and_defer_to_local_codes() => Assert.All(
        Papers.Reports(SampleLedger.Input),
        report =>
        {
            var points = report.Sections.SelectMany(s => s.Blocks).OfType<Caution>().Single().Points;
            Assert.Equal(["Mains", "Stored energy", "Heat", "Protective earth", "Approvals", "Who decides", "This circuit"], points.Select(p => p.Word));
            Assert.Contains("licensed person", points[5].Text, StringComparison.Ordinal);
            Assert.Equal(SampleLedger.Whole.Cautions[0], points[6].Text);
        });

    [Fact]
    public void The_requirement_is_shown_as_typed_and_as_understood() => Assert.Contains(
        new Fact("Upper feedback resistor", "4k7", "4.7\u202fkΩ"),
        Sheet.Sections.SelectMany(s => s.Blocks).OfType<FactGrid>().Single().Facts);

    private static string Summary(Ledger ledger) =>
        ((CountStrip)DeratingSheet.Build(SampleLedger.For(ledger, SampleRequirement.Values)).Sections[0].Blocks[0]).Summary;

    private static Row Find(string position, string stress) => Rows.Rows.Single(r => r.Cells[0].Text == position && r.Cells[2].Text == stress);
}
