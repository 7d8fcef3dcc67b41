using PdfSharp.Drawing;
using PdfSharp.Pdf;
using Selector.Documents.Model;

namespace Selector.Documents.Pdf;

/// <summary>
/// The place on the sheets where the next thing goes. Sheets stay open to the end, since only then is it known how many there
/// are and "page n of m" can be written.
/// </summary>
internal sealed class Flow : IDisposable
{
    private readonly PdfDocument _document;
    private readonly List<(XGraphics Graphics, Report Report)> _sheets = [];
    private readonly XGraphics _measure;
    private Report? _report;

    public Flow(PdfDocument document, SheetForm form)
    {
        _document = document;
        Form = form;
        _measure = XGraphics.CreateMeasureContext(new XSize(form.Width, form.Height), XGraphicsUnit.Point, XPageDirection.Downwards);
        Faces = new Faces(_measure);
    }

    public SheetForm Form { get; }

    public Faces Faces { get; }

    public Ink Ink { get; } = new();

    /// <summary>The sheet that is being drawn on.</summary>
    public XGraphics Graphics => _sheets[^1].Graphics;

    /// <summary>Top of the room that is left.</summary>
    public double Y { get; set; }

    public double Room => Form.Bottom - Y;

    /// <summary>Nothing has been drawn on this sheet yet.</summary>
    public bool AtTop => Y <= Form.Top;

    /// <summary>Begins a paper on a sheet of its own.</summary>
    public PdfPage Begin(Report report)
    {
        _report = report;
        return NewSheet();
    }

    public PdfPage NewSheet()
    {
        var page = _document.AddPage();
        page.Width = XUnit.FromPoint(Form.Width);
        page.Height = XUnit.FromPoint(Form.Height);
        _sheets.Add((XGraphics.FromPdfPage(page), _report!));
        Y = Form.Top;
        return page;
    }

    /// <summary>Goes to a new sheet unless this much room is left.</summary>
    /// <returns>Whether it did.</returns>
    public bool Need(double height)
    {
        if (Room >= height || AtTop)
        {
            return false;
        }

        NewSheet();
        return true;
    }

    /// <summary>A line of text; <paramref name="top"/> is the top of the line.</summary>
    public void Draw(string text, Face face, XBrush brush, double x, double top)
    {
        if (text.Length > 0)
        {
            Graphics.DrawString(text, face.Font, brush, x, top + face.Ascent + (face.Line - face.Font.Size) / 2, XStringFormats.BaseLineLeft);
        }
    }

    public void DrawRight(string text, Face face, XBrush brush, double right, double top) =>
        Draw(text, face, brush, right - face.Width(text), top);

    /// <summary>Lines one under the other.</summary>
    /// <returns>Where the next one would go.</returns>
    public double Draw(IEnumerable<string> lines, Face face, XBrush brush, double x, double top)
    {
        foreach (var line in lines)
        {
            Draw(line, face, brush, x, top);
            top += face.Line;
        }

        return top;
    }

    /// <summary>A rule over the whole width at the present place.</summary>
    public void Rule(XPen pen) => Graphics.DrawLine(pen, Form.Left, Y, Form.Right, Y);

    /// <summary>Frames and numbers every sheet.</summary>
    public void Finish()
    {
        for (var i = 0; i < _sheets.Count; i++)
        {
            Foot.Draw(this, _sheets[i].Graphics, _sheets[i].Report, i + 1, _sheets.Count);
        }
    }

    public void Dispose()
    {
        foreach (var (graphics, _) in _sheets)
        {
            graphics.Dispose();
        }

        _measure.Dispose();
    }
}
