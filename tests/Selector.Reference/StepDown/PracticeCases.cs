using Selector.Engine.Circuits;
using Selector.Engine.Circuits.StepDown;

namespace Selector.Reference.StepDown;

/// <summary>Practice cases of the converter: computed by hand from the law that each names.</summary>
public class PracticeCases
{
    // Case 5, Iin,rms = I sqrt(D(1 - D)): the worst input lies inside the range. A coil so large that its current is flat.
    [Theory]
    [InlineData(8, 0.968)]
    [InlineData(10, 1.000)]
    [InlineData(20, 0.866)]
    public void InputCapacitorCurrentPeaksAtHalfDuty(double vin, double rms)
    {
        var c = new ConverterCase(1e5, vin, 0, 0, 0, 0, 0, 0.1, 0, 1e-3, 0, 0, OutputLoad.Current, 2);
        ConverterSolver.SolveForOutput(c, 5, Budget.Standard, out _, out var s);
        Assert.Equal(rms, s.InputCapacitorRms, 5e-4);
    }

    // Case 7, dI = (Vin - Vout) D/(L f): the worst output lies inside the range.
    [Theory]
    [InlineData(1.2, 0.114)]
    [InlineData(12, 0.600)]
    [InlineData(15, 0.5625)]
    public void CoilRipplePeaksAtHalfDuty(double vout, double ripple)
    {
        var c = new ConverterCase(1e5, 24, 0, 0, 0, 0, 0, 100e-6, 0, 1e-3, 0, 0, OutputLoad.Current, 2);
        ConverterSolver.SolveForOutput(c, vout, Budget.Standard, out _, out var s);
        Assert.Equal(ripple, s.CoilRipple, 5e-4);
    }

    // Case 16, volt-second balance D (Vin - Vsw) - (1 - D) Vf = I R: the least on-time governs whatever the limit says.
    [Theory]
    [InlineData(1)]
    [InlineData(3)]
    [InlineData(7)]
    public void ShortedOutputRunsAwayToTheVoltSecondBalance(double limit)
    {
        var c = new ShortCircuitCase(150e3, 40, 1, 0, 0.5, 0, 100e-6, 0.1, 0.02, limit, 250e-9, SkipsPulses: false);
        Assert.Equal(SolveStatus.Solved, ShortCircuit.Solve(c, Budget.Standard, out var s));
        Assert.Equal(ShortCircuitGovernor.LeastOnTime, s.Governor);
        Assert.Equal(8.2, s.CoilMean, 0.05);
        Assert.Equal((0.0375 * 39 - 0.9625 * 0.5) / 0.12, s.CoilMean, 1e-9);
        Assert.Equal(0.0375, s.Duty, 1e-12);

        ShortCircuit.Solve(c with { SkipsPulses = true }, Budget.Standard, out var skips);
        Assert.Equal(ShortCircuitGovernor.PulseSkipping, skips.Governor);
        Assert.Equal(limit, skips.CoilPeak, 1e-9);
        Assert.True(skips.PulseRate < 150e3);
    }

    // Case 19, V I t f/2.
    [Fact]
    public void TransitionsCostPower()
    {
        Assert.Equal(0.40, SwitchingLoss.Transition(40, 2, 100e-9, 100e3), 1e-12);
        Assert.Equal(0.40, SwitchingLoss.Transition(40, 2, 60e-9, 2, 40e-9, 100e3), 1e-12);
        Assert.Equal(0.2, SwitchingLoss.Quiescent(40, 5e-3), 1e-12);
        Assert.Equal(0.08, SwitchingLoss.Recovery(40, 20e-9, 100e3), 1e-12);
    }
}
