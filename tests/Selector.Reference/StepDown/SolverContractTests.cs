using Selector.Engine.Circuits;
using Selector.Engine.Circuits.StepDown;

namespace Selector.Reference.StepDown;

/// <summary>Ends of the ranges, bounds on work, and what each status means.</summary>
public class SolverContractTests
{
    private static readonly ConverterCase Example =
        new(100e3, 24, 0.3, 0.5, 0.05, 0.5, 0.05, 22e-6, 0.05, 100e-6, 0.05, 0, OutputLoad.Current, 0.3);

    [Fact]
    public void NoLoadNeedsNoDuty()
    {
        var c = Example with { Load = 0 };
        Assert.Equal(SolveStatus.Solved, ConverterSolver.SolveForOutput(c, 5, Budget.Standard, out var duty, out var s));
        Assert.Equal((0.0, 5.0, 0.0, 0.0), (duty, s.OutputMean, s.OutputRipple, s.CoilRms));
        Assert.Equal(SolveStatus.Solved, ConverterSolver.Solve(c, Budget.Standard, out s));
        Assert.Equal(23.5, s.OutputMean, 1e-12);
    }

    [Fact]
    public void TooLowAnInputHasNoOperatingPoint()
    {
        var c = Example with { Load = 2 };
        Assert.Equal(SolveStatus.NoOperatingPoint, ConverterSolver.SolveForOutput(c, 23.4, Budget.Standard, out _, out _));
        Assert.Equal(SolveStatus.NoOperatingPoint, ConverterSolver.SolveForOutput(c, 24, Budget.Standard, out _, out _));
        Assert.Equal(
            SolveStatus.NoOperatingPoint, ConverterSolver.SolveForOutput(c, 12, Budget.Standard, out _, out _, maxDuty: 0.5));
        Assert.Equal(
            SolveStatus.Solved, ConverterSolver.SolveForOutput(c, 12, Budget.Standard, out var duty, out _, maxDuty: 0.6));
        Assert.InRange(duty, 0.5, 0.6);
    }

    [Fact]
    public void FullDutyIsPlainDirectCurrent()
    {
        Assert.Equal(SolveStatus.Solved, ConverterSolver.Solve(Example with { Duty = 1 }, Budget.Standard, out var s));
        Assert.Equal(24 - 0.5 - 0.1 * 0.3, s.OutputMean, 1e-9);
        Assert.Equal(0, s.OutputRipple, 1e-9);
        Assert.Equal(0, s.DiodeMean);
        Assert.Equal(0, s.InputCapacitorRms, 1e-6);
    }

    [Fact]
    public void BudgetAndCancellationAreKept()
    {
        Assert.Equal(SolveStatus.OutOfBudget, ConverterSolver.Solve(Example, new Budget(1, default), out var s));
        Assert.Equal(default, s);
        using var source = new CancellationTokenSource();
        source.Cancel();
        Assert.Equal(SolveStatus.Cancelled, ConverterSolver.Solve(Example, Budget.Until(source.Token), out _));
        Assert.Equal(
            SolveStatus.Cancelled, ConverterSolver.SolveForOutput(Example, 5, Budget.Until(source.Token), out _, out _));
    }

    [Fact]
    public void AGuessOfTheDutyChangesNothing()
    {
        ConverterSolver.SolveForOutput(Example, 5, Budget.Standard, out var duty, out _);
        foreach (var guess in new[] { 0.01, 0.2, 0.9, 1e-9, double.PositiveInfinity, -1 })
        {
            ConverterSolver.SolveForOutput(Example, 5, Budget.Standard, out var again, out _, dutyGuess: guess);
            Assert.Equal(duty, again, 1e-9);
        }
    }

    [Fact]
    public void SolvingAllocatesNothing()
    {
        var cases = Enumerable.Range(0, 50).Select(k => new CaseMaker((ulong)k).Case(100)).ToArray();
        Run(cases);
        var before = GC.GetAllocatedBytesForCurrentThread();
        Run(cases);
        Assert.Equal(before, GC.GetAllocatedBytesForCurrentThread());

        static void Run(ConverterCase[] cases)
        {
            for (var k = 0; k < cases.Length; k++)
            {
                ConverterSolver.Solve(cases[k], Budget.Standard, out var s);
                ConverterSolver.SolveForOutput(cases[k], 0.9 * s.OutputMean, Budget.Standard, out _, out _);
            }
        }
    }
}
