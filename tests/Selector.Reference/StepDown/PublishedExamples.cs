using Selector.Engine.Circuits;
using Selector.Engine.Circuits.StepDown;

namespace Selector.Reference.StepDown;

/// <summary>
/// Worked examples of the literature and of this project, each with its origin. They neglect the output ripple, so the capacitor
/// is made large wherever it is not part of the example.
/// </summary>
public class PublishedExamples
{
    private static ConverterCase Ideal(
        double f, double vin, double duty, double l, double c, double load, OutputLoad kind = OutputLoad.Resistance) =>
        new(f, vin, duty, 0, 0, 0, 0, l, 0, c, 0, 0, kind, load);

    private static ConverterSolution Solved(ConverterCase c)
    {
        Assert.Equal(SolveStatus.Solved, ConverterSolver.Solve(c, Budget.Standard, out var s));
        return s;
    }

    private static void Near(double expected, double actual, double relative) =>
        Assert.Equal(expected, actual, relative * Math.Abs(expected));

    // Rashid, 4th edition, example 5.5 (seen in its companion code): k 41.67 %, L 145.83 uH, C 200 uF; Lc 5.83 mH at 500 ohm.
    [Fact]
    public void Rashid5Dot5()
    {
        var c = Ideal(25e3, 12, 0, 145.83e-6, 200e-6, 2, OutputLoad.Current);
        ConverterSolver.SolveForOutput(c, 5, Budget.Standard, out var duty, out var s);
        Near(0.4167, duty, 1e-4);
        // The output ripple, which the example neglects, adds a tenth of a per cent.
        Near(0.8, s.CoilRipple, 2e-3);
        Near(0.020, s.OutputRipple, 2e-3);
        var critical = Solved(Ideal(25e3, 12, duty, 5.83e-3, 200e-6, 500));
        Assert.Equal(0, critical.CoilValley, 1e-3 * critical.CoilPeak);
    }

    // Companion to a textbook, chapter 9, example 9.13: ton/toff 1.059, ton 25.72 us, Ipk 6 A, ripple 50 mV with 750 uF.
    [Fact]
    public void BoundaryDesignWithDrops()
    {
        var c = new ConverterCase(20e3, 12, 0, 1.1, 0, 1.25, 0, 25.3e-6, 0, 750e-6, 0, 0, OutputLoad.Current, 3);
        ConverterSolver.SolveForOutput(c, 5, Budget.Standard, out var duty, out var s);
        Near(25.72e-6, duty / 20e3, 2e-3);
        Near(6, s.CoilPeak, 2e-3);
        Assert.Equal(0, s.CoilValley, 0.01);
        Near(0.050, s.OutputRipple, 5e-3);
    }

    // Hart, example 6-1 (inputs from memory, results recomputed): 20 V, Imax 1.75 A, Imin 0.25 A, ripple 0.469 %.
    [Fact]
    public void Hart6Dot1()
    {
        var s = Solved(Ideal(20e3, 50, 0.4, 400e-6, 100e-6, 20));
        Near(20, s.OutputMean, 1e-3);
        Near(1.75, s.CoilPeak, 2e-3);
        Near(0.25, s.CoilValley, 1e-2);
        Near(0.00469, s.OutputRipple / s.OutputMean, 5e-3);
        Assert.Equal(ConductionMode.Continuous, s.Mode);
    }

    // Hart, discontinuous example (inputs from memory, results recomputed): M 0.5798, 13.92 V, second interval 0.290.
    [Fact]
    public void HartDiscontinuous()
    {
        var s = Solved(Ideal(10e3, 24, 0.4, 200e-6, 0.1, 20));
        Near(13.92, s.OutputMean, 1e-3);
        Assert.Equal(ConductionMode.Discontinuous, s.Mode);
        Near(0.290, s.DiodeMean / s.DiodePeak * 2, 2e-3);
    }

    // Mohan, example 7-1 (inputs from memory, results recomputed): D 0.397, 150.8 mA, 2.005 mV.
    [Fact]
    public void Mohan7Dot1()
    {
        var c = Ideal(20e3, 12.6, 0, 1e-3, 470e-6, 0.2, OutputLoad.Current);
        ConverterSolver.SolveForOutput(c, 5, Budget.Standard, out var duty, out var s);
        Near(0.397, duty, 1e-3);
        Near(0.1508, s.CoilRipple, 1e-3);
        Near(2.005e-3, s.OutputRipple, 1e-3);
    }

