using System.Text;

namespace Selector.Engine.Quantities;

/// <summary>The number at the start of a text, taken apart but not yet turned into a value.</summary>
/// <param name="Mantissa">ASCII digits with at most one point.</param>
/// <param name="Exponent">The typed power of ten, held to ±<see cref="ExponentLimit"/>.</param>
/// <param name="Length">How many characters it takes.</param>
/// <param name="IsWhole">True for digits alone: only then may a letter stand for the decimal sign.</param>
/// <param name="Fault">Why it cannot be read; null when it can.</param>
internal readonly record struct Numeral(string Mantissa, int Exponent, int Length, bool IsWhole, string? Fault)
{
    /// <summary>Beyond the range of a double by far, and small enough for sums.</summary>
    private const int ExponentLimit = 9999;

    /// <summary>Scans digits, group spaces, one decimal sign and an exponent, in one pass.</summary>
    internal static Numeral Scan(ReadOnlySpan<char> text, char decimalSign)
    {
        var whole = new StringBuilder();
        var fraction = new StringBuilder();
        char sign = '\0';
        bool grouped = false;
        int at = 0;
        for (; at < text.Length; at++)
        {
            char c = text[at];
            if (char.IsAsciiDigit(c))
            {
                (sign == '\0' ? whole : fraction).Append(c);
            }
            else if (c is '.' or ',')
            {
                if (sign != '\0')
                {
                    return Refused(QuantityFaults.Groups);
                }

                sign = c;
            }
            else if (c is '\'' or '\u2019' && whole.Length > 0)
            {
                return Refused(QuantityFaults.Groups);
            }
            else if (sign == '\0' && IsGroupSpace(text, at) && (grouped || CanStartGroups(whole)))
            {
                grouped = true;
            }
            else
            {
                break;
            }
        }

        if (sign != '\0' && sign != decimalSign && fraction.Length == 3 && !grouped && CanStartGroups(whole))
        {
            return Refused(QuantityFaults.Ambiguous(whole.ToString(), sign, fraction.ToString(), decimalSign));
        }

        int digits = whole.Length + fraction.Length;
        int end = at;
        int exponent = digits == 0 ? 0 : Power(text, ref end);
        return new Numeral($"{whole}.{fraction}", exponent, digits == 0 ? 0 : end, sign == '\0' && !grouped && end == at, null);
    }

    private static Numeral Refused(string fault) => new("", 0, 0, false, fault);

    /// <summary>A group space has three digits behind it, and not a fourth.</summary>
    private static bool IsGroupSpace(ReadOnlySpan<char> text, int at) =>
        text[at] is ' ' or '\u00a0' or '\u2007' or '\u2009' or '\u202f'
        && at + 3 < text.Length
        && text[(at + 1)..(at + 4)].IndexOfAnyExceptInRange('0', '9') < 0
        && (at + 4 == text.Length || !char.IsAsciiDigit(text[at + 4]));

    /// <summary>The first group of a grouped number has one to three digits and does not begin with 0.</summary>
    private static bool CanStartGroups(StringBuilder whole) => whole.Length is >= 1 and <= 3 && whole[0] != '0';

    private static int Power(ReadOnlySpan<char> text, ref int at)
    {
        int next = at + 1;
        if (at >= text.Length || text[at] is not ('e' or 'E'))
        {
            return 0;
        }

        bool negative = next < text.Length && text[next] is '-' or '\u2212';
        if (negative || (next < text.Length && text[next] == '+'))
        {
            next++;
        }

        int power = 0;
        int first = next;
        for (; next < text.Length && char.IsAsciiDigit(text[next]); next++)
        {
            power = Math.Min(power * 10 + (text[next] - '0'), ExponentLimit);
        }

        if (next == first)
        {
            return 0;
        }

        at = next;
        return negative ? -power : power;
    }
}
