using Selector.Engine.Circuits.Mains;
using Selector.Reference.Support;

namespace Selector.Reference.Mains;

/// <summary>Names of the rectifier table's columns beside the fields that they stand for.</summary>
internal static class RectifierTable
{
    /// <summary>The reference's diodes have 1 nS in parallel.</summary>
    private const double ReferenceConductance = 1e-9;

    public static RectifierCase Case(CsvRow row)
    {
        var (kind, column) = row["load_type"] switch
        {
            "ci" => (LoadKind.Current, "load_i_a"),
            "cr" => (LoadKind.Resistance, "load_r_ohm"),
            _ => (LoadKind.Power, "load_p_w"),
        };
        var arrangement = row["arrangement"] switch
        {
            "bridge" => RectifierArrangement.Bridge,
            "centretap" => RectifierArrangement.CentreTap,
            _ => RectifierArrangement.HalfWave,
        };
        return new RectifierCase(
            arrangement, row.Number("f_line_hz"), row.Number("v_sec_rms_v"), row.Number("rw_ohm"), row.Number("lk_henry"),
            row.Number("vf0_v"), row.Number("rd_ohm"), row.Number("c_farad"), row.Number("esr_ohm"), kind, row.Number(column), ReferenceConductance);
    }

    public static IEnumerable<(string Column, double Value)> Columns(RectifierSolution s) =>
    [
        ("vdc_mean_v", s.BusMean),
        ("vbus_max_v", s.BusMax),
        ("vbus_min_v", s.BusMin),
        ("ripple_pp_v", s.BusRipplePeakToPeak),
        ("ripple_rms_v", s.BusRippleRms),
        ("i_load_mean_a", s.LoadMean),
        ("i_diode_peak_a", s.DiodePeak),
        ("i_diode_avg_a", s.DiodeAverage),
        ("i_diode_rms_a", s.DiodeRms),
        ("piv_diode_v", s.DiodeReversePeak),
        ("i_sec_rms_a", s.SecondaryRms),
        ("i_cap_rms_a", s.CapacitorRms),
        ("i_cap_fund_rms_a", s.CapacitorFundamentalRms),
        ("conduction_frac_half_cycle", s.ConductionFraction),
        ("p_source_w", s.SourcePower),
        ("va_source_va", s.SourceApparent),
        ("pf_source", s.PowerFactor),
        ("p_load_w", s.LoadPower),
        ("p_rw_total_w", s.WindingLoss),
        ("p_diode_each_w", s.DiodeLoss),
        ("p_esr_w", s.EsrLoss),
    ];
}
