using PdfSharp.Drawing;
using Selector.Documents.Model;

namespace Selector.Documents.Pdf;

/// <summary>The shapes before verdicts, drawn: the face has no such signs, and a drawn shape cannot go missing.</summary>
internal static class Marks
{
    /// <summary>Room that a mark takes before its words.</summary>
    public const double Width = 8;

    private const double Radius = 2.1;

    /// <param name="graphics">The sheet.</param>
    /// <param name="mark">Which shape.</param>
    /// <param name="brush">Colour of the words.</param>
    /// <param name="x">Left side.</param>
    /// <param name="middle">Middle of the line.</param>
    public static void Draw(XGraphics graphics, Mark mark, XBrush brush, double x, double middle)
    {
        var pen = new XPen(((XSolidBrush)brush).Color, 0.7);
        var box = new XRect(x, middle - Radius, 2 * Radius, 2 * Radius);
        switch (mark)
        {
            case Mark.Full:
                graphics.DrawEllipse(pen, brush, box);
                break;
            case Mark.Half:
                graphics.DrawEllipse(pen, box);
                graphics.DrawPie(brush, box, 90, 180);
                break;
            case Mark.Open:
                graphics.DrawEllipse(pen, box);
                break;
            case Mark.Cross:
                pen.Width = 1.2;
                graphics.DrawLine(pen, box.Left, box.Top, box.Right, box.Bottom);
                graphics.DrawLine(pen, box.Left, box.Bottom, box.Right, box.Top);
                break;
            case Mark.None:
                break;
        }
    }
}
