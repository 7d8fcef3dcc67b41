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
