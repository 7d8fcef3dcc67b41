using FsCheck;
using FsCheck.Xunit;
using Selector.Engine.Circuits;
using Selector.Engine.Circuits.StepDown;

namespace Selector.Reference.StepDown;

/// <summary>What holds for every converter, whatever its values.</summary>
public class ConverterProperties
{
    [Property(MaxTest = 10_000)]
    public void EnergyAndChargeBalance(DoNotSize<ulong> seed)
    {
        var c = new CaseMaker(seed.Item).Case();
        Assert.Equal(SolveStatus.Solved, ConverterSolver.Solve(c, Budget.Standard, out var s));
        var losses = s.SwitchLoss + s.DiodeLoss + s.CoilLoss + s.EsrLoss;
        Assert.Equal(s.InputPower, s.LoadPower + losses, 1e-8 * s.InputPower);
        // No mean current through the output capacitor.
        Assert.Equal(s.LoadCurrentMean, s.CoilMean, 1e-8 * s.CoilPeak);
        Assert.Equal(s.SwitchMean + s.DiodeMean, s.CoilMean, 1e-12 * s.CoilPeak);
        Assert.InRange(s.OutputMean, s.OutputMinimum, s.OutputMaximum);
        Assert.InRange(s.IdleFraction, 0, 1);
        Assert.True(s.CoilRms >= s.CoilMean * (1 - 1e-12) && s.CoilPeak >= s.CoilRms);
        Assert.InRange(s.Efficiency, 0, 1);
        Assert.True(Figures.AllFinite(s));
    }

    [Property(MaxTest = 10_000)]
    public void TheDutyForAnOutputGivesThatOutput(DoNotSize<ulong> seed)
    {
        var maker = new CaseMaker(seed.Item);
        var c = maker.Case(filter: 500);
        var wanted = (c.InputVoltage - c.SwitchDrop) * maker.Dice.Even(0.1, 0.98);
        var status = ConverterSolver.SolveForOutput(c, wanted, Budget.Standard, out var duty, out var s);
        if (status == SolveStatus.NoOperatingPoint)
        {
            // Then even the greatest duty must fall short.
            var most = ConverterSolver.Solve(c with { Duty = 1 }, Budget.Standard, out var full);
            Assert.True(most == SolveStatus.NoOperatingPoint || full.OutputMean <= wanted);
            return;
        }

        Assert.Equal(SolveStatus.Solved, status);
        Assert.Equal(wanted, s.OutputMean, 1e-8 * wanted);
        Assert.InRange(duty, 0, 1);
        Assert.Equal(SolveStatus.Solved, ConverterSolver.Solve(c with { Duty = duty }, Budget.Standard, out var again));
        Assert.Equal(s.CoilRms, again.CoilRms, 1e-9 * s.CoilRms);
    }

    [Property(MaxTest = 10_000)]
    public void TheOutputRisesWithTheDuty(DoNotSize<ulong> seed)
    {
        var maker = new CaseMaker(seed.Item);
        // With an output ripple of tens of per cent the filter rings with the switching, and the rise is not certain.
        var c = maker.Case(filter: 100);
        var less = c with { Duty = c.Duty * maker.Dice.Even(0.5, 0.999) };
        ConverterSolver.Solve(c, Budget.Standard, out var more);
        if (ConverterSolver.Solve(less, Budget.Standard, out var s) == SolveStatus.Solved)
        {
            Assert.True(s.OutputMean < more.OutputMean);
        }
    }

    [Property(MaxTest = 10_000)]
    public void BadInputNeverThrowsHangsOrLeaksNonsense(DoNotSize<ulong> seed)
    {
        var maker = new CaseMaker(seed.Item);
        var c = Spoil(ref maker, maker.Case());
        if (maker.Dice.Chance(0.3))
        {
            c = Spoil(ref maker, c);
        }

        var status = ConverterSolver.Solve(c, Budget.Standard, out var s);
        Assert.True(status is SolveStatus.Solved or SolveStatus.BadInput or SolveStatus.NoOperatingPoint, status.ToString());
        Assert.True(Figures.AllFinite(s));
        status = ConverterSolver.SolveForOutput(c, 5, Budget.Standard, out var duty, out s);
        Assert.True(status is SolveStatus.Solved or SolveStatus.BadInput or SolveStatus.NoOperatingPoint, status.ToString());
        Assert.True(Figures.AllFinite(s) && double.IsFinite(duty));
    }

    private static ConverterCase Spoil(ref CaseMaker maker, ConverterCase c)
    {
        double[] bad =
        [
            0, -1, double.NaN, 1e300, -1e300, 1e-300, double.PositiveInfinity, double.NegativeInfinity, double.Epsilon,
            1, 1e-3, 1e3, 1e-6, 1e6, 1e-9, 1e-12, 1e9,
        ];
        var v = bad[maker.Dice.Pick(bad.Length)];
        return maker.Dice.Pick(15) switch
        {
            0 => c with { Frequency = v },
            1 => c with { InputVoltage = v },
            2 => c with { Duty = v },
            3 => c with { SwitchDrop = v },
            4 => c with { SwitchResistance = v },
            5 => c with { DiodeThreshold = v },
            6 => c with { DiodeSlope = v },
            7 => c with { Inductance = v },
            8 => c with { CoilResistance = v },
            9 => c with { Capacitance = v },
            10 => c with { Esr = v },
            11 => c with { Esl = v },
            12 => c with { Load = v },
            13 => c with { LoadKind = (OutputLoad)7 },
            _ => c with { Load = v, LoadKind = OutputLoad.Resistance },
        };
    }
}
