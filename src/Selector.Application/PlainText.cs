namespace Selector.Application;

/// <summary>Text that every store and every file keeps as it is.</summary>
internal static class PlainText
{
    private const int Quoted = 40;

    /// <summary>No control characters but tab and line ends, and no half of a surrogate pair: stores and UTF-8 lose those.</summary>
    public static bool IsKept(string text)
    {
        for (var i = 0; i < text.Length; i++)
        {
            var c = text[i];
            if (char.IsHighSurrogate(c) && i + 1 < text.Length && char.IsLowSurrogate(text[i + 1]))
            {
                i++;
            }
            else if (char.IsSurrogate(c) || (char.IsControl(c) && c is not ('\t' or '\r' or '\n')))
            {
                return false;
            }
        }

        return true;
    }

    /// <summary>The beginning of what somebody wrote, for a message.</summary>
    public static string Short(string text) => text.Length <= Quoted ? text : text[..Quoted] + "\u2026";
}
