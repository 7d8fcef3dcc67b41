using PdfSharp.Drawing;
using Selector.Documents.Model;

namespace Selector.Documents.Pdf;

/// <summary>
/// Two inks, one tint, and two colours that only confirm what words and shapes say: grey print loses nothing. Made per
/// document, since the drawing library does not promise that pens may be shared by threads.
/// </summary>
internal sealed class Ink
{
    private static readonly XColor Dark = XColor.FromArgb(0x1c, 0x2a, 0x36);
    private static readonly XColor Second = XColor.FromArgb(0x4d, 0x5b, 0x66);

    public XBrush Plain { get; } = new XSolidBrush(Dark);

    public XBrush Quiet { get; } = new XSolidBrush(Second);

    public XBrush Lacks { get; } = new XSolidBrush(XColor.FromArgb(0xa3, 0x27, 0x1c));

    public XBrush Close { get; } = new XSolidBrush(XColor.FromArgb(0x7a, 0x52, 0x00));

    /// <summary>Behind values that somebody typed.</summary>
    public XBrush Field { get; } = new XSolidBrush(XColor.FromArgb(0xf3, 0xf1, 0xe8));

    /// <summary>The usable part of a scale.</summary>
    public XBrush Band { get; } = new XSolidBrush(XColor.FromArgb(0xdd, 0xe3, 0xe0));

    public XPen Frame { get; } = new(Dark, 1.4);

    public XPen Rule { get; } = new(Dark, 0.7);

    public XPen Hairline { get; } = new(XColor.FromArgb(0xa9, 0xb2, 0xb6), 0.4);

    public XPen Hatch { get; } = new(Second, 0.35);

    public XPen Tick { get; } = new(Dark, 0.9);

    public XBrush Of(Tone tone) => tone switch
    {
        Tone.Quiet => Quiet,
        Tone.Close => Close,
        Tone.Lacks => Lacks,
        _ => Plain,
    };
}
