using System.Collections.Immutable;
using Selector.Application.Catalogue;
using Selector.Application.Policies;
using Selector.Application.Supplies;
using Selector.Engine.Circuits;
using Selector.Engine.Derating;
using Selector.Engine.Parts;
using Selector.Engine.Ranking;
using Selector.Engine.Supplies;

namespace Selector.Application.Assessing;

/// <summary>Assesses supplies and ranks parts for their positions, on the catalogue as it is now.</summary>
public sealed class AssessmentDesk(CatalogueDesk catalogue, PolicyShelf policies, Registry registry, SolveQueue queue, TimeProvider time)
{
    /// <summary>The ledger of a supply. What is wrong with its texts or takes too long is said in the answer, not thrown.</summary>
    /// <exception cref="OperationCanceledException">The caller no longer wants the answer.</exception>
    /// <exception cref="SolverBusyException">Too many are waiting.</exception>
    public async Task<Assessment> Assess(SupplyState state, CancellationToken cancel = default)
    {
        var (reading, policy, faults, snapshot) = await Read(state, cancel).ConfigureAwait(false);
        var began = time.GetTimestamp();
        Ledger ledger;
        try
        {
            (ledger, began) = await queue.Run(
                token =>
                {
                    var start = time.GetTimestamp();
                    return (Assessor.Assess(registry, reading.Design, policy, Budget.Until(token)), start);
                },
                cancel).ConfigureAwait(false);
        }
        catch (TimeoutException late)
        {
            ledger = Unsolved(policy, late.Message);
        }

        return new Assessment(
            state, RequirementReader.Read(registry, reading.Design.Requirement), reading.Design, ledger, policy, faults, snapshot.Version,
            time.GetElapsedTime(began), time.GetUtcNow().UtcDateTime);
    }

    /// <summary>Every part of the position's family, fitted on trial and solved, best first.</summary>
    /// <exception cref="OperationCanceledException">The caller no longer wants the answer.</exception>
    /// <exception cref="TimeoutException">It took longer than the limit; the message may be shown.</exception>
    /// <exception cref="ArgumentException">The requirement has faults, or there is no such position; the message may be shown.</exception>
    public async Task<Ranking> Rank(SupplyState state, string position, CancellationToken cancel = default)
    {
        var (reading, policy, _, snapshot) = await Read(state, cancel).ConfigureAwait(false);
        var requirement = RequirementReader.Read(registry, reading.Design.Requirement);
        if (!requirement.Ok)
        {
            throw new ArgumentException(string.Join(" ", requirement.Faults.Select(f => f.Fault)));
        }

        var model = SupplyModel.Build(registry, requirement);
        if (model.Positions.FirstOrDefault(p => p.Id == position) is not { } spec)
        {
            throw new ArgumentException($"This supply has no position \u201c{PlainText.Short(position)}\u201d.");
        }

        return await queue.Run(
            token => Ranker.Rank(model, reading.Design.Fittings, position, snapshot.Of(spec.Family), policy, token), cancel).ConfigureAwait(false);
    }

    private async Task<(DesignReading Reading, Policy Policy, ImmutableArray<string> Faults, CatalogueSnapshot Catalogue)> Read(
        SupplyState state, CancellationToken cancel)
    {
        ArgumentNullException.ThrowIfNull(state);
        var snapshot = await catalogue.Snapshot(cancel).ConfigureAwait(false);
        var reading = DesignReader.Read(state, snapshot, registry);
        var wanted = state.Texts.GetValueOrDefault(SupplyFields.Policy, "");
        var policy = wanted.Length == 0 ? policies.Standard : policies.Find(wanted);
        return policy is null
            ? (reading, policies.Standard, reading.Faults.Add($"There is no policy \u201c{PlainText.Short(wanted)}\u201d; {policies.Standard.Title} is used."), snapshot)
            : (reading, policy, reading.Faults, snapshot);
    }

    private static Ledger Unsolved(Policy policy, string fault) =>
        new([], [], new Counts(0, 0, 0, 0, 0, 0, 0, 0), policy.Title, [], fault);
}
