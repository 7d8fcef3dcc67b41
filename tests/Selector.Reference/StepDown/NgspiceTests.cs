using Selector.Engine.Circuits;
using Selector.Engine.Circuits.StepDown;

namespace Selector.Reference.StepDown;

/// <summary>Invented converters, simulated afresh: continuous, discontinuous, both loads, with and without ESL.</summary>
public class NgspiceTests
{
    public static TheoryData<string, ConverterCase> Cases => new()
    {
        {
            "continuous, current",
            new(120e3, 28, 0.45, 0.4, 0.03, 0.5, 0.02, 60e-6, 0.08, 6e-6, 0.05, 0, OutputLoad.Current, 1.7)
        },
        {
            "discontinuous, current",
            new(80e3, 20, 0.3, 0.8, 0.05, 0.6, 0.05, 18e-6, 0.06, 12e-6, 0.08, 0, OutputLoad.Current, 0.5)
        },
        {
            "discontinuous, resistance",
            new(150e3, 36, 0.25, 0, 0.12, 0.45, 0.04, 12e-6, 0.1, 5e-6, 0.03, 0, OutputLoad.Resistance, 22)
        },
        {
            "continuous, current, ESL",
            new(200e3, 15, 0.4, 0.2, 0.06, 0.4, 0.03, 22e-6, 0.05, 8e-6, 0.04, 3e-8, OutputLoad.Current, 1.2)
        },
        {
            "discontinuous, resistance, ESL",
            new(100e3, 24, 0.35, 0.5, 0.05, 0.5, 0.05, 10e-6, 0.07, 9e-6, 0.05, 4e-8, OutputLoad.Resistance, 15)
        },
    };

    [NgspiceTheory]
    [MemberData(nameof(Cases))]
    public void TheSimulationAgrees(string what, ConverterCase c)
    {
        Assert.Equal(SolveStatus.Solved, ConverterSolver.Solve(c, Budget.Standard, out var s));
        // Started in the small-step integrator's steady state, which a wrong one would leave within the run.
        var start = new BruteForceConverter(c, 6000);
        Assert.True(start.Settle(s.OutputMean, s.CoilMean));
        var m = NgspiceConverter.Measure(c, start, 40);
        Near("vmean", s.OutputMean);
        Near("vripple", s.OutputRipple);
        Near("ilmean", s.CoilMean);
        Near("ilrms", s.CoilRms);
        Near("ilpeak", s.CoilPeak);
        Near("iswmean", s.SwitchMean);
        Near("iswrms", s.SwitchRms);

        void Near(string name, double value) =>
            Assert.True(Math.Abs(value - m[name]) < 1e-3 * m[name], $"{what}, {name}: {value:R} against {m[name]:R}");
    }
}
