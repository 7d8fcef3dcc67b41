using System.Collections.Immutable;
using System.Text;

namespace Selector.Documents.Pdf;

/// <summary>
/// Breaks text into lines. Only ordinary spaces part words, so a number stays with its unit; an ordering code that is wider
/// than its column breaks after a hyphen or stroke, and only if even that does not help between two letters.
/// </summary>
internal static class Wrap
{
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

        return lines.Count <= most ? lines.ToImmutable() : [.. lines.Take(most - 1), "\u2026"];
    }

    private static void Paragraph(string text, Face face, double width, ImmutableArray<string>.Builder lines)
    {
        var line = "";
        foreach (var word in text.Split(' ', StringSplitOptions.RemoveEmptyEntries))
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

    /// <summary>How much of a word that is too wide fits, at least one sign and never half a sign.</summary>
    private static int Cut(string word, Face face, double width)
    {
        var fits = 1;
        while (fits < word.Length - 1 && face.Width(word[..(fits + 1)]) <= width)
        {
            fits++;
        }

        var nice = word.LastIndexOfAny(['-', '/', '.', ','], fits - 1);
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
