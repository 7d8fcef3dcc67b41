using Selector.Engine.Circuits;
using Selector.Engine.Circuits.Mains;
using Selector.Reference.Support;

namespace Selector.Reference.Mains;

public class PublishedRectifierTests
{
    private const double Omega = 2 * Math.PI * 50;

    /// <summary>Independent computation of Schade's circuit; the table is printed to four decimals. Every seventh of 570 points.</summary>
    [Fact]
    public void The_computed_points_of_the_capacitor_input_circuit_are_met()
    {
        var rows = CsvRows.Of("rectifier_capacitor_input_computed.csv").Where((_, i) => i % 7 == 0).ToList();
        Assert.True(rows.Count > 75);
        foreach (var row in rows)
        {
            var fullWave = row.Number("n_pulses") == 2;
            var s = Schade(fullWave, row.Number("wCRL"), row.Number("Rs/RL_pct") / 100);
            var peak = Math.Sqrt(2);
            Assert.Equal(row.Number("Vdc/Vpk"), s.BusMean / peak, 2e-4);
            Assert.Equal(row.Number("ripple_rms_pct_of_Vdc"), 100 * s.BusRippleRms / s.BusMean, 2e-3 * Math.Max(1, row.Number("ripple_rms_pct_of_Vdc")));
            Assert.Equal(row.Number("Ipk/Iav_per_diode"), s.DiodePeak / s.DiodeAverage, 2e-3 * row.Number("Ipk/Iav_per_diode"));
            Assert.Equal(row.Number("Irms/Iav_per_diode"), s.DiodeRms / s.DiodeAverage, 2e-3 * row.Number("Irms/Iav_per_diode"));
        }
    }

    /// <summary>Textbook result (from memory), derived anew: tan φ - φ = π Rs / (n RL), Vdc = Vpk cos φ for an infinite capacitor.</summary>
    [Theory]
    [InlineData(2, 0.001, 0.9861)]
    [InlineData(2, 0.01, 0.9376)]
    [InlineData(2, 0.05, 0.8322)]
    [InlineData(2, 0.10, 0.7518)]
    [InlineData(2, 0.50, 0.4728)]
    [InlineData(1, 0.01, 0.9035)]
    [InlineData(1, 0.10, 0.6455)]
    public void A_very_large_capacitor_gives_the_closed_form(int pulses, double share, double expected) =>
        Assert.Equal(expected, Schade(pulses == 2, 3000, share).BusMean / Math.Sqrt(2), 3e-4);

    /// <summary>Malvino, Electronic Principles, 7th ed., Example 4-7 (second-hand, from its companion code): prints 17 V and 0.28 V.</summary>
    [Fact]
    public void Malvino_4_7_centre_tap()
    {
        var half = 120.0 / 5 / 2;
        var c = new RectifierCase(RectifierArrangement.CentreTap, 60, half, 1e-3, 0, 0, 0, 100e-6, 0, LoadKind.Resistance, 5e3);
        Assert.Equal(SolveStatus.Solved, RectifierSolver.Solve(c, Budget.Standard, out var s));

        Assert.Equal(17, s.BusMean, 0.3);
        // The book's V / (2 f R C) takes the whole half period for discharge, so it is an upper bound by some per cent.
        Assert.InRange(s.BusRipplePeakToPeak, 0.25, 0.283);
    }

    /// <summary>Sedra/Smith, peak rectifier: 100 V, 10 kohm, 60 Hz, ripple 2 V gives 83.3 µF (inputs from memory, arithmetic by hand).</summary>
    [Fact]
    public void Sedra_smith_peak_rectifier()
    {
        var c = new RectifierCase(RectifierArrangement.HalfWave, 60, 100 / Math.Sqrt(2), 0.05, 0, 0, 0, 83.3e-6, 0, LoadKind.Resistance, 10e3);
        Assert.Equal(SolveStatus.Solved, RectifierSolver.Solve(c, Budget.Standard, out var s));

        // V / (f R C) neglects the conduction time of 3.2 % of a cycle and the sag's curvature: within 5 %.
        Assert.Equal(2, s.BusRipplePeakToPeak, 0.1);
        // Its closed form for an ideal source, 638 mA; the half hundredth of an ohm here takes off little.
        Assert.Equal(0.638, s.DiodePeak, 0.05);
    }

    /// <summary>A bridge drops two diodes, a centre tap one; a centre tap's diode blocks twice the peak (facts of the trade, no source).</summary>
    [Fact]
    public void A_bridge_drops_two_diodes_and_a_centre_tap_diode_blocks_twice_the_peak()
    {
        var bridge = new RectifierCase(RectifierArrangement.Bridge, 50, 12, 0.1, 0, 0.7, 0.01, 10e-3, 0.02, LoadKind.Current, 1e-3);
        RectifierSolver.Solve(bridge, Budget.Standard, out var two);
        RectifierSolver.Solve(bridge with { Arrangement = RectifierArrangement.CentreTap }, Budget.Standard, out var one);

        Assert.Equal(0.7, one.BusMean - two.BusMean, 2e-3);
        Assert.Equal(2 * 12 * Math.Sqrt(2) - 0.7, one.DiodeReversePeak, 0.02);
        Assert.Equal(12 * Math.Sqrt(2) - 0.7, two.DiodeReversePeak, 0.02);
    }

    private static RectifierSolution Schade(bool fullWave, double omegaCr, double share)
    {
        const double Load = 100;
        var c = new RectifierCase(
            fullWave ? RectifierArrangement.Bridge : RectifierArrangement.HalfWave, 50, 1, share * Load, 0, 0, 0,
            omegaCr / (Omega * Load), 0, LoadKind.Resistance, Load);
        Assert.Equal(SolveStatus.Solved, RectifierSolver.Solve(c, Budget.Standard, out var s));
        return s;
    }
}
