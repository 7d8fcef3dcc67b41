using System.Collections.Immutable;
using Selector.Engine.Circuits;
using Selector.Engine.Circuits.StepDown;

namespace Selector.Cli.Compute;

/// <summary>Step-down converter at a given duty, reference family F3.</summary>
internal sealed class ConverterKind : ICaseKind
{
    private static readonly ImmutableArray<(string Column, Func<ConverterSolution, double> Value)> Figures =
    [
        ("idle_fraction", s => s.IdleFraction),
        ("vout_mean_v", s => s.OutputMean),
        ("vout_ripple_pp_v", s => s.OutputRipple),
        ("i_out_mean_a", s => s.LoadCurrentMean),
        ("i_l_mean_a", s => s.CoilMean),
        ("i_l_peak_a", s => s.CoilPeak),
        ("i_l_valley_a", s => s.CoilValley),
        ("i_l_rms_a", s => s.CoilRms),
        ("i_l_ripple_pp_a", s => s.CoilRipple),
        ("i_diode_avg_a", s => s.DiodeMean),
        ("i_diode_rms_a", s => s.DiodeRms),
        ("i_diode_peak_a", s => s.DiodePeak),
        ("v_diode_reverse_max_v", s => s.DiodeReverseMaximum),
        ("i_switch_avg_a", s => s.SwitchMean),
        ("i_switch_rms_a", s => s.SwitchRms),
        ("i_switch_peak_a", s => s.SwitchPeak),
        ("v_switch_off_max_v", s => s.SwitchOffMaximum),
        ("i_cout_rms_a", s => s.OutputCapacitorRms),
        ("i_in_ac_rms_a", s => s.InputCapacitorRms),
        ("p_switch_w", s => s.SwitchLoss),
        ("p_diode_w", s => s.DiodeLoss),
        ("p_dcr_w", s => s.CoilLoss),
        ("p_esr_w", s => s.EsrLoss),
        ("p_load_w", s => s.LoadPower),
        ("p_in_w", s => s.InputPower),
        ("efficiency", s => s.Efficiency),
    ];

    public string Name => "converter";

    public ImmutableArray<string> Computed { get; } = ["mode_observed", .. Figures.Select(f => f.Column)];

    public ImmutableArray<string> Solve(CaseRow row, CancellationToken cancel)
    {
        var load = row.Word("load_type", ("ci", OutputLoad.Current), ("cr", OutputLoad.Resistance));
        var circuit = new ConverterCase(
            row.Number("f_sw_hz"), row.Number("v_in_v"), row.Number("duty"), row.Number("v_sat_v", 0), row.Number("r_on_ohm", 0),
            row.Number("vf0_v", 0), row.Number("rd_ohm", 0), row.Number("l_henry"), row.Number("dcr_ohm", 0), row.Number("c_farad"),
            row.Number("esr_ohm", 0), row.Number("esl_henry", 0), load,
            row.Number(load == OutputLoad.Current ? "load_i_a" : "load_r_ohm"));
        CaseRow.Check(ConverterSolver.Solve(circuit, Budget.Until(cancel), out var s));
        return [s.Mode == ConductionMode.Discontinuous ? "dcm" : "ccm", .. Figures.Select(f => CaseRow.Say(f.Value(s)))];
    }
}
