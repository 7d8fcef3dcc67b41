namespace Selector.Engine.Tests.Support;

/// <summary>A counter-based generator (SplitMix64): the same numbers on every machine.</summary>
internal sealed class CounterRandom(ulong seed)
{
    private ulong _counter = unchecked(seed * 0x9E3779B97F4A7C15UL);

    /// <summary>Uniform in [0, 1).</summary>
    public double Next()
    {
        unchecked
        {
            _counter += 0x9E3779B97F4A7C15UL;
            var z = _counter;
            z = (z ^ (z >> 30)) * 0xBF58476D1CE4E5B9UL;
            z = (z ^ (z >> 27)) * 0x94D049BB133111EBUL;
            z ^= z >> 31;
            return (z >> 11) * (1.0 / (1UL << 53));
        }
    }

    /// <summary>Log-uniform between two positive ends.</summary>
    public double Between(double low, double high) => low * Math.Pow(high / low, Next());

    public T Pick<T>(params T[] choices) => choices[(int)(Next() * choices.Length)];
}
