using System.Collections.Immutable;
using Selector.Engine.Circuits;
using Selector.Engine.Circuits.Mains;
using Selector.Engine.Circuits.Mains.HoldUp;

namespace Selector.Cli.Compute;

/// <summary>Hold-up of a rectifier with a constant power, reference family F9.</summary>
internal sealed class HoldUpKind : ICaseKind
{
    private static readonly ImmutableArray<(string Column, Func<HoldUpSolution, double> Value)> Figures =
    [
        ("vdc_mean_v", s => s.BusMean),
        ("vbus_max_v", s => s.BusMax),
        ("vbus_min_v", s => s.BusMin),
        ("vc_at_removal_v", s => s.VoltageAtRemoval),
        ("v_min_missed_halfcycle_v", s => s.LeastInHalf),
        ("v_min_missed_full_cycle_v", s => s.LeastInWhole),
        ("survives_missed_halfcycle", s => s.Survives ? 1 : 0),
        ("t_ride_from_removal_s", s => s.RideFromRemoval),
        ("t_ride_from_last_peak_s", s => s.RideFromTop),
        ("t_below_uvlo_missed_halfcycle_s", s => s.BelowLockOut),
        ("i_diode_peak_recharge_a", s => s.RechargePeak),
    ];

    public string Name => "holdup";

    public ImmutableArray<string> Computed { get; } = [.. Figures.Select(f => f.Column)];

    public ImmutableArray<string> Solve(CaseRow row, CancellationToken cancel)
    {
        var circuit = RectifierKind.Circuit(row, LoadKind.Power);
        CaseRow.Check(HoldUpSolver.Solve(new HoldUpCase(circuit, row.Number("v_uvlo_v")), Budget.Until(cancel), out var s));
        return [.. Figures.Select(f => CaseRow.Say(f.Value(s)))];
    }
}
