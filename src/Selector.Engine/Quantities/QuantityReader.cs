using System.Text;

namespace Selector.Engine.Quantities;

/// <summary>Reads a quantity as people write it.</summary>
/// <remarks>
/// <para>Prefixes: f p n u µ m k M G T, both code points of µ, "meg" for mega, and K for k before a unit, in a code, or alone for
/// ohm and hertz. M is mega and m is milli, always; a megafarad is read as one, for ranges are the business of the field.</para>
/// <para>Codes (IEC 60062): a prefix, R or the capital sign of the unit may stand for the decimal sign: 4k7, 0R25, n33, 3V3.</para>
/// <para>Decimal sign: point or comma, one of them and once. A comma behind one to three digits that do not begin with 0 and before
/// exactly three is refused, since 1,234 may be thousands; 1,23, 1,2345, 0,123 and 1234,567 can only be decimals. A point is always
/// the decimal sign. When the display of the reader is known, its own decimal sign is never in doubt and the other one is
/// held to that rule instead. Groups may only be set apart by a space: 1 500.</para>
/// <para>Per cent: 10 and 10 % are both the fraction 0.1. A unit may be left out; a wrong one is refused.</para>
/// <para>The work is linear in the length, which is limited to <see cref="LongestText"/>; no text makes it throw.</para>
/// </remarks>
public static class QuantityReader
{
    /// <summary>The longest text that is looked at, in characters, white space included.</summary>
    public const int LongestText = 64;

    /// <summary>Reads one quantity.</summary>
    /// <param name="text">What was typed.</param>
    /// <param name="unit">The unit that the field expects.</param>
    /// <param name="display">How this reader sees numbers, when known; it only decides which decimal sign is beyond doubt.</param>
    /// <returns>The value in the base unit, finite, correctly rounded from the decimal text; or a fault in words.</returns>
    public static QuantityReading Read(string text, Unit unit, NumberDisplay? display = null)
    {
        if (text is { Length: > LongestText })
        {
            return QuantityReading.Refused(QuantityFaults.TooLong(LongestText));
        }

        ReadOnlySpan<char> body = text.AsSpan().Trim();
        if (body.IsEmpty)
        {
            return QuantityReading.Refused(QuantityFaults.Empty(unit));
        }

        if (body[0] == '±')
        {
            return QuantityReading.Refused(QuantityFaults.PlusMinus);
        }

        bool negative = body[0] is '-' or '\u2212';
        if (negative || body[0] == '+')
        {
            body = body[1..].TrimStart();
        }

        if (IsLetterBeforeDigit(body))
        {
            return ReadCode("", body, negative, unit);
        }

        Numeral numeral = Numeral.Scan(body, display?.DecimalSign ?? NumberDisplay.Invariant.DecimalSign);
        if (numeral.Fault is not null)
        {
            return QuantityReading.Refused(numeral.Fault);
        }

        if (numeral.Length == 0)
        {
            return QuantityReading.Refused(IsNotFinite(body) ? QuantityFaults.NotFinite(unit) : QuantityFaults.NoNumber(unit));
        }

        ReadOnlySpan<char> tail = body[numeral.Length..];
        if (numeral.IsWhole && IsLetterBeforeDigit(tail))
        {
            return ReadCode(body[..numeral.Length], tail, negative, unit);
        }

        string packed = Packed(tail);
        UnitText typed = UnitText.Resolve(packed, unit);
        return typed.Fault is null ? DecimalText.ToReading(negative, numeral.Mantissa, numeral.Exponent + typed.Exponent, unit)
            : QuantityReading.Refused(char.IsAsciiDigit(packed[0]) ? QuantityFaults.SeveralNumbers : typed.Fault);
    }

    /// <summary>Digits (perhaps none), a letter for the decimal sign, digits, and perhaps the unit.</summary>
    private static QuantityReading ReadCode(ReadOnlySpan<char> whole, ReadOnlySpan<char> rest, bool negative, Unit unit)
    {
        UnitText letter = UnitText.Letter(rest[0], whole.IsEmpty, unit);
        if (letter.Fault is not null)
        {
            return QuantityReading.Refused(letter.Fault);
        }

        int end = 1;
        while (end < rest.Length && char.IsAsciiDigit(rest[end]))
        {
            end++;
        }

        string tail = Packed(rest[end..]);
        UnitText typed = UnitText.Resolve(tail, unit);
        if (typed.Fault is not null || typed.HasPrefix)
        {
            return QuantityReading.Refused(typed.Fault ?? QuantityFaults.Unknown(tail, unit));
        }

        return DecimalText.ToReading(negative, $"{whole}.{rest[1..end]}", letter.Exponent, unit);
    }

    private static string Packed(ReadOnlySpan<char> text)
    {
        var packed = new StringBuilder(text.Length);
        foreach (char c in text)
        {
            if (!char.IsWhiteSpace(c))
            {
                packed.Append(c);
            }
        }

        return packed.ToString();
    }

    private static bool IsNotFinite(ReadOnlySpan<char> body) =>
        body.StartsWith("nan", StringComparison.OrdinalIgnoreCase)
        || body.StartsWith("inf", StringComparison.OrdinalIgnoreCase)
        || body.StartsWith("∞", StringComparison.Ordinal);

    private static bool IsLetterBeforeDigit(ReadOnlySpan<char> text) =>
        text.Length > 1 && char.IsLetter(text[0]) && char.IsAsciiDigit(text[1]);
}
