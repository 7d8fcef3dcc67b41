using FsCheck;
using FsCheck.Xunit;
using Selector.Engine.Circuits;
using Selector.Engine.Circuits.StepDown;

namespace Selector.Reference.StepDown;

/// <summary>The shorted converter against small steps of its own and against balances.</summary>
public class ShortCircuitTests
{
    [Property(MaxTest = 10_000)]
    public void EnergyBalancesAndTheGovernorTellsTheTruth(DoNotSize<ulong> seed)
    {
        var c = Case(seed.Item);
        Assert.Equal(SolveStatus.Solved, ShortCircuit.Solve(c, Budget.Standard, out var s));
        Assert.True(Figures.AllFinite(s));
        var input = c.InputVoltage * s.InputMean;
        Assert.Equal(input, s.SwitchLoss + s.DiodeLoss + s.CoilLoss + s.LoopLoss, 1e-9 * input);
        Assert.True(s.CoilPeak >= s.CoilRms * (1 - 1e-12) && s.CoilRms >= s.CoilMean * (1 - 1e-12));
        var on = s.Duty / s.PulseRate;
        switch (s.Governor)
        {
            case ShortCircuitGovernor.CurrentLimit:
                Assert.Equal(c.CurrentLimit, s.CoilPeak, 1e-9 * c.CurrentLimit);
                Assert.InRange(on, c.LeastOnTime * (1 - 1e-9), c.MaxDuty / c.Frequency);
                break;
            case ShortCircuitGovernor.PulseSkipping:
                Assert.Equal(c.CurrentLimit, s.CoilPeak, 1e-9 * c.CurrentLimit);
                Assert.True(c.SkipsPulses && s.PulseRate <= c.Frequency * (1 + 1e-9));
                break;
            case ShortCircuitGovernor.LeastOnTime:
                Assert.True(s.CoilPeak >= c.CurrentLimit * (1 - 1e-9));
                Assert.Equal(c.LeastOnTime, on, 1e-9 * on);
                break;
            default:
                Assert.True(s.CoilPeak <= c.CurrentLimit * (1 + 1e-9));
                break;
        }
    }

    [Fact]
    public void SmallStepsComeToTheSameCurrent()
    {
        var seen = new HashSet<ShortCircuitGovernor>();
        for (var seed = 0UL; seed < 150; seed++)
        {
            var c = Case(seed * 31 + 7) with { SkipsPulses = false };
            ShortCircuit.Solve(c, Budget.Standard, out var s);
            var (peak, mean, reachable) = Simulate(c);
            if (!reachable)
            {
                continue;
            }

            seen.Add(s.Governor);
            Assert.True(Math.Abs(peak - s.CoilPeak) < 2e-3 * s.CoilPeak, $"{seed} {c}: {peak} against {s.CoilPeak}");
            // A current limit at a duty above one half may alternate between two pulse widths; its mean is then another.
            if (s.Governor != ShortCircuitGovernor.CurrentLimit || s.Duty < 0.45)
            {
                Assert.True(Math.Abs(mean - s.CoilMean) < 2e-3 * s.CoilPeak, $"{seed} {c}: {mean} against {s.CoilMean}");
            }
        }

        Assert.Equal(3, seen.Count);
    }

    [Theory]
    [InlineData(0)]
    [InlineData(-1)]
    [InlineData(double.NaN)]
    [InlineData(1e300)]
    [InlineData(-1e300)]
    [InlineData(1e-300)]
    [InlineData(double.PositiveInfinity)]
    public void AnyFieldMaySpoilWithoutHarm(double v)
    {
        var c = new ShortCircuitCase(150e3, 40, 1, 0, 0.5, 0, 100e-6, 0.1, 0.02, 3, 250e-9, false);
        ShortCircuitCase[] spoilt =
        [
            c with { Frequency = v }, c with { InputVoltage = v }, c with { SwitchDrop = v }, c with { SwitchResistance = v },
            c with { DiodeThreshold = v }, c with { DiodeSlope = v }, c with { Inductance = v }, c with { CoilResistance = v },
            c with { LoopResistance = v }, c with { CurrentLimit = v }, c with { LeastOnTime = v }, c with { MaxDuty = v },
            c with { DiodeThreshold = v, CoilResistance = v, LoopResistance = v, SkipsPulses = true },
        ];
        foreach (var each in spoilt)
        {
            var status = ShortCircuit.Solve(each, Budget.Standard, out var s);
            Assert.True(status is SolveStatus.Solved or SolveStatus.BadInput or SolveStatus.NoOperatingPoint, each.ToString());
            Assert.True(Figures.AllFinite(s));
        }
    }

