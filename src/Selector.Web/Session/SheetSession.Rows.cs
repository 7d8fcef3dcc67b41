using Selector.Engine.Supplies;

namespace Selector.Web.Session;

/// <content>Rows that are open, and the candidates of their positions.</content>
public sealed partial class SheetSession
{
    private readonly HashSet<string> _open = new(StringComparer.Ordinal);
    private readonly Dictionary<string, PositionRanking> _rankings = new(StringComparer.Ordinal);

    public bool IsOpen(LedgerRow row) => _open.Contains(row.Id);

    public PositionRanking? RankingOf(string position) => _rankings.GetValueOrDefault(position);

    /// <summary>Opens a row into its candidates, or closes it.</summary>
    public async Task Toggle(LedgerRow row)
    {
        if (!_open.Remove(row.Id))
        {
            _open.Add(row.Id);
            if (!_rankings.TryGetValue(row.Position, out var ranking) || ranking.Ranking is null)
            {
                await Rank(row.Position);
            }
        }
        else if (!OpenPositions().Contains(row.Position) && _rankings.Remove(row.Position, out var unseen))
        {
            unseen.Dispose();
        }
    }

    /// <summary>Ranks the open positions again after the supply has changed under them.</summary>
    private async Task RankOpenRows()
    {
        foreach (var position in OpenPositions().ToList())
        {
            await Rank(position);
        }
    }

    private IEnumerable<string> OpenPositions() => Assessment is null
        ? []
        : Assessment.Ledger.Positions.Where(p => p.Rows.Any(IsOpen)).Select(p => p.Spec.Id);

    private async Task Rank(string position)
    {
        if (Values is not { Ok: true } || State is not { } state)
        {
            return;
        }

        if (!_rankings.TryGetValue(position, out var ranking))
        {
            _rankings[position] = ranking = new PositionRanking();
        }

        var run = ranking.Renew(cancel => work.Rank(state, position, cancel));
        Changed?.Invoke();
        if (await run)
        {
            Say(ranking.Fault.Length > 0 || ranking.Ranking is null
                ? $"{position}: {ranking.Fault}"
                : $"{position}: {ranking.Ranking.Candidates.Length} candidates, {ranking.Ranking.Holding} hold.");
        }
    }
}
