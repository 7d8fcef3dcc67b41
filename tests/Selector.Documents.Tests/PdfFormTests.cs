using System.Globalization;
using System.Text.RegularExpressions;
using Selector.Documents.Pdf;
using Selector.Documents.Sheets;
using Selector.Documents.Tests.Support;
using UglyToad.PdfPig;
using UglyToad.PdfPig.Outline;

namespace Selector.Documents.Tests;

/// <summary>The file as a thing: sheets counted, framed, bookmarked, its faces inside, small.</summary>
public class PdfFormTests
{
    public static TheoryData<string, PaperSize> Files => new()
    {
        { "whole", PaperSize.A4 }, { "whole", PaperSize.Letter }, { "empty", PaperSize.A4 }, { "long", PaperSize.A4 }, { "long", PaperSize.Letter },
    };

    [Theory]
    [MemberData(nameof(Files))]
    public void Sheets_are_counted_through(string what, PaperSize paper)
    {
        var sheets = ReadBack.Runs(Make(what, paper)).GroupBy(r => r.Page).ToList();

        Assert.All(sheets, s => Assert.Equal(
            string.Create(CultureInfo.InvariantCulture, $"page {s.Key} of {sheets.Count}"),
            Assert.Single(s, r => r.Text.StartsWith("page ", StringComparison.Ordinal)).Text));
    }

    [Theory]
    [MemberData(nameof(Files))]
    public void No_text_leaves_the_frame(string what, PaperSize paper)
    {
        using var document = PdfDocument.Open(Make(what, paper));

        foreach (var page in document.GetPages())
        {
            Assert.All(page.Letters, l => Assert.True(
                l.StartBaseLine.X >= 56.7 && l.EndBaseLine.X <= page.Width - 28.3 && l.StartBaseLine.Y >= 28.3 + 2 && l.StartBaseLine.Y <= page.Height - 28.3 - 4,
                $"'{l.Value}' at {l.StartBaseLine} on sheet {page.Number}"));
        }
    }

    [Theory]
    [MemberData(nameof(Files))]
    public void No_two_texts_lie_on_each_other(string what, PaperSize paper)
    {
        foreach (var line in ReadBack.Runs(Make(what, paper)).GroupBy(r => (r.Page, Math.Round(r.Top, 1))))
        {
            var runs = line.OrderBy(r => r.Left).ToList();
            Assert.All(runs.Zip(runs.Skip(1)), p => Assert.True(p.First.Right <= p.Second.Left + 0.2, $"'{p.First.Text}' runs into '{p.Second.Text}' on sheet {p.First.Page}"));
        }
    }

    [Fact]
    public void A_signature_that_is_too_long_stays_in_its_cell()
    {
        var runs = ReadBack.Runs(Make("long", PaperSize.A4));
        var drawn = runs.First(r => r.Page == 1 && r.Top > 100 && r.Text.EndsWith('\u2026') && r.Text.StartsWith("Unterbrechung", StringComparison.Ordinal));

        Assert.True(drawn.Right < runs.First(r => r.Page == 1 && r.Text == "Checked").Left);
    }

    [Fact]
    public void Sheet_has_the_size_that_was_asked_for()
    {
        using var letter = PdfDocument.Open(Make("whole", PaperSize.Letter));
        using var a4 = PdfDocument.Open(Make("whole", PaperSize.A4));

        Assert.Equal((792, 612), (letter.GetPage(1).Width, letter.GetPage(1).Height));
        Assert.Equal((842, 595), (Math.Round(a4.GetPage(1).Width), Math.Round(a4.GetPage(1).Height)));
    }

    [Fact]
    public void Bookmarks_lead_to_both_papers()
    {
        using var document = PdfDocument.Open(Make("whole", PaperSize.A4));

        Assert.True(document.TryGetBookmarks(out var bookmarks));
        var roots = bookmarks.Roots.Cast<DocumentBookmarkNode>().ToList();
        Assert.Equal([BillOfMaterials.Title, DeratingSheet.Title], roots.Select(r => r.Title));
        Assert.All(roots, r => Assert.Contains(r.Title, document.GetPage(r.PageNumber).Text, StringComparison.Ordinal));
        Assert.Equal(1, roots[0].PageNumber);
    }

    [Fact]
    public void The_file_says_what_it_is_and_in_which_language()
    {
        var bytes = Make("whole", PaperSize.A4);
        using var document = PdfDocument.Open(bytes);

        Assert.Equal("Supply 0007, Fixture supply, 9 V with adjustable limit: bill of materials and derating sheet", document.Information.Title);
        Assert.Equal("A. Vell", document.Information.Author);
        Assert.Contains("/Lang(en)", System.Text.Encoding.Latin1.GetString(bytes).Replace(" ", "", StringComparison.Ordinal), StringComparison.Ordinal);
    }

    [Fact]
    public void Both_faces_are_inside_as_subsets_and_no_other_is_named()
    {
        var bytes = Make("whole", PaperSize.A4);
        using var document = PdfDocument.Open(bytes);

        var names = document.GetPages().SelectMany(p => p.Letters).Select(l => l.FontName).Distinct().Order(StringComparer.Ordinal).ToList();
        Assert.Equal(2, names.Count);
        Assert.All(names, n => Assert.Matches(@"^[A-Z]{6}\+", n));
        Assert.Equal(2, Regex.Count(System.Text.Encoding.Latin1.GetString(bytes), "/FontFile2 "));
    }

    [Theory]
    [InlineData("whole")]
    [InlineData("long")]
    public void The_file_is_small(string what) => Assert.InRange(Make(what, PaperSize.A4).Length, 10_000, 300 * 1024);

    [Fact]
    public void Many_can_be_made_at_once()
    {
        var texts = Enumerable.Range(0, 8).AsParallel().WithDegreeOfParallelism(4)
            .Select(_ => string.Concat(ReadBack.Runs(Make("whole", PaperSize.A4)).Select(r => r.Text))).ToList();

        Assert.Single(texts.Distinct(StringComparer.Ordinal));
    }

    private static byte[] Make(string what, PaperSize paper) => Papers.Both(
        what switch { "empty" => SampleLedger.EmptyInput, "long" => LongLedger.Input, _ => SampleLedger.Input }, new PdfOptions { Paper = paper });
}
