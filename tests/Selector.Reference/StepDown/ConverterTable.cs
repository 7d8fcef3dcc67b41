using Selector.Engine.Circuits.StepDown;

namespace Selector.Reference.StepDown;

/// <summary>Names of the converter table's columns beside the fields that they stand for.</summary>
internal static class ConverterTable
{
    public static ConverterCase Case(CsvRow row)
    {
        var current = row["load_type"] == "ci";
        return new(
            row.Number("f_sw_hz"), row.Number("v_in_v"), row.Number("duty"), row.Number("v_sat_v"), row.Number("r_on_ohm"),
            row.Number("vf0_v"), row.Number("rd_ohm"), row.Number("l_henry"), row.Number("dcr_ohm"), row.Number("c_farad"),
            row.Number("esr_ohm"), row.Number("esl_henry"), current ? OutputLoad.Current : OutputLoad.Resistance,
            row.Number(current ? "load_i_a" : "load_r_ohm"));
    }

    public static IEnumerable<(string Column, double Value)> Columns(ConverterSolution s) =>
    [
        ("idle_fraction", s.IdleFraction),
        ("vout_mean_v", s.OutputMean),
        ("vout_ripple_pp_v", s.OutputRipple),
        ("i_out_mean_a", s.LoadCurrentMean),
        ("i_l_mean_a", s.CoilMean),
        ("i_l_peak_a", s.CoilPeak),
        ("i_l_valley_a", s.CoilValley),
        ("i_l_rms_a", s.CoilRms),
        ("i_l_ripple_pp_a", s.CoilRipple),
        ("i_diode_avg_a", s.DiodeMean),
        ("i_diode_rms_a", s.DiodeRms),
        ("i_diode_peak_a", s.DiodePeak),
        ("v_diode_reverse_max_v", s.DiodeReverseMaximum),
        ("i_switch_avg_a", s.SwitchMean),
        ("i_switch_rms_a", s.SwitchRms),
        ("i_switch_peak_a", s.SwitchPeak),
        ("v_switch_off_max_v", s.SwitchOffMaximum),
        ("i_cout_rms_a", s.OutputCapacitorRms),
        ("i_in_ac_rms_a", s.InputCapacitorRms),
        ("p_switch_w", s.SwitchLoss),
        ("p_diode_w", s.DiodeLoss),
        ("p_dcr_w", s.CoilLoss),
        ("p_esr_w", s.EsrLoss),
        ("p_load_w", s.LoadPower),
        ("p_in_w", s.InputPower),
        ("efficiency", s.Efficiency),
    ];
}
