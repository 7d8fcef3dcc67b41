using Selector.Documents.Model;
using Selector.Documents.Sheets;
using Selector.Documents.Tests.Support;
using Selector.Engine.Quantities;

namespace Selector.Documents.Tests;

/// <summary>What is printed is what the model says, cell by cell, read back from the file.</summary>
public class PdfContentTests
{
    private static readonly byte[] Pdf = Papers.Both(SampleLedger.Input);

    [Fact]
    public void Every_row_of_the_derating_sheet_is_printed_whole_and_on_one_sheet()
    {
        var table = DeratingSheet.Build(SampleLedger.Input).Tables.Single(t => t.Name == "derating");

        var found = ReadBack.Rows(Pdf, table);

        Assert.Equal(table.Rows.Length, found.Count);
        var lastPage = 0;
        foreach (var (row, (page, cells)) in table.Rows.Zip(found))
        {
            var printed = page != lastPage && lastPage != 0 ? row.AtTop : row.Cells;
            Assert.Equal(printed.Select(Whole), cells);
            lastPage = page;
        }
    }

    [Fact]
    public void Every_stress_of_the_ledger_is_printed_with_its_numbers_as_the_writer_gives_them()
    {
        var table = DeratingSheet.Build(SampleLedger.Input).Tables.Single(t => t.Name == "derating");
        var at = table.Columns.Select((c, i) => (c.Key, i)).ToDictionary(x => x.Key, x => x.i);

        var found = ReadBack.Rows(Pdf, table).Select(r => string.Join('|',
            new[] { "position", "stress", "value", "allowed", "margin" }.Select(k => r.Cells[at[k]]))).Order(StringComparer.Ordinal);

        var expected = SampleLedger.Whole.Rows.Where(r => r.Spec is not null).Select(r => string.Join('|',
            ReadBack.Bare(r.Position), ReadBack.Bare(r.Name), Number(r.Stress, r.Spec!.Unit), Number(r.Allowed, r.Spec.Unit),
            Number(r.Margin, Units.Percent) + (r.KelvinLeft is { } k ? Number(k, Units.Kelvin) : ""))).Order(StringComparer.Ordinal);
        Assert.Equal(expected, found);
    }

    [Theory]
    [InlineData("not-assessed")]
    [InlineData("bill-of-materials")]
    [InlineData("order")]
    public void Every_other_table_is_printed_whole_and_no_row_is_split(string name)
    {
        var table = Papers.Reports(SampleLedger.Input).SelectMany(r => r.Tables).Single(t => t.Name == name);

        var found = ReadBack.Rows(Pdf, table).Select(r => r.Cells);

        Assert.Equal(table.Rows.Select(r => r.Cells.Select(Whole)), found);
    }

    [Fact]
    public void Signs_of_units_can_be_searched()
    {
        var text = string.Concat(ReadBack.Runs(Pdf).Select(r => r.Text));

        Assert.All("µΩ≥°²−–", sign => Assert.Contains(sign, text));
        Assert.Contains("4700\u202fµF", text, StringComparison.Ordinal);
        Assert.Contains("4.7\u202fkΩ", text, StringComparison.Ordinal);
        Assert.Contains("\u2265\u202f34.3\u202fV", text, StringComparison.Ordinal);
        Assert.Contains("96.2\u202f°C", text, StringComparison.Ordinal);
    }

    [Fact]
    public void Counts_stand_before_every_row()
    {
        var runs = ReadBack.Runs(Pdf);
        var first = runs.Where(r => r.Page == 1).ToList();

        var counts = first.Single(r => r.Text == "hold");
        Assert.Contains(first, r => r.Text == "22" && Math.Abs(r.Top - counts.Top) < 3);
        Assert.All(first.Where(r => r.Text == "T1"), r => Assert.True(r.Top > counts.Top));
    }

    private static string Whole(Cell cell) => ReadBack.Bare(cell.Text + cell.Note);

    private static string Number(double? value, Unit unit) => ReadBack.Bare(value is { } v ? QuantityWriter.Write(v, unit) : "\u2013");
}
