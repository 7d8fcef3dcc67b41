using System.Collections.Immutable;
using Selector.Engine.Circuits;
using Selector.Engine.Circuits.Mains;
using Selector.Engine.Circuits.Reservoir.Combined;

namespace Selector.Cli.Compute;

/// <summary>Rectifier and step-down converter on one reservoir, reference family F4.</summary>
internal sealed class ReservoirKind : ICaseKind
{
    private static readonly ImmutableArray<(string Column, Func<CombinedSolution, double> Value)> Figures =
    [
        ("vbus_mean_v", s => s.BusMean),
        ("vbus_max_v", s => s.BusMax),
        ("vbus_min_v", s => s.BusMin),
        ("vbus_cap_internal_max_v", s => s.InsideMax),
        ("vbus_cap_internal_min_v", s => s.InsideMin),
        ("i_cap_rms_a", s => s.CapacitorRms),
        ("i_cap_lf_rms_a", s => s.CapacitorLow),
        ("i_cap_hf_rms_a", s => s.CapacitorHigh),
        ("i_cap_lf_fund_rms_a", s => s.CapacitorRipple),
        ("i_cap_sw_fund_rms_a", s => s.CapacitorSwitching),
        ("i_diode_peak_a", s => s.DiodePeak),
        ("i_diode_rms_a", s => s.DiodeRms),
        ("i_diode_avg_a", s => s.DiodeAverage),
        ("i_sec_rms_a", s => s.SecondaryRms),
        ("i_buck_in_mean_a", s => s.InputMean),
        ("i_switch_rms_a", s => s.SwitchRms),
        ("vout_mean_v", s => s.OutputMean),
        ("vout_ripple_pp_v", s => s.OutputRipple),
        ("i_l_peak_a", s => s.CoilPeak),
        ("i_l_rms_a", s => s.CoilRms),
        ("p_source_w", s => s.SourcePower),
        ("p_load_w", s => s.LoadPower),
    ];

    public string Name => "reservoir";

    public ImmutableArray<string> Computed { get; } = [.. Figures.Select(f => f.Column)];

    public ImmutableArray<string> Solve(CaseRow row, CancellationToken cancel)
    {
        var isFeedForward = row.Word("control", ("fixed", false), ("feedforward", true));
        var c = new CombinedCase(
            RectifierKind.Circuit(row, LoadKind.Current), row.Number("f_sw_hz"),
            isFeedForward ? 0.5 : row.Number("duty"), isFeedForward ? row.Number("vset_v") : 0,
            row.Number("v_sat_v", 0), row.Number("r_on_ohm", 0), row.Number("buck_vf0_v", 0), row.Number("buck_rd_ohm", 0),
            row.Number("l_henry"), row.Number("dcr_ohm", 0), row.Number("cout_farad"), row.Number("cout_esr_ohm", 0), row.Number("load_i_a"));
        CaseRow.Check(CombinedSolver.Solve(c, Budget.Until(cancel), out var s));
        return [.. Figures.Select(f => CaseRow.Say(f.Value(s)))];
    }
}
