using PdfSharp.Drawing;

namespace Selector.Documents.Pdf;

/// <summary>A size and weight of type with its line height; measures words once and remembers them.</summary>
internal sealed class Face
{
    private readonly Dictionary<string, double> _widths = new(StringComparer.Ordinal);
    private readonly XGraphics _measure;

    public Face(XGraphics measure, double size, bool strong, double line)
    {
        _measure = measure;
        Font = new XFont(EmbeddedFonts.Family, size, strong ? XFontStyleEx.Bold : XFontStyleEx.Regular);
        Line = line;
        Ascent = size * 0.78;
    }

    public XFont Font { get; }

    /// <summary>From one base line to the next.</summary>
    public double Line { get; }

    /// <summary>From the top of a line to its base line.</summary>
    public double Ascent { get; }

    public double Width(string text)
    {
        if (!_widths.TryGetValue(text, out var width))
        {
            width = _measure.MeasureString(text, Font, XStringFormats.BaseLineLeft).Width;
            _widths[text] = width;
        }

        return width;
    }
}

/// <summary>The faces of a sheet.</summary>
internal sealed class Faces(XGraphics measure)
{
    public Face Text { get; } = new(measure, 7.8, false, 9.6);

    public Face Strong { get; } = new(measure, 7.8, true, 9.6);

    public Face Small { get; } = new(measure, 6.5, false, 7.9);

    public Face SmallStrong { get; } = new(measure, 6.5, true, 7.9);

    public Face Count { get; } = new(measure, 11.5, true, 13);

    public Face Heading { get; } = new(measure, 9, true, 11);

    public Face Name { get; } = new(measure, 15, true, 17);
}
