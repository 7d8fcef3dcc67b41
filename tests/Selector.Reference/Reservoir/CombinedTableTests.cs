using Selector.Engine.Circuits;
using Selector.Engine.Circuits.Mains;
using Selector.Engine.Circuits.Reservoir.Combined;
using Selector.Reference.Support;

namespace Selector.Reference.Reservoir;

/// <summary>Every computed column of rectifier and converter on one reservoir (F4): computed with ngspice 39.</summary>
public class CombinedTableTests
{
    private const double Tolerance = 5e-3;

    /// <summary>The reference's comparator acts on a grid of 20 ns: about 0.1 % of duty.</summary>
    private const double FedForward = 2e-2;

    public static TheoryData<string> Rows => [.. CsvRows.Of("f4_buck_on_reservoir.csv").Select(r => r.Id)];

    [Theory]
    [MemberData(nameof(Rows))]
    public void Every_column_agrees(string id)
    {
        var row = CsvRows.Of("f4_buck_on_reservoir.csv").Single(r => r.Id == id);
        var isFedForward = row["control"] == "feedforward";

        Assert.Equal(SolveStatus.Solved, CombinedSolver.Solve(Case(row), Budget.Standard, out var s));

        foreach (var (column, value) in Columns(s))
        {
            var deviation = CsvRows.Deviation(value, row.Number(column), row.LargestOfUnit(column));
            var most = isFedForward && column is "vout_ripple_pp_v" or "i_l_peak_a" ? FedForward : Tolerance;
            Assert.True(deviation <= most, $"{id} {column}: {value:R} against {row[column]}, off by {deviation:E2}");
        }
    }

    // Charge balance: what the rectifier brings in a line period the converter takes; energy: the source gives at least what the load gets.
    [Fact]
    public void Charge_and_energy_balance()
    {
        foreach (var row in CsvRows.Of("f4_buck_on_reservoir.csv"))
        {
            Assert.Equal(SolveStatus.Solved, CombinedSolver.Solve(Case(row), Budget.Standard, out var s));
            var legs = row["arrangement"] == "halfwave" ? 1 : 2;

            Assert.Equal(s.InputMean, legs * s.DiodeAverage, 1e-4 * s.InputMean);
            Assert.InRange(s.LoadPower / s.SourcePower, 0.4, 1);
            Assert.Equal(s.CapacitorRms * s.CapacitorRms, s.CapacitorLow * s.CapacitorLow + s.CapacitorHigh * s.CapacitorHigh, 1e-9);
        }
    }

    [Fact]
    public void Absurd_values_are_refused()
    {
        var c = Case(CsvRows.Of("f4_buck_on_reservoir.csv")[0]);
        foreach (var bad in (double[])[double.NaN, double.PositiveInfinity, 0, -1, 1e300])
        {
            Assert.NotEqual(SolveStatus.Solved, CombinedSolver.Solve(c with { Inductance = bad }, Budget.Standard, out _));
            Assert.NotEqual(SolveStatus.Solved, CombinedSolver.Solve(c with { Load = bad }, Budget.Standard, out _));
        }
    }

    private static CombinedCase Case(CsvRow row)
    {
        var rectifier = new RectifierCase(
            row["arrangement"] switch { "bridge" => RectifierArrangement.Bridge, "centretap" => RectifierArrangement.CentreTap, _ => RectifierArrangement.HalfWave },
            row.Number("f_line_hz"), row.Number("v_sec_rms_v"), row.Number("rw_ohm"), row.Number("lk_henry"), row.Number("vf0_v"), row.Number("rd_ohm"),
            row.Number("c_farad"), row.Number("esr_ohm"), LoadKind.Current, row.Number("load_i_a"));
        return new CombinedCase(
            rectifier, row.Number("f_sw_hz"), row["duty"].Length > 0 ? row.Number("duty") : 0.5, row.Number("vset_v"), row.Number("v_sat_v"), row.Number("r_on_ohm"),
            row.Number("buck_vf0_v"), row.Number("buck_rd_ohm"), row.Number("l_henry"), row.Number("dcr_ohm"), row.Number("cout_farad"), row.Number("cout_esr_ohm"), row.Number("load_i_a"));
    }

    private static IEnumerable<(string Column, double Value)> Columns(CombinedSolution s) =>
    [
        ("vbus_mean_v", s.BusMean), ("vbus_max_v", s.BusMax), ("vbus_min_v", s.BusMin), ("vbus_cap_internal_max_v", s.InsideMax), ("vbus_cap_internal_min_v", s.InsideMin),
        ("i_cap_rms_a", s.CapacitorRms), ("i_cap_lf_rms_a", s.CapacitorLow), ("i_cap_hf_rms_a", s.CapacitorHigh), ("i_cap_lf_fund_rms_a", s.CapacitorRipple),
        ("i_cap_sw_fund_rms_a", s.CapacitorSwitching), ("i_diode_peak_a", s.DiodePeak), ("i_diode_rms_a", s.DiodeRms), ("i_diode_avg_a", s.DiodeAverage),
        ("i_sec_rms_a", s.SecondaryRms), ("i_buck_in_mean_a", s.InputMean), ("i_switch_rms_a", s.SwitchRms), ("vout_mean_v", s.OutputMean),
        ("vout_ripple_pp_v", s.OutputRipple), ("i_l_peak_a", s.CoilPeak), ("i_l_rms_a", s.CoilRms), ("p_source_w", s.SourcePower), ("p_load_w", s.LoadPower),
    ];
}
