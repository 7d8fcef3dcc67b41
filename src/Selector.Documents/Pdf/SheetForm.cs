namespace Selector.Documents.Pdf;

/// <summary>
/// A sheet lying on its side, in points. The edge at the left is wide enough to be punched and filed, as on a drawing.
/// </summary>
internal sealed record SheetForm(double Width, double Height)
{
    private const double FilingEdge = 56.7;
    private const double Edge = 28.35;

    /// <summary>Room inside the frame for the lines that every sheet carries.</summary>
    public const double FootHeight = 32;

    public double Left => FilingEdge;

    public double Right => Width - Edge;

    public double Top => Edge;

    /// <summary>Lower side of the frame.</summary>
    public double FrameBottom => Height - Edge;

    /// <summary>Where the body ends.</summary>
    public double Bottom => FrameBottom - FootHeight;

    public double Inner => Right - Left;

    public static SheetForm Of(PaperSize paper) => paper switch
    {
        PaperSize.Letter => new(792, 612),
        _ => new(841.89, 595.28),
    };
}
