using Selector.Documents.Csv;
using Selector.Documents.Model;
using Selector.Documents.Sheets;
using Selector.Documents.Tests.Support;

namespace Selector.Documents.Tests;

public class CsvTablesTests
{
    [Theory]
    [InlineData("plain", "plain")]
    [InlineData("a,b", "\"a,b\"")]
    [InlineData("say \"so\"", "\"say \"\"so\"\"\"")]
    [InlineData("two\nlines", "\"two\nlines\"")]
    [InlineData("=1+1", "'=1+1")]
    [InlineData("  @SUM(A1)", "'  @SUM(A1)")]
    [InlineData("+1", "'+1")]
    [InlineData("-1", "'-1")]
    [InlineData("\t=1", "'\t=1")]
    [InlineData("\uff1d1", "'\uff1d1")]
    public void Words_are_quoted_and_made_harmless(string words, string cell) =>
        Assert.Equal($"words\r\n{cell}\r\n", CsvTables.Of(One(new TextCell(words))));

    [Fact]
    public void A_negative_number_of_ours_stays_a_number() => Assert.Equal("words\r\n-10.4\u202f%\r\n", CsvTables.Of(One(new NumberCell("-10.4\u202f%"))));

    [Fact]
    public void Every_line_has_as_many_cells_as_the_heading_and_the_scale_is_left_out()
    {
        var table = DeratingSheet.Build(SampleLedger.Input).Tables.First();

        var lines = Parse(CsvTables.Of(table));

        Assert.Equal(table.Rows.Length + 1, lines.Count);
        Assert.All(lines, l => Assert.Equal(lines[0].Count, l.Count));
        Assert.DoesNotContain("scale", lines[0]);
        Assert.Equal("1.28\u202fA", lines.Single(l => l[0] == "C1" && l[2] == "ripple current, weighted")[lines[0].IndexOf("value")]);
    }

    [Fact]
    public void A_part_number_that_looks_like_a_formula_is_harmless()
    {
        var text = CsvTables.Of(One(new TextCell(SampleParts.Resistor.OrderingCode)));

        Assert.Equal("words\r\n'=MR25-1R5-1%\r\n", text);
    }

    [Fact]
    public void Every_table_and_the_requirement_have_a_file() => Assert.Equal(
        ["requirement", "bill-of-materials", "order"], CsvTables.Of(BillOfMaterials.Build(SampleLedger.Input)).Select(f => f.Name));

    private static Table One(Cell cell) => new("t", "", [new Column("words", "Words", 1)], [new Row([cell])]);

    /// <summary>A reader of RFC 4180 of its own, so that writer and test share no mistake.</summary>
    private static List<List<string>> Parse(string text)
    {
        List<List<string>> lines = [[""]];
        var quoted = false;
        for (var i = 0; i < text.Length; i++)
        {
            switch (text[i])
            {
                case '"' when quoted && i + 1 < text.Length && text[i + 1] == '"':
                    lines[^1][^1] += '"';
                    i++;
                    break;
                case '"':
                    quoted = !quoted;
                    break;
                case ',' when !quoted:
                    lines[^1].Add("");
                    break;
                case '\r' when !quoted && text[i + 1] == '\n':
                    lines.Add([""]);
                    i++;
                    break;
                default:
                    lines[^1][^1] += text[i];
                    break;
            }
        }

        lines.RemoveAt(lines.Count - 1);
        return lines;
    }
}
