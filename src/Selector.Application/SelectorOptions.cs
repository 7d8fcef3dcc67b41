namespace Selector.Application;

/// <summary>Bounds that an installation may set. Checked when the services are registered.</summary>
public sealed record SelectorOptions
{
    /// <summary>Longest that one assessment or ranking may take, 0.1 s to 10 min.</summary>
    public TimeSpan SolveLimit { get; init; } = TimeSpan.FromSeconds(10);

    /// <summary>Solves that run at once, 1 to 256; one per core by default.</summary>
    public int Solvers { get; init; } = Math.Clamp(Environment.ProcessorCount, 1, 256);

    /// <summary>Solves that may wait behind them before further ones are turned away, 0 to 100,000.</summary>
    public int MostWaiting { get; init; } = 1000;

    /// <summary>Most characters of one import file, 1,000 to 50,000,000.</summary>
    public int LongestImport { get; init; } = 20_000_000;

    /// <exception cref="ArgumentException">Names every setting out of range.</exception>
    internal SelectorOptions Checked()
    {
        var faults = new List<string>();
        Check(SolveLimit >= TimeSpan.FromSeconds(0.1) && SolveLimit <= TimeSpan.FromMinutes(10), $"{nameof(SolveLimit)} must be 0.1 s to 10 min.");
        Check(Solvers is >= 1 and <= 256, $"{nameof(Solvers)} must be 1 to 256.");
        Check(MostWaiting is >= 0 and <= 100_000, $"{nameof(MostWaiting)} must be 0 to 100,000.");
        Check(LongestImport is >= 1000 and <= 50_000_000, $"{nameof(LongestImport)} must be 1,000 to 50,000,000.");
        return faults.Count == 0 ? this : throw new ArgumentException(string.Join(" ", faults));

        void Check(bool good, string fault)
        {
            if (!good)
            {
                faults.Add(fault);
            }
        }
    }
}
