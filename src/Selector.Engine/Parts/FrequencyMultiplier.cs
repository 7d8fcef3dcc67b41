using System.Collections.Immutable;
using Selector.Engine.Quantities;

namespace Selector.Engine.Parts;

/// <summary>
/// The maker's table by which a capacitor's ripple rating is multiplied at other frequencies. Read between its points in a
/// straight line over the logarithm of the frequency; never below its lowest point; above its highest point the highest
/// multiplier is kept, since the loss only falls with frequency.
/// </summary>
public static class FrequencyMultiplier
{
    private static readonly (string Key, double Frequency, string Words)[] Points =
    [
        ("multiplier_50", 50, "50 Hz"),
        ("multiplier_100", 100, "100 or 120 Hz"),
        ("multiplier_1k", 1e3, "1 kHz"),
        ("multiplier_10k", 1e4, "10 kHz"),
        ("multiplier_100k", 1e5, "100 kHz"),
    ];

    /// <summary>Keys of the columns, rising in frequency.</summary>
    public static ImmutableArray<string> Keys { get; } = [.. Points.Select(p => p.Key)];

    internal static IEnumerable<RatingSpec> Ratings => Points.Select(p => new RatingSpec(
        p.Key, $"ripple multiplier at {p.Words}", Units.One, new(0.01, 10), $"Factor on the rated ripple current at {p.Words}."));

    /// <summary>Multiplier at a frequency; NaN when the table does not reach down to it or is empty.</summary>
    /// <param name="table">One value per key, NaN where the maker says nothing.</param>
    /// <param name="frequency">Hz, positive.</param>
    public static double At(ReadOnlySpan<double> table, double frequency)
    {
        var below = -1;
        for (var i = 0; i < Points.Length; i++)
        {
            if (double.IsNaN(table[i]))
            {
                continue;
            }

            if (Points[i].Frequency >= frequency * (1 - 1e-9))
            {
                // 120 Hz tables and 100 Hz tables are the same table; the mains itself may run 2 % below its nominal.
                return below < 0
                    ? Points[i].Frequency <= frequency * 1.02 ? table[i] : double.NaN
                    : Between(below, i, table, frequency);
            }

            below = i;
        }

        return below < 0 ? double.NaN : table[below];
    }

    private static double Between(int low, int high, ReadOnlySpan<double> table, double frequency)
    {
        var share = Math.Log(frequency / Points[low].Frequency) / Math.Log(Points[high].Frequency / Points[low].Frequency);
        return table[low] + (table[high] - table[low]) * Math.Min(share, 1);
    }
}
