using System.Collections.Immutable;

namespace Selector.Engine.Quantities;

/// <summary>The preferred numbers of IEC 60063, as printed in public articles.</summary>
/// <remarks>
/// E24 is a table with a history: eight of its values are not the rounded powers. E12, E6 and E3 each take every second value of the
/// series above. E48, E96 and E192 are round(10^(i/n), 2 decimals) for i = 0 to n - 1, with one exception: E192 has 9.20 at
/// i = 185, where the rule gives 9.19. E24 is not a part of E48 and up: 3.3 is not in E96, 3.32 is.
/// </remarks>
public static class PreferredNumbers
{
    private const int ExceptionIndex = 185;
    private const int ExceptionHundredths = 920;

    /// <summary>Smallest value that may be asked for; well inside what a double holds exactly enough.</summary>
    public const double Least = 1e-300;

    /// <summary>Largest value that may be asked for.</summary>
    public const double Greatest = 1e300;

    private static readonly ImmutableArray<int> E24Hundredths =
    [
        100, 110, 120, 130, 150, 160, 180, 200, 220, 240, 270, 300, 330, 360, 390, 430, 470, 510, 560, 620, 680, 750, 820, 910,
    ];

    private static readonly ImmutableDictionary<PreferredSeries, ImmutableArray<int>> Hundredths =
        Enum.GetValues<PreferredSeries>().ToImmutableDictionary(s => s, Build);

    private static readonly ImmutableDictionary<PreferredSeries, ImmutableArray<double>> Mantissas =
        Hundredths.ToImmutableDictionary(p => p.Key, p => p.Value.Select(h => h / 100.0).ToImmutableArray());

    /// <summary>The values of one decade, from 1 up to but without 10, ascending.</summary>
    /// <exception cref="ArgumentOutOfRangeException">No such series.</exception>
    public static ImmutableArray<double> Values(PreferredSeries series) =>
        Mantissas.TryGetValue(series, out ImmutableArray<double> values) ? values : throw NoSuchSeries();

    /// <summary>The smallest preferred value that is not below <paramref name="value"/>, compared exactly, without slack.</summary>
    /// <param name="value">In any unit; from <see cref="Least"/> to <see cref="Greatest"/>.</param>
    /// <param name="series">The series.</param>
    /// <returns>The double nearest to the decimal value, so 4.7e-6 and not a product near it.</returns>
    /// <exception cref="ArgumentOutOfRangeException">The value is out of range or there is no such series.</exception>
    public static double NearestAtLeast(double value, PreferredSeries series)
    {
        (int decade, ImmutableArray<int> steps) = Locate(value, series);
        foreach (int step in steps)
        {
            double candidate = DecimalScale.Scaled(step, decade);
            if (candidate >= value)
            {
                return candidate;
            }
        }

        return DecimalScale.Scaled(steps[0], decade + 1);
    }

    /// <summary>The largest preferred value that is not above <paramref name="value"/>, compared exactly, without slack.</summary>
    /// <inheritdoc cref="NearestAtLeast"/>
    public static double NearestAtMost(double value, PreferredSeries series)
    {
        (int decade, ImmutableArray<int> steps) = Locate(value, series);
        for (int i = steps.Length - 1; i > 0; i--)
        {
            double candidate = DecimalScale.Scaled(steps[i], decade);
            if (candidate <= value)
            {
                return candidate;
            }
        }

        return DecimalScale.Scaled(steps[0], decade);
    }

    /// <summary>The preferred value with the smallest ratio to <paramref name="value"/>; the lower one of two that are equally near.</summary>
    /// <inheritdoc cref="NearestAtLeast"/>
    public static double Nearest(double value, PreferredSeries series)
    {
        double below = NearestAtMost(value, series);
        double above = NearestAtLeast(value, series);
        return value / below <= above / value ? below : above;
    }

    /// <summary>The decade with 10^d &lt;= value &lt; 10^(d+1), and the series in hundredths.</summary>
    private static (int Decade, ImmutableArray<int> Steps) Locate(double value, PreferredSeries series)
    {
        if (!(value >= Least && value <= Greatest))
        {
            throw new ArgumentOutOfRangeException(nameof(value), "A preferred value is looked for between 1e-300 and 1e300.");
        }

        ImmutableArray<int> steps = Hundredths.TryGetValue(series, out ImmutableArray<int> found) ? found : throw NoSuchSeries();
        int decade = (int)Math.Floor(Math.Log10(value));

        // The logarithm may be off by a rounding next to a power of ten.
        if (DecimalScale.Scaled(100, decade) > value)
        {
            decade--;
        }
        else if (DecimalScale.Scaled(100, decade + 1) <= value)
        {
            decade++;
        }

        return (decade, steps);
    }

    private static ImmutableArray<int> Build(PreferredSeries series)
    {
        int count = (int)series;
        if (count <= E24Hundredths.Length)
        {
            int stride = E24Hundredths.Length / count;
            return [.. Enumerable.Range(0, count).Select(i => E24Hundredths[i * stride])];
        }

        return
        [
            .. Enumerable.Range(0, count).Select(i => series == PreferredSeries.E192 && i == ExceptionIndex
                ? ExceptionHundredths
                : (int)Math.Round(100 * Math.Pow(10, (double)i / count), MidpointRounding.AwayFromZero)),
        ];
    }

    private static ArgumentOutOfRangeException NoSuchSeries() => new("series", "There is no such series of preferred numbers.");
}
