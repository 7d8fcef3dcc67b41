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

        // The name comes last: it is the only part that may be too long, and the others tell the sheet apart without it.
        string[] parts = [report.Title, cover.Number, cover.Standing, .. cover.Rests, cover.Name];
        Line(Wrap.OneLine(string.Join("  \u00b7  ", parts), small, right - form.Left - 3 * Pad), small, form.Left + Pad, middle);

        void Line(string text, Face face, double x, double top)
        {
            var baseline = top + SheetForm.FootHeight / 4 + face.Font.Size * 0.34;
            graphics.DrawString(text, face.Font, flow.Ink.Plain, x, baseline, XStringFormats.BaseLineLeft);
        }
    }
}
