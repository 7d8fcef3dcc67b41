namespace Selector.Reference.Support;

/// <summary>SplitMix64: a counter through a mixing function, the same on every machine.</summary>
internal struct Dice(ulong seed)
{
    private ulong _state = seed;

    public bool Chance(double share) => Next() < share;

    public double Even(double low, double high) => low + (high - low) * Next();

    public double Log(double low, double high) => low * Math.Pow(high / low, Next());

    public int Pick(int count) => (int)(Next() * count);

    private double Next()
    {
        unchecked
        {
            _state += 0x9E3779B97F4A7C15;
            var z = _state;
            z = (z ^ (z >> 30)) * 0xBF58476D1CE4E5B9;
            z = (z ^ (z >> 27)) * 0x94D049BB133111EB;
            return ((z ^ (z >> 31)) >> 11) * (1.0 / (1UL << 53));
        }
    }
}
