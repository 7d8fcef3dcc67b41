using System.Globalization;
using System.Text;

namespace Selector.Engine.Quantities;

/// <summary>Writes a quantity in the house style, so that <see cref="QuantityReader"/> reads it back.</summary>
public static class QuantityWriter
{
    /// <summary>Seventeen digits tell every double from its neighbours.</summary>
    public const int MostDigits = 17;

    /// <summary>U+202F, narrow no-break space: number and unit stay on one line.</summary>
    private const char BeforeUnit = '\u202f';

    /// <summary>Shorter numbers are written in one piece: 4700, but 20 000.</summary>
    private const int LeastGrouped = 5;

    /// <summary>Up to this many digits a temperature has at most one decimal: none here is known better.</summary>
    private const int CoarseDigits = 4;

    /// <summary>Writes a number with prefix and unit.</summary>
    /// <param name="value">The value in the base unit; per cent as a fraction. Finite.</param>
    /// <param name="unit">The unit.</param>
    /// <param name="significantDigits">1 to <see cref="MostDigits"/>. °C shows no trailing zeros, and one decimal at most up to four digits.</param>
    /// <param name="display">The signs; null for <see cref="NumberDisplay.Invariant"/>.</param>
    /// <param name="trim">True for nominal values, without zeros at the end (4.7 µF); false for computed ones (1.50 A).</param>
    /// <exception cref="ArgumentOutOfRangeException">The value is not finite, or the digits are out of range.</exception>
    public static string Write(double value, Unit unit, int significantDigits = 3, NumberDisplay? display = null, bool trim = false)
    {
        if (!double.IsFinite(value))
        {
            throw new ArgumentOutOfRangeException(nameof(value), "Only finite values may be shown.");
        }

        ArgumentOutOfRangeException.ThrowIfLessThan(significantDigits, 1);
        ArgumentOutOfRangeException.ThrowIfGreaterThan(significantDigits, MostDigits);
        NumberDisplay signs = display ?? NumberDisplay.Invariant;
        bool coarse = unit == Units.Celsius && significantDigits <= CoarseDigits;
        double shown = coarse && Math.Abs(value) < 1e6 ? Math.Round(value, 1, MidpointRounding.AwayFromZero) : value;
        if (shown == 0)
        {
            return Join("0", "", unit.Symbol);
        }

        RoundedDecimal number = RoundedDecimal.Of(Math.Abs(shown), significantDigits);
        if (unit.Scale == UnitScale.Percent)
        {
            number = number with { Exponent = number.Exponent + 2 };
        }

        string sign = shown < 0 ? signs.MinusSign : "";
        bool trimmed = trim || unit == Units.Celsius;
        if (HouseScale.For(unit, number) is not { } scale)
        {
            string plain = Digits(number with { Exponent = 0 }, signs, trimmed);
            return Join(string.Create(CultureInfo.InvariantCulture, $"{sign}{plain}e{number.Exponent}"), "", unit.Symbol);
        }

        string digits = Digits(number with { Exponent = number.Exponent - scale.Exponent }, signs, trimmed);
        return Join(sign + digits, scale.Prefix, scale.Symbol);
    }

    private static string Join(string number, string prefix, string symbol) =>
        prefix.Length + symbol.Length == 0 ? number : $"{number}{BeforeUnit}{prefix}{symbol}";

    private static string Digits(RoundedDecimal number, NumberDisplay signs, bool trimmed)
    {
        string digits = number.Exponent < 0 ? new string('0', -number.Exponent) + number.Digits : number.Digits;
        int wholeLength = Math.Max(number.Exponent, 0) + 1;
        string whole = digits.Length < wholeLength ? digits.PadRight(wholeLength, '0') : digits[..wholeLength];
        string fraction = digits.Length > wholeLength ? digits[wholeLength..] : "";
        fraction = trimmed ? fraction.TrimEnd('0') : fraction;
        return fraction.Length == 0 ? Grouped(whole, signs) : Grouped(whole, signs) + signs.DecimalSign + fraction;
    }

    private static string Grouped(string whole, NumberDisplay signs)
    {
        if (whole.Length < LeastGrouped)
        {
            return whole;
        }

        var text = new StringBuilder();
        for (int i = 0; i < whole.Length; i++)
        {
            if (i > 0 && (whole.Length - i) % 3 == 0)
            {
                text.Append(signs.GroupSign);
            }

            text.Append(whole[i]);
        }

        return text.ToString();
    }
}
