using System.Reflection;
using PdfSharp.Fonts;

namespace Selector.Documents.Pdf;

/// <summary>
/// The faces travel inside the program: a sheet must look and read the same on a machine without a single font installed.
/// </summary>
internal sealed class EmbeddedFonts : IFontResolver
{
    public const string Family = "Selector sheet";
    private const string Regular = "IBMPlexSansCondensed-Regular";
    private const string SemiBold = "IBMPlexSansCondensed-SemiBold";
    private static readonly Lock Gate = new();

    /// <summary>Registers the faces once; a resolver that the host has set is kept, and these are its fallback.</summary>
    public static void Register()
    {
        lock (Gate)
        {
            if (GlobalFontSettings.FontResolver is EmbeddedFonts || GlobalFontSettings.FallbackFontResolver is EmbeddedFonts)
            {
                return;
            }

            if (GlobalFontSettings.FontResolver is null)
            {
                GlobalFontSettings.FontResolver = new EmbeddedFonts();
            }
            else
            {
                GlobalFontSettings.FallbackFontResolver = new EmbeddedFonts();
            }
        }
    }

    public FontResolverInfo? ResolveTypeface(string familyName, bool isBold, bool isItalic) =>
        familyName == Family ? new FontResolverInfo(isBold ? SemiBold : Regular) : null;

    public byte[]? GetFont(string faceName)
    {
        using var stream = Assembly.GetExecutingAssembly().GetManifestResourceStream(faceName);
        if (stream is null)
        {
            return null;
        }

        var bytes = new byte[stream.Length];
        stream.ReadExactly(bytes);
        return bytes;
    }
}
