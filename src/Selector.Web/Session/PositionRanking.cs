using Selector.Application.Assessing;
using Selector.Engine.Ranking;

namespace Selector.Web.Session;

/// <summary>The candidates of one position as an open row shows them.</summary>
public sealed class PositionRanking : IDisposable
{
    private readonly Latest _run = new();

    /// <summary>The last ranking that came; stays while a newer one is under way.</summary>
    public Ranking? Ranking { get; private set; }

    /// <summary>Why there is no new one; empty when there is.</summary>
    public string Fault { get; private set; } = "";

    public bool IsBusy => _run.IsBusy;

    /// <summary>Ranks anew, off the page's thread.</summary>
    /// <returns>True when this wish was the last and its answer, or its fault, stands.</returns>
    public async Task<bool> Renew(Func<CancellationToken, Task<Ranking>> rank)
    {
        try
        {
            if (await _run.Run(rank) is not { } ranking)
            {
                return false;
            }

            Ranking = ranking;
            Fault = "";
        }
        catch (Exception e) when (e is TimeoutException or SolverBusyException or ArgumentException)
        {
            Fault = e.Message;
        }

        return true;
    }

    public void Dispose() => _run.Dispose();
}
