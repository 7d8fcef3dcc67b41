using System.Text;
using Selector.Documents.Model;
using UglyToad.PdfPig;
using UglyToad.PdfPig.Content;

namespace Selector.Documents.Tests.Support;

/// <summary>A piece of text as it was drawn in one go, with its place; top counts downwards.</summary>
internal sealed record Run(int Page, string Text, double Left, double Right, double Top, double Size);

/// <summary>
/// Reads a PDF back by geometry alone: nothing of the renderer is used, so what it claims to have printed is what is found.
/// </summary>
internal static class ReadBack
{
    private const double TextSize = 7.8;
    private static readonly string[] Sums = ["Build", "One supply", "Order total"];

    public static IReadOnlyList<Run> Runs(byte[] pdf)
    {
        using var document = PdfDocument.Open(pdf);
        return [.. document.GetPages().SelectMany(Runs)];
    }

    /// <summary>Rows of a table, each as the text of its columns without white space, from every sheet that it runs over.</summary>
    public static IReadOnlyList<(int Page, string[] Cells)> Rows(byte[] pdf, Table table)
    {
        var runs = Runs(pdf);
        var rows = new List<(int, string[])>();
        foreach (var page in runs.GroupBy(r => r.Page))
        {
            if (page.FirstOrDefault(r => r.Text == table.Caption || r.Text == table.Caption + " (continued)") is not { } caption)
            {
                continue;
            }

            var below = page.Where(r => r.Top > caption.Top + 1).OrderBy(r => r.Top).ToList();
            var head = table.Columns.Select(c => below.First(r => c.Head.StartsWith(r.Text, StringComparison.Ordinal))).ToArray();
            var headEnd = head.Max(h => h.Top) + 4;
            var end = below.FirstOrDefault(r => r.Text == table.Closing)?.Top ?? below.Single(r => r.Text.StartsWith("Mains, stored charge", StringComparison.Ordinal)).Top;
            var body = below.Where(r => r.Top > headEnd && r.Top < end - 1).ToList();
            rows.AddRange(Split(body, table).Select(cells => (page.Key, cells)));
        }

        return rows;
    }

    /// <summary>Without white space: lines are broken at spaces, and which spaces is no matter of content.</summary>
    public static string Bare(string text) => string.Concat(text.Where(c => !char.IsWhiteSpace(c)));

    /// <summary>A row begins where the first column has a run at the size of text, a sum at its name; columns are cut as the model says.</summary>
    private static IEnumerable<string[]> Split(List<Run> body, Table table)
    {
        const double Left = 56.7 + 1.8, Right = 841.89 - 28.35 - 1.8;
        var unit = (Right - Left) / table.Columns.Sum(c => c.Width);
        var ends = new List<double>();
        foreach (var column in table.Columns)
        {
            ends.Add((ends.Count == 0 ? Left : ends[^1]) + column.Width * unit);
        }

        int ColumnOf(Run run) => ends.FindIndex(e => (run.Left + run.Right) / 2 < e);
        var starts = body.Where(r => (ColumnOf(r) == 0 && r.Size > TextSize - 0.5) || Sums.Contains(r.Text)).Select(r => r.Top).Distinct().Order().ToList();
        for (var i = 0; i < starts.Count; i++)
        {
            var stop = i + 1 < starts.Count ? starts[i + 1] : double.MaxValue;
            var inside = body.Where(r => r.Top >= starts[i] - 1 && r.Top < stop - 1).ToList();
            yield return [.. Enumerable.Range(0, table.Columns.Length)
                .Select(c => Bare(string.Concat(inside.Where(r => ColumnOf(r) == c).OrderBy(r => r.Top).Select(r => r.Text))))];
        }
    }

    private static IEnumerable<Run> Runs(Page page)
    {
        foreach (var run in page.Letters.GroupBy(l => l.TextSequence))
        {
            var text = run.Aggregate(new StringBuilder(), (s, l) => s.Append(l.Value)).ToString();
            yield return new Run(
                page.Number, text, run.Min(l => l.StartBaseLine.X), run.Max(l => l.EndBaseLine.X), page.Height - run.First().StartBaseLine.Y, run.First().PointSize);
        }
    }
}
