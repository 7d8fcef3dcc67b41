using System.Collections.Immutable;

namespace Selector.Engine.Quantities;

/// <summary>A decimal prefix, femto to tera in steps of a thousand (BIPM SI brochure, from memory).</summary>
/// <param name="Symbol">The sign as printed; empty for none.</param>
/// <param name="Exponent">The power of ten, -15 to 12.</param>
internal readonly record struct SiPrefix(string Symbol, int Exponent)
{
    private const string Meg = "meg";

    private static readonly ImmutableArray<string> Symbols = ["f", "p", "n", "\u00b5", "m", "", "k", "M", "G", "T"];

    internal const int Least = -15;
    internal const int Greatest = 12;

    /// <summary>The printed prefix of a power of ten that is a multiple of three from <see cref="Least"/> to <see cref="Greatest"/>.</summary>
    internal static SiPrefix Of(int exponent) => new(Symbols[(exponent - Least) / 3], exponent);

    /// <summary>
    /// The power of ten of a typed letter, or null. Case counts, for M is mega and m is milli; only K is let through
    /// beside k, because there is no other prefix it could be.
    /// </summary>
    internal static int? ExponentOf(char letter) => letter switch
    {
        'f' => -15,
        'p' => -12,
        'n' => -9,
        'u' or '\u00b5' or '\u03bc' => -6,
        'm' => -3,
        'k' or 'K' => 3,
        'M' => 6,
        'G' => 9,
        'T' => 12,
        _ => null,
    };

    /// <summary>The prefix at the start of a text, with its length there; "meg" in any case is mega, as in circuit simulators.</summary>
    internal static (int Exponent, int Length)? AtStart(string text)
    {
        if (text.StartsWith(Meg, StringComparison.OrdinalIgnoreCase))
        {
            return (6, Meg.Length);
        }

        return text.Length > 0 && ExponentOf(text[0]) is { } exponent ? (exponent, 1) : null;
    }
}