    [Fact]
    public void WithoutResistanceNothingBoundsTheCurrent()
    {
        var c = new ShortCircuitCase(150e3, 40, 1, 0, 0.5, 0, 100e-6, 0, 0, 3, 250e-9, false);
        Assert.Equal(SolveStatus.NoOperatingPoint, ShortCircuit.Solve(c, Budget.Standard, out _));
    }

    private static ShortCircuitCase Case(ulong seed)
    {
        var m = new CaseMaker(seed);
        var f = m.Dice.Log(1e4, 1e6);
        var vin = m.Dice.Log(6, 60);
        var l = m.Dice.Log(2e-6, 5e-4);
        return new(
            f, vin, m.Dice.Even(0, 0.05) * vin, m.Dice.Log(1e-3, 0.5), m.Dice.Even(0.2, 1), m.Dice.Log(1e-3, 0.1), l, m.Dice.Log(1e-2, 0.5),
            m.Dice.Log(1e-2, 1), m.Dice.Log(0.3, 10), m.Dice.Log(5e-8, 5e-7), m.Dice.Chance(0.4), m.Dice.Even(0.8, 1));
    }

    // Explicit steps of the regulator's own rule: each period on until limit or greatest duty, but never below the least time.
    private static (double Peak, double Mean, bool Reachable) Simulate(ShortCircuitCase c)
    {
        var period = 1 / c.Frequency;
        var slowest = c.Inductance / (c.DiodeSlope + c.CoilResistance + c.LoopResistance);
        var periods = (int)(12 * slowest / period) + 40;
        const int steps = 2000;
        if (periods > 300)
        {
            return (0, 0, false);
        }

        var (i, peak, charge, h) = (0.0, 0.0, 0.0, period / steps);
        for (var n = 0; n < periods; n++)
        {
            (peak, charge) = (0, 0);
            var on = true;
            for (var k = 0; k < steps; k++)
            {
                var (t, before) = (k * h, i);
                if (!on)
                {
                    i = Math.Max(0, Off(before, h));
                    charge += h * (before + i) / 2;
                    continue;
                }

                // The pulse ends at the limit but not before the least time, and in any case at the greatest duty.
                i = On(before, h);
                var end = i > c.CurrentLimit ? t + h * Math.Max(0, (c.CurrentLimit - before) / (i - before)) : t + 2 * h;
                end = Math.Min(Math.Max(end, c.LeastOnTime), c.MaxDuty * period);
                if (end < t + h)
                {
                    on = false;
                    i = On(before, end - t);
                    peak = Math.Max(peak, i);
                    i = Off(i, t + h - end);
                }

                peak = Math.Max(peak, i);
                charge += h * (before + i) / 2;
            }
        }

        return (peak, charge / period, true);

        double On(double i0, double time) => Trapezoid(i0, c.InputVoltage - c.SwitchDrop, c.SwitchResistance, time);

        double Off(double i0, double time) => Trapezoid(i0, -c.DiodeThreshold, c.DiodeSlope, time);

        double Trapezoid(double i0, double source, double own, double time)
        {
            var x = (own + c.CoilResistance + c.LoopResistance) * time / (2 * c.Inductance);
            return (i0 * (1 - x) + source * time / c.Inductance) / (1 + x);
        }
    }
}
