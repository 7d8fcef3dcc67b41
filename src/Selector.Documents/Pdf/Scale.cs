using PdfSharp.Drawing;
using Selector.Documents.Model;

namespace Selector.Documents.Pdf;

/// <summary>The pointer scale as lines: readable in grey, since nothing on it is told by colour.</summary>
internal static class Scale
{
    private const double Bar = 4;
    private const double Beyond = 4;

    /// <param name="flow">The sheets.</param>
    /// <param name="scale">What to draw.</param>
    /// <param name="left">Where zero stands.</param>
    /// <param name="width">Room for it; a little is kept for the arrow of a stress past the end.</param>
    /// <param name="top">Top of the text line that it stands in.</param>
    public static void Draw(Flow flow, PointerScale scale, double left, double width, double top)
    {
        var graphics = flow.Graphics;
        var length = width - Beyond - 1;
        var y = top + 4.2;
        var tick = left + scale.Tick * length;
        var (from, to) = scale.IsFloor ? (tick, left + length) : (left, tick);
        graphics.DrawRectangle(flow.Ink.Band, from, y, to - from, Bar);
        if (!scale.IsFloor)
        {
            Hatch(graphics, flow.Ink.Hatch, tick, left + length, y);
        }

        graphics.DrawRectangle(flow.Ink.Hairline, left, y, length, Bar);
        graphics.DrawLine(flow.Ink.Tick, tick, y - 1.2, tick, y + Bar + 1.2);
        Pointer(flow, left + scale.Pointer * length, y);
        if (scale.Beyond)
        {
            var end = left + length;
            graphics.DrawLine(flow.Ink.Tick, end + 1, y + Bar / 2, end + Beyond, y + Bar / 2);
            graphics.DrawLine(flow.Ink.Tick, end + Beyond, y + Bar / 2, end + Beyond - 1.6, y + Bar / 2 - 1.6);
            graphics.DrawLine(flow.Ink.Tick, end + Beyond, y + Bar / 2, end + Beyond - 1.6, y + Bar / 2 + 1.6);
        }
    }

    /// <summary>Strokes under 45 degrees, cut at both ends by reckoning: a clip path for each would swell the file.</summary>
    private static void Hatch(XGraphics graphics, XPen pen, double left, double right, double y)
    {
        const double Step = 2.2;
        for (var x = left - Bar + Step; x < right; x += Step)
        {
            var start = Math.Max(x, left);
            var stop = Math.Min(x + Bar, right);
            if (stop > start)
            {
                graphics.DrawLine(pen, start, y + Bar - (start - x), stop, y + Bar - (stop - x));
            }
        }
    }

    private static void Pointer(Flow flow, double x, double y)
    {
        const double Half = 2.4;
        XPoint[] corners = [new(x - Half, y - 3.4), new(x + Half, y - 3.4), new(x, y + 1)];
        flow.Graphics.DrawPolygon(flow.Ink.Plain, corners, XFillMode.Winding);
    }
}
