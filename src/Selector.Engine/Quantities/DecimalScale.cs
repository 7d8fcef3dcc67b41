using System.Collections.Immutable;
using System.Globalization;

namespace Selector.Engine.Quantities;

/// <summary>Scales hundredths by a power of ten with a single rounding.</summary>
internal static class DecimalScale
{
    /// <summary>10^22 is the last power of ten that a double holds exactly; up to it one product or quotient is correctly rounded.</summary>
    private const int LastExactPower = 22;

    private static readonly ImmutableArray<double> Powers =
        [.. Enumerable.Range(0, LastExactPower + 1).Select(i => double.Parse($"1E{i}", CultureInfo.InvariantCulture))];

    /// <summary>The double nearest to hundredths / 100 times 10^decade.</summary>
    internal static double Scaled(int hundredths, int decade)
    {
        int power = decade - 2;
        return power switch
        {
            >= 0 and <= LastExactPower => hundredths * Powers[power],
            < 0 and >= -LastExactPower => hundredths / Powers[-power],
            _ => double.Parse(string.Create(CultureInfo.InvariantCulture, $"{hundredths}E{power}"), CultureInfo.InvariantCulture),
        };
    }
}
