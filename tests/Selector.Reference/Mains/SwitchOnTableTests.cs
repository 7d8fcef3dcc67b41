using Selector.Engine.Circuits;
using Selector.Engine.Circuits.Mains;
using Selector.Engine.Circuits.Mains.SwitchOn;
using Selector.Reference.Support;

namespace Selector.Reference.Mains;

/// <summary>Every computed column of the switch-on table (F2): computed with ngspice 39.</summary>
public class SwitchOnTableTests
{
    private const double Tolerance = 2e-3;
    private const double Degree = Math.PI / 180;

    public static TheoryData<string> Rows => [.. CsvRows.Of("f2_inrush.csv").Select(r => r.Id)];

    [Theory]
    [MemberData(nameof(Rows))]
    public void Every_column_agrees(string id)
    {
        var row = CsvRows.Of("f2_inrush.csv").Single(r => r.Id == id);
        var c = new SwitchOnCase(RectifierTable.Case(row), row.Number("phase_deg") * Degree, row.Number("load_ramp_v"));
        if (row["phase_kind"] == "worst")
        {
            Assert.Equal(SolveStatus.Solved, SwitchOnSolver.WorstPhase(c, Budget.Standard, out var phase));
            Assert.Equal(row.Number("phase_deg"), phase / Degree, 1.0);
            c = c with { Phase = phase };
        }

        Assert.Equal(SolveStatus.Solved, SwitchOnSolver.Solve(c, [], Budget.Standard, out var s));

        Near("i_first_peak_a", s.FirstPeak);
        Near("i2t_first_halfcycle_a2s", s.FirstHalfIntegral);
        Near("i2t_to_first_zero_a2s", s.FirstPulseIntegral);
        Near("vc_at_first_zero_v", s.VoltageAtFirstEnd);
        Near("cycles_to_95pct", s.CyclesTo95);
        Near("vdc_steady_v", s.Steady);
        Near("i_peak_any_a", s.GreatestPeak);
        Assert.Equal(row.Number("t_first_zero_s"), s.FirstEnd, 1e-6);

        void Near(string column, double value)
        {
            var deviation = CsvRows.Deviation(value, row.Number(column), row.LargestOfUnit(column));
            Assert.True(deviation <= Tolerance, $"{id} {column}: {value:R} against {row[column]}, off by {deviation:E2}");
        }
    }

    // Computed with ngspice 39 for this test, maximum step 1 µs: both halves of a centre tap with leakage, which hand over to each other
    // while the reservoir is empty; 30 degrees, 1.5 A drawn in proportion below 5 V.
    [Fact]
    public void Both_halves_of_a_centre_tap_may_conduct_at_once()
    {
        var circuit = new RectifierCase(RectifierArrangement.CentreTap, 50, 12, 0.4, 1.2e-3, 0.7, 0.05, 10e-3, 0.05, LoadKind.Current, 1.5);

        Assert.Equal(SolveStatus.Solved, SwitchOnSolver.Solve(new SwitchOnCase(circuit, 30 * Degree, 5), [], Budget.Standard, out var s));

        Assert.Equal(20.54841, s.GreatestPeak, 2e-4);
        Assert.Equal(4.335532e-3, s.FirstPeakAt, 1e-6);
        Assert.Equal(1.74801, s.FirstHalfIntegral, 2e-5);
    }

    // Practice case 9, computed by hand: 17 V over 5 + 0.5 ohm cold, over 0.25 + 0.5 ohm restarted hot, no leakage.
    [Theory]
    [InlineData(5.0, 3.09)]
    [InlineData(0.25, 22.7)]
    public void A_hot_limiter_limits_little(double limiter, double peak)
    {
        var circuit = new RectifierCase(RectifierArrangement.Bridge, 50, 17 / Math.Sqrt(2), 0.5 + limiter, 0, 0, 0, 10e-3, 0, LoadKind.Resistance, 100);

        Assert.Equal(SolveStatus.Solved, SwitchOnSolver.Solve(new SwitchOnCase(circuit, 90 * Degree, 0), [], Budget.Standard, out var s));

        Assert.Equal(peak, s.FirstPeak, 0.05);
    }

    // A fact of the circuit: what the first pulse takes from the emf is stored, lost or drawn; with no load and no ESR the reservoir's
    // charge is the integral of the current.
    [Fact]
    public void Without_leakage_the_worst_phase_is_the_peak()
    {
        var circuit = new RectifierCase(RectifierArrangement.Bridge, 50, 12, 0.4, 0, 0.7, 0.05, 4700e-6, 0.03, LoadKind.Resistance, 20);

        Assert.Equal(SolveStatus.Solved, SwitchOnSolver.WorstPhase(new SwitchOnCase(circuit, 0, 0), Budget.Standard, out var phase));

        Assert.Equal(90, phase / Degree, 1.0);
    }

    [Fact]
    public void A_cancelled_run_says_so_and_absurd_values_are_refused()
    {
        var circuit = new RectifierCase(RectifierArrangement.Bridge, 50, 12, 0.4, 1e-4, 0.7, 0.05, 4700e-6, 0.03, LoadKind.Resistance, 20);
        using var cancel = new CancellationTokenSource();
        cancel.Cancel();

        Assert.Equal(SolveStatus.Cancelled, SwitchOnSolver.Solve(new SwitchOnCase(circuit, 0, 0), 13, [], Budget.Until(cancel.Token), out _));
        foreach (var bad in (double[])[double.NaN, double.PositiveInfinity, -1, 1e300])
        {
            Assert.NotEqual(SolveStatus.Solved, SwitchOnSolver.Solve(new SwitchOnCase(circuit with { Capacitance = bad }, 0, 0), [], Budget.Standard, out _));
        }
    }
}
