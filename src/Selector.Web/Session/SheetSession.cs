using System.Collections.Immutable;
using Selector.Application.Assessing;
using Selector.Application.Supplies;
using Selector.Engine.Supplies;

namespace Selector.Web.Session;

/// <summary>
/// One open sheet: the supply as it stands, its last good ledger and what went wrong. Every method runs on the page's own
/// dispatcher; only solving leaves it.
/// </summary>
public sealed partial class SheetSession(int number, SupplyDesk supplies, SheetWork work, string by) : IDisposable
{
    private readonly Latest _solving = new();
    private readonly Dictionary<string, FieldTrouble> _troubles = new(StringComparer.Ordinal);

    /// <summary>Something that the page shows has changed.</summary>
    public event Action? Changed;

    public int Number => number;

    public SupplyState? State { get; private set; }

    /// <summary>The requirement as understood.</summary>
    public RequirementValues? Values { get; private set; }

    /// <summary>The last assessment that could be made; <see cref="IsOld"/> says whether it is of the requirement that stands.</summary>
    public Assessment? Assessment { get; private set; }

    /// <summary>The ledger shown is from before a fault or before the edit that is being solved.</summary>
    public bool IsOld => Assessment is { } a && State is { } s && a.State.Version != s.Version;

    public bool IsBusy => _solving.IsBusy;

    /// <summary>What is wrong besides the fields: fittings that could not be read, or why nothing was solved.</summary>
    public ImmutableArray<string> Faults { get; private set; } = [];

    /// <summary>Last thing said to a screen reader.</summary>
    public string Said { get; private set; } = "";

    public IReadOnlyDictionary<string, FieldTrouble> Troubles => _troubles;

    /// <summary>Reads the supply and solves it.</summary>
    /// <returns>False when there is none of that number.</returns>
    public async Task<bool> Open(CancellationToken cancel)
    {
        if (await supplies.Open(number, cancel) is not { } state)
        {
            return false;
        }

        Adopt(state);
        await Solve();
        return true;
    }

    /// <summary>Looks again after a notice that somebody has edited.</summary>
    public async Task Follow(long version)
    {
        if (State is null || version <= State.Version || await supplies.Open(number) is not { } state || state.Version <= State.Version)
        {
            return;
        }

        Adopt(state);
        Said = "Somebody else has edited this supply.";
        await Solve();
    }

    public void Dispose()
    {
        _solving.Dispose();
        foreach (var ranking in _rankings.Values)
        {
            ranking.Dispose();
        }
    }

    private void Adopt(SupplyState state)
    {
        // Notices and answers may come out of order; the newer one stands.
        if (State is null || state.Version >= State.Version)
        {
            State = state;
            Values = work.Read(state);
        }
    }

    private async Task Solve()
    {
        if (Values is not { Ok: true } || State is not { } state)
        {
            _solving.Cancel();
            Say("Saved. The requirement has a fault; the ledger shown is old.");
            return;
        }

        var run = _solving.Run(cancel => work.Assess(state, cancel));
        Changed?.Invoke();
        try
        {
            if (await run is { } assessment)
            {
                await Take(assessment);
            }
        }
        catch (SolverBusyException busy)
        {
            Faults = [busy.Message];
            Say(busy.Message);
        }
    }

    private async Task Take(Assessment assessment)
    {
        Faults = assessment.Faults;
        if (assessment.Ledger.Fault is { } fault)
        {
            // The last good ledger stays, marked old.
            Faults = Faults.Insert(0, fault);
            Say(fault);
            return;
        }

        Assessment = assessment;
        var counts = assessment.Ledger.Counts;
        Say($"Solved: {counts.Hold} hold, {counts.Lack} lack, {counts.NotRated} not rated, {counts.Empty} empty.");
        await RankOpenRows();
    }

    private void Say(string words)
    {
        Said = words;
        Changed?.Invoke();
    }
}
