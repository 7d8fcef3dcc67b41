using System.Globalization;

namespace Selector.Engine.Quantities;

/// <summary>A positive number rounded to significant decimal digits: d.ddd times a power of ten.</summary>
/// <param name="Digits">The digits without a sign or a point; the first is not 0.</param>
/// <param name="Exponent">The power of ten of the first digit.</param>
internal readonly record struct RoundedDecimal(string Digits, int Exponent)
{
    /// <summary>Rounds the exact binary value once; the prefix is chosen after that, so 999.96 mA in three digits becomes 1.00 A.</summary>
    internal static RoundedDecimal Of(double value, int significantDigits)
    {
        string format = string.Create(CultureInfo.InvariantCulture, $"E{significantDigits - 1}");
        string text = value.ToString(format, CultureInfo.InvariantCulture);
        int mark = text.IndexOf('E', StringComparison.Ordinal);
        string digits = text[..mark].Replace(".", "", StringComparison.Ordinal);
        return new RoundedDecimal(digits, int.Parse(text.AsSpan(mark + 1), NumberStyles.AllowLeadingSign, CultureInfo.InvariantCulture));
    }

    /// <summary>True for 1, 10, 0.1 and so on.</summary>
    internal bool IsPowerOfTen => Digits[0] == '1' && Digits.AsSpan(1).IndexOfAnyExcept('0') < 0;
}
