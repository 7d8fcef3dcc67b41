using Selector.Engine.Parts;

namespace Selector.Engine.Circuits.Reservoir;

/// <summary>Currents of several frequencies as one at the frequency of the rating: each divided by the part's multiplier, root-sum-square.</summary>
public static class RippleWeight
{
    /// <summary>Equivalent of two currents.</summary>
    /// <param name="table">Multipliers in the order of <see cref="FrequencyMultiplier.Keys"/>; 0 or NaN where the maker says nothing.</param>
    /// <param name="low">A rms, at <paramref name="lowFrequency"/> and above.</param>
    /// <param name="lowFrequency">Hz.</param>
    /// <param name="high">A rms, at <paramref name="highFrequency"/> and above.</param>
    /// <param name="highFrequency">Hz.</param>
    /// <returns>A rms. A frequency that the table does not reach counts with multiplier 1; the caller must then not pass the stress.</returns>
    public static double Equivalent(ReadOnlySpan<double> table, double low, double lowFrequency, double high, double highFrequency)
    {
        var a = Weighted(table, low, lowFrequency);
        var b = Weighted(table, high, highFrequency);
        return Math.Sqrt(a * a + b * b);
    }

    /// <summary>
    /// Equivalent of a rectifier's and a converter's current in one reservoir: the line at the ripple frequency with its own multiplier,
    /// all above it as if it stood at twice that frequency, the converter's at its own. Multipliers rise with frequency, so that
    /// nothing is taken too lightly.
    /// </summary>
    /// <param name="table">As above.</param>
    /// <param name="low">All of the rectifier's current, A rms.</param>
    /// <param name="fundamental">Its component at the ripple frequency, A rms.</param>
    /// <param name="ripple">Ripple frequency, Hz.</param>
    /// <param name="high">The converter's current, A rms.</param>
    /// <param name="switching">Hz.</param>
    public static double Equivalent(ReadOnlySpan<double> table, double low, double fundamental, double ripple, double high, double switching)
    {
        var above = Math.Sqrt(Math.Max(0, low * low - fundamental * fundamental));
        var (a, b, c) = (Weighted(table, Math.Min(low, fundamental), ripple), Weighted(table, above, 2 * ripple), Weighted(table, high, switching));
        return Math.Sqrt(a * a + b * b + c * c);
    }

    private static double Weighted(ReadOnlySpan<double> table, double current, double frequency)
    {
        if (current <= 0 || frequency <= 0)
        {
            return 0;
        }

        // The inputs of a stage are finite: a blank of the table reaches it as 0.
        Span<double> given = stackalloc double[table.Length];
        for (var i = 0; i < given.Length; i++)
        {
            given[i] = table[i] > 0 ? table[i] : double.NaN;
        }

        var multiplier = FrequencyMultiplier.At(given, frequency);
        return current / (double.IsNaN(multiplier) ? 1 : multiplier);
    }
}
