using Selector.Engine.Circuits;
using Selector.Engine.Circuits.Mains;
using Selector.Engine.Circuits.Mains.HoldUp;
using Selector.Reference.Support;

namespace Selector.Reference.Mains;

/// <summary>Every computed column of the hold-up table (F9): computed with ngspice 39.</summary>
public class HoldUpTableTests
{
    private const double Tolerance = 2e-3;
    private const double Microsecond = 1e-6;

    public static TheoryData<string> Rows => [.. CsvRows.Of("f9_holdup.csv").Select(r => r.Id)];

    [Theory]
    [MemberData(nameof(Rows))]
    public void Every_column_agrees(string id)
    {
        var row = CsvRows.Of("f9_holdup.csv").Single(r => r.Id == id);
        var circuit = new RectifierCase(
            row["arrangement"] switch { "bridge" => RectifierArrangement.Bridge, "centretap" => RectifierArrangement.CentreTap, _ => RectifierArrangement.HalfWave },
            row.Number("f_line_hz"), row.Number("v_sec_rms_v"), row.Number("rw_ohm"), row.Number("lk_henry"), row.Number("vf0_v"), row.Number("rd_ohm"),
            row.Number("c_farad"), row.Number("esr_ohm"), LoadKind.Power, row.Number("load_p_w"));

        Assert.Equal(SolveStatus.Solved, HoldUpSolver.Solve(new HoldUpCase(circuit, row.Number("v_uvlo_v")), Budget.Standard, out var s));

        foreach (var (column, value) in ((string, double)[])[
            ("vdc_mean_v", s.BusMean), ("vbus_max_v", s.BusMax), ("vbus_min_v", s.BusMin), ("vc_at_removal_v", s.VoltageAtRemoval),
            ("v_min_missed_halfcycle_v", s.LeastInHalf), ("v_min_missed_full_cycle_v", s.LeastInWhole), ("i_diode_peak_recharge_a", s.RechargePeak)])
        {
            var deviation = CsvRows.Deviation(value, row.Number(column), row.LargestOfUnit(column));
            Assert.True(deviation <= Tolerance, $"{id} {column}: {value:R} against {row[column]}, off by {deviation:E2}");
        }

        Assert.Equal(row["survives_missed_halfcycle"] == "1", s.Survives);
        Assert.Equal(row.Number("t_ride_from_removal_s"), s.RideFromRemoval, Microsecond);
        Assert.Equal(row.Number("t_ride_from_last_peak_s"), s.RideFromTop, Microsecond);
        Assert.Equal(row.Number("t_below_uvlo_missed_halfcycle_s"), s.BelowLockOut, Microsecond);
        Assert.Equal(SolveStatus.Solved, HoldUpSolver.LeastInHalf(circuit, Budget.Standard, out var least));
        Assert.Equal(s.LeastInHalf, least, 1e-6 * least);
    }

    // By the law, C (V1² - V2²) / 2 = P t, nothing lost: 10 mF from 20 V to 10 V at 15 W rides 100 ms.
    [Fact]
    public void A_reservoir_without_resistance_rides_by_its_energy()
    {
        var circuit = new RectifierCase(RectifierArrangement.Bridge, 50, 20 / Math.Sqrt(2), 1e-4, 0, 0, 1e-4, 10e-3, 0, LoadKind.Power, 15);

        Assert.Equal(SolveStatus.Solved, HoldUpSolver.Solve(new HoldUpCase(circuit, 10), Budget.Standard, out var s));

        var fromRemoval = 10e-3 * (s.VoltageAtRemoval * s.VoltageAtRemoval - 100) / 2 / 15;
        Assert.Equal(fromRemoval, s.RideFromRemoval, 1e-6);
    }
}
