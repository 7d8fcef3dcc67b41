using System.Collections.Immutable;
using System.Text;

namespace Selector.Documents.Pdf;

/// <summary>
/// Breaks text into lines. Only ordinary spaces part words, so a number stays with its unit; an ordering code that is wider
/// than its column breaks after a hyphen or stroke, and only if even that does not help between two letters.
/// </summary>
internal static class Wrap
{
    private const string More = "\u2026";

    public static ImmutableArray<string> Lines(string text, Face face, double width, int most = int.MaxValue)
    {
        if (text.Length == 0)
        {
            return [];
        }

        var lines = ImmutableArray.CreateBuilder<string>();
        foreach (var paragraph in Clean(text).Split('\n'))
        {
            Paragraph(paragraph, face, width, lines);
        }

        return lines.Count <= most
            ? lines.ToImmutable()
            : [.. lines.Take(most - 1), OneLine(string.Join(' ', lines.Skip(most - 1)), face, width)];
    }

    /// <summary>As much as fits on one line; dots say that there is more.</summary>
    public static string OneLine(string text, Face face, double width)
    {
        var line = Clean(text).Replace('\n', ' ');
        if (face.Width(line) <= width)
        {
            return line;
        }

        var cut = Cut(line, face, width - face.Width(More), nicely: false);
        return line[..cut].TrimEnd() + More;
    }

    private static void Paragraph(string text, Face face, double width, ImmutableArray<string>.Builder lines)
    {
        var line = "";
        foreach (var word in Words(text))
        {
            var longer = line.Length == 0 ? word : line + " " + word;
            if (face.Width(longer) <= width)
            {
                line = longer;
                continue;
            }

            if (line.Length > 0)
            {
                lines.Add(line);
            }

            line = word;
            while (face.Width(line) > width && line.Length > 1)
            {
                var cut = Cut(line, face, width);
                lines.Add(line[..cut]);
                line = line[cut..];
            }
        }

        lines.Add(line);
    }

    /// <summary>Words between ordinary spaces; a short unit stays with the number before it however it was typed.</summary>
    private static IEnumerable<string> Words(string text)
    {
        const int LongestUnit = 4;
        string? held = null;
        foreach (var word in text.Split(' ', StringSplitOptions.RemoveEmptyEntries))
        {
            if (held is not null && char.IsAsciiDigit(held[^1]) && word.Length <= LongestUnit && !char.IsAsciiDigit(word[0]))
            {
                held += " " + word;
                continue;
            }

            if (held is not null)
            {
                yield return held;
            }

            held = word;
        }

        if (held is not null)
        {
            yield return held;
        }
    }

    /// <summary>How much of a word that is too wide fits, at least one sign and never half a sign.</summary>
    private static int Cut(string word, Face face, double width, bool nicely = true)
    {
        var fits = 1;
        while (fits < word.Length - 1 && face.Width(word[..(fits + 1)]) <= width)
        {
            fits++;
        }

        var nice = nicely ? word.LastIndexOfAny(['-', '/', '.', ','], fits - 1) : 0;
        var cut = nice >= fits / 3 && nice > 0 ? nice + 1 : fits;
        return char.IsLowSurrogate(word[cut]) ? (cut > 1 ? cut - 1 : cut + 1) : cut;
    }

    /// <summary>Signs that have no width or no place on paper become spaces.</summary>
    private static string Clean(string text)
    {
        var clean = new StringBuilder(text.Length);
        foreach (var sign in text.ReplaceLineEndings("\n"))
        {
            clean.Append(sign != '\n' && char.IsControl(sign) ? ' ' : sign);
        }

        return clean.ToString();
    }
}
