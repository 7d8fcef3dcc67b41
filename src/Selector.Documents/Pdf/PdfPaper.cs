using System.Globalization;
using PdfSharp.Pdf;
using Selector.Documents.Model;

namespace Selector.Documents.Pdf;

/// <summary>Draws papers as one PDF file: a bookmark for each, sheets counted through.</summary>
public static class PdfPaper
{
    /// <param name="reports">At least one, in the order of the file.</param>
    /// <param name="options">Null for A4.</param>
    /// <exception cref="ArgumentException">There is nothing to draw.</exception>
    public static byte[] Render(IReadOnlyList<Report> reports, PdfOptions? options = null)
    {
        if (reports.Count == 0)
        {
            throw new ArgumentException("A file needs at least one paper.", nameof(reports));
        }

        options ??= new PdfOptions();
        EmbeddedFonts.Register();
        using var document = new PdfDocument();
        Describe(document, reports, options);
        using (var flow = new Flow(document, SheetForm.Of(options.Paper)))
        {
            foreach (var report in reports)
            {
                document.Outlines.Add(report.Title, flow.Begin(report), opened: true);
                Head.Draw(flow, report);
                Body(flow, report);
            }

            flow.Finish();
        }

        using var stream = new MemoryStream();
        document.Save(stream, closeStream: false);
        return stream.ToArray();
    }

    private static void Describe(PdfDocument document, IReadOnlyList<Report> reports, PdfOptions options)
    {
        var cover = reports[0].Cover;
        document.Info.Title = string.Create(CultureInfo.InvariantCulture, $"{cover.Number}, {cover.Name}: {string.Join(" and ", reports.Select(r => r.Title.ToLowerInvariant()))}");
        document.Info.Author = cover.Signatures.FirstOrDefault(s => s.Label == "Drawn")?.Value is { Length: > 0 } drawn ? drawn : "not named";
        document.Info.Subject = string.Join(", ", cover.Facts.Select(f => $"{f.Label} {f.Value}"));
        document.Info.Creator = "Selector";
        document.Language = options.Language;
        document.ViewerPreferences.DisplayDocTitle = true;
        if (options.Created is { } created)
        {
            document.Info.CreationDate = created;
        }
    }

    private static void Body(Flow flow, Report report)
    {
        foreach (var section in report.Sections)
        {
            if (section.Heading.Length > 0)
            {
                Heading(flow, section.Heading);
            }

            foreach (var block in section.Blocks)
            {
                Draw(flow, block);
            }
        }
    }

    private static void Draw(Flow flow, Block block)
    {
        switch (block)
        {
            case Table table:
                TableDrawer.Draw(flow, table);
                break;
            case FactGrid grid:
                Grid.Draw(flow, grid);
                break;
            case Caution caution:
                Grid.Draw(flow, caution);
                break;
            case CountStrip strip:
                Strip.Draw(flow, strip);
                break;
            case Paragraph paragraph:
                Prose(flow, paragraph);
                break;
            default:
                throw new ArgumentOutOfRangeException(nameof(block), block.GetType().Name, "Unknown block.");
        }
    }

    private static void Heading(Flow flow, string text)
    {
        const double WithNext = 50;
        flow.Need(WithNext);
        flow.Draw(text, flow.Faces.Heading, flow.Ink.Plain, flow.Form.Left + 5, flow.Y + 3);
        flow.Y += flow.Faces.Heading.Line + 5;
    }

    private static void Prose(Flow flow, Paragraph paragraph)
    {
        var face = paragraph.Strong ? flow.Faces.Strong : flow.Faces.Text;
        var lines = Wrap.Lines(paragraph.Text, face, flow.Form.Inner - 16);
        flow.Need(lines.Length * face.Line + 6);
        flow.Y = flow.Draw(lines, face, flow.Ink.Plain, flow.Form.Left + 5, flow.Y + 3) + 3;
    }
}
