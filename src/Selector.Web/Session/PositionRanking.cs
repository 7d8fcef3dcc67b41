using Selector.Engine.Ranking;

namespace Selector.Web.Session;

/// <summary>The candidates of one position as an open row shows them.</summary>
public sealed class PositionRanking : IDisposable
{
    private readonly Latest _run = new();

    /// <summary>The last ranking that came; stays while a newer one is under way.</summary>
    public Ranking? Ranking { get; private set; }

    public bool IsBusy => _run.IsBusy;

    /// <summary>Ranks anew, off the page's thread.</summary>
    /// <returns>True when this wish was the last and its answer stands.</returns>
    public async Task<bool> Renew(Func<CancellationToken, Task<Ranking>> rank)
    {
        if (await _run.Run(rank) is not { } ranking)
        {
            return false;
        }

        Ranking = ranking;
        return true;
    }

    public void Dispose() => _run.Dispose();
}
