using System.Globalization;
using PdfSharp.Drawing;
using Selector.Documents.Model;
using Selector.Documents.Sheets;

namespace Selector.Documents.Pdf;

/// <summary>
/// What every sheet carries: heavy frame, the warning in one line, and which sheet of which paper it is, so that a loose sheet
/// can be put back where it belongs.
/// </summary>
internal static class Foot
{
    private const double Pad = 5;

    public static void Draw(Flow flow, XGraphics graphics, Report report, int page, int pages)
    {
        var form = flow.Form;
        var small = flow.Faces.Small;
        var strong = flow.Faces.SmallStrong;
        graphics.DrawRectangle(flow.Ink.Frame, form.Left, form.Top, form.Inner, form.FrameBottom - form.Top);
        graphics.DrawLine(flow.Ink.Rule, form.Left, form.Bottom, form.Right, form.Bottom);
        var middle = form.Bottom + SheetForm.FootHeight / 2;
        graphics.DrawLine(flow.Ink.Hairline, form.Left, middle, form.Right, middle);

        Line(Cautions.Line, small, form.Left + Pad, form.Bottom);
        var cover = report.Cover;
        var number = string.Create(CultureInfo.InvariantCulture, $"page {page} of {pages}");
        var right = form.Right - Pad - strong.Width(number);
        Line(number, strong, right, middle);

        string[] rest = [report.Title, $"{cover.Number}: {cover.Name}", cover.Issue.StartsWith("not", StringComparison.Ordinal) ? cover.Issue : $"issue {cover.Issue}", .. cover.Facts.Skip(2).Take(2).Select(f => $"{f.Label} {f.Value}")];
        var identity = string.Join("  \u00b7  ", rest);
        Line(Wrap.Lines(identity, small, right - form.Left - 3 * Pad)[0], small, form.Left + Pad, middle);

        void Line(string text, Face face, double x, double top)
        {
            var baseline = top + SheetForm.FootHeight / 4 + face.Font.Size * 0.34;
            graphics.DrawString(text, face.Font, flow.Ink.Plain, x, baseline, XStringFormats.BaseLineLeft);
        }
    }
}