    // Conversion ratio of the lossless converter in discontinuous conduction by M = 2/(1 + sqrt(1 + 4K/D^2)): recomputed table.
    [Theory]
    [InlineData(0.01, 0.1, 0.618)]
    [InlineData(0.01, 0.2, 0.828)]
    [InlineData(0.01, 0.3, 0.908)]
    [InlineData(0.01, 0.5, 0.963)]
    [InlineData(0.1, 0.1, 0.270)]
    [InlineData(0.1, 0.2, 0.463)]
    [InlineData(0.1, 0.3, 0.600)]
    [InlineData(0.1, 0.5, 0.766)]
    [InlineData(0.1, 0.9, 0.900)]
    public void ConversionRatio(double k, double duty, double ratio)
    {
        // K = 2 L f / R with f = 100 kHz and R = 10 ohm.
        var s = Solved(Ideal(1e5, 10, duty, k * 10 / 2e5, 0.1, 10));
        Assert.Equal(ratio, s.OutputMean / 10, 1e-3);
    }

    // The project's own check A, ideal, 24 to 5 V at 2 A (recomputed): every figure of the row.
    [Fact]
    public void OwnCheckA()
    {
        var c = Ideal(1e5, 24, 0, 47e-6, 0.022, 2, OutputLoad.Current);
        ConverterSolver.SolveForOutput(c, 5, Budget.Standard, out var duty, out var s);
        Near(0.2083, duty, 2e-4);
        Near(0.842, s.CoilRipple, 1e-3);
        Near(2.421, s.CoilPeak, 1e-3);
        Near(2.0147, s.CoilRms, 1e-4);
        Near(0.9196, s.SwitchRms, 1e-4);
        Near(1.5833, s.DiodeMean, 1e-4);
        Near(1.7926, s.DiodeRms, 1e-4);
        Near(0.8198, s.InputCapacitorRms, 1e-3);
        Near(0.2431, s.OutputCapacitorRms, 1e-3);
        OutputRipple(c, 4.79e-3, 42.1e-3);
    }

    // Own check B: as A with switch 0.3 V, diode 0.5 V, winding 0.05 ohm (recomputed).
    [Fact]
    public void OwnCheckB()
    {
        var c = Ideal(1e5, 24, 0, 47e-6, 0.022, 2, OutputLoad.Current)
            with { SwitchDrop = 0.3, DiodeThreshold = 0.5, CoilResistance = 0.05 };
        ConverterSolver.SolveForOutput(c, 5, Budget.Standard, out var duty, out var s);
        Near(0.2314, duty, 5e-4);
        // The row takes the mean drop of the winding for the whole period, which moves the ripple by the current's own swing.
        Near(0.9158, s.CoilRipple, 5e-3);
        Near(2.458, s.CoilPeak, 1e-3);
        Near(1.537, s.DiodeMean, 1e-3);
        Near(1.769, s.DiodeRms, 1e-3);
        Near(0.853, s.InputCapacitorRms, 1e-3);
        OutputRipple(c, 5.20e-3, 45.8e-3);
    }

    // Own check C: 18 to 5 V at 1 A, 52 kHz, with drops (recomputed).
    [Fact]
    public void OwnCheckC()
    {
        var c = new ConverterCase(52e3, 18, 0, 1, 0, 0.5, 0, 150e-6, 0.1, 0.033, 0, 0, OutputLoad.Current, 1);
        ConverterSolver.SolveForOutput(c, 5, Budget.Standard, out var duty, out var s);
        Near(0.32, duty, 5e-4);
        Near(0.488, s.CoilRipple, 5e-3);
        Near(1.244, s.CoilPeak, 1e-3);
        Near(0.680, s.DiodeMean, 1e-3);
        Near(0.473, s.InputCapacitorRms, 1e-3);
        ConverterSolver.SolveForOutput(c with { Capacitance = 330e-6 }, 5, Budget.Standard, out _, out var bare);
        Near(3.56e-3, bare.OutputRipple, 1e-2);
        ConverterSolver.SolveForOutput(c with { Esr = 0.1 }, 5, Budget.Standard, out _, out var esr);
        Near(48.8e-3, esr.OutputRipple, 1e-2);
    }

    // The two contributions alone, and that both together stay below their sum.
    private static void OutputRipple(ConverterCase c, double capacitive, double resistive)
    {
        ConverterSolver.SolveForOutput(c with { Capacitance = 220e-6 }, 5, Budget.Standard, out _, out var bare);
        Near(capacitive, bare.OutputRipple, 1e-2);
        ConverterSolver.SolveForOutput(c with { Esr = 0.05 }, 5, Budget.Standard, out _, out var esr);
        Near(resistive, esr.OutputRipple, 1e-2);
        ConverterSolver.SolveForOutput(c with { Capacitance = 220e-6, Esr = 0.05 }, 5, Budget.Standard, out _, out var both);
        Assert.InRange(both.OutputRipple, resistive * 0.99, capacitive + resistive);
    }
}
