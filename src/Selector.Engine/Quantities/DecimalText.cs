using System.Globalization;

namespace Selector.Engine.Quantities;

/// <summary>Turns decimal digits and a power of ten into a value.</summary>
/// <remarks>All scaling is done on the text, so that 4.7 µF is the double nearest to 4.7e-6 and not a product near it.</remarks>
internal static class DecimalText
{
    /// <summary>Scales and converts; refuses what a double cannot hold.</summary>
    /// <param name="negative">True for a minus sign.</param>
    /// <param name="mantissa">ASCII digits with one point, which may stand first or last.</param>
    /// <param name="exponent">The power of ten from exponent and prefix together.</param>
    /// <param name="unit">The unit; per cent takes two more powers off.</param>
    internal static QuantityReading ToReading(bool negative, string mantissa, int exponent, Unit unit)
    {
        int power = unit.Scale == UnitScale.Percent ? exponent - 2 : exponent;
        string plain = string.Create(CultureInfo.InvariantCulture, $"0{mantissa}0E{power}");
        double size = double.TryParse(plain, NumberStyles.Float, CultureInfo.InvariantCulture, out double parsed) ? parsed : double.NaN;
        if (!double.IsFinite(size))
        {
            return QuantityReading.Refused(QuantityFaults.TooLarge);
        }

        if (size == 0)
        {
            // Also turns minus nothing into nothing, so that no "-0" is ever shown or stored.
            return mantissa.AsSpan().IndexOfAnyInRange('1', '9') >= 0 ? QuantityReading.Refused(QuantityFaults.TooSmall) : default;
        }

        return new QuantityReading(negative ? -size : size, null);
    }
}
