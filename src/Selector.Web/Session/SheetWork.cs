using System.Collections.Concurrent;
using Selector.Application.Assessing;
using Selector.Application.Catalogue;
using Selector.Application.Supplies;
using Selector.Engine.Ranking;
using Selector.Engine.Supplies;

namespace Selector.Web.Session;

/// <summary>
/// What an open sheet has computed for it. The last assessment of each supply is kept: a page is drawn twice, once for the first
/// answer and once when it becomes interactive, and its papers are of the same ledger.
/// </summary>
public sealed class SheetWork(AssessmentDesk desk, CatalogueDesk catalogue, Registry registry)
{
    private const int MostKept = 64;

    private readonly ConcurrentDictionary<int, Assessment> _kept = new();

    /// <summary>The requirement as understood; quick enough for the page's own thread.</summary>
    public RequirementValues Read(SupplyState state) => RequirementReader.Read(registry, state.Requirement);

    /// <inheritdoc cref="AssessmentDesk.Assess"/>
    public async Task<Assessment> Assess(SupplyState state, CancellationToken cancel)
    {
        var version = (await catalogue.Snapshot(cancel)).Version;
        if (_kept.TryGetValue(state.Number, out var kept) && kept.State.Version == state.Version && kept.CatalogueVersion == version)
        {
            return kept;
        }

        var assessment = await desk.Assess(state, cancel);
        if (_kept.Count >= MostKept)
        {
            _kept.Clear();
        }

        // A ledger that was not finished in time is not kept: the next look may have more luck.
        if (assessment.Ledger.Fault is null)
        {
            _kept[state.Number] = assessment;
        }

        return assessment;
    }

    /// <inheritdoc cref="AssessmentDesk.Rank"/>
    public Task<Ranking> Rank(SupplyState state, string position, CancellationToken cancel) => desk.Rank(state, position, cancel);
}
