using Selector.Engine.Circuits;
using Selector.Engine.Circuits.StepDown;

namespace Selector.Reference.StepDown;

/// <summary>The closed form against the small-step integrator, over random plausible converters.</summary>
public class BruteForceTests
{
    [Fact]
    public void TheClosedFormAgreesWithSmallSteps()
    {
        var (compared, discontinuous, stiff) = (0, 0, 0);
        for (var seed = 0UL; seed < 200; seed++)
        {
            var c = new CaseMaker(seed * 7919 + 5).Case();
            var beside = c.Esl > 0 && c.LoadKind == OutputLoad.Resistance;
            if (beside)
            {
                // Explicit steps must resolve the fast mode, so it is slowed down to some nanoseconds at least.
                c = c with { Esl = Math.Max(c.Esl, (c.Load + c.Esr) / c.Frequency / 2000) };
            }

            Assert.Equal(SolveStatus.Solved, ConverterSolver.Solve(c, Budget.Standard, out var s));
            var steps = beside ? 2500 : 500;
            var brute = new BruteForceConverter(c, steps);
            if (!brute.Settle(s.OutputMean * 1.02, s.CoilMean * 0.97))
            {
                continue;
            }

            compared++;
            discontinuous += s.Mode == ConductionMode.Discontinuous ? 1 : 0;
            stiff += beside ? 1 : 0;
            var f = c.Frequency;
            Near(s.OutputMean, f * brute.OutputMean, 1e-6);
            Near(s.OutputRipple, brute.OutputMaximum - brute.OutputMinimum, 1e-4);
            Near(s.CoilMean, f * brute.CoilMean, 1e-6);
            Near(s.CoilPeak, brute.CoilPeak, 1e-6);
            Near(s.CoilRms, Math.Sqrt(f * brute.CoilSquare), 1e-6);
            Near(s.SwitchMean, f * brute.SwitchCharge, 1e-6);
            Near(s.SwitchRms, Math.Sqrt(f * brute.SwitchSquare), 1e-6);
            Near(s.OutputCapacitorRms, Math.Sqrt(f * brute.CapacitorSquare), 1e-6);
            Near(s.LoadPower, f * brute.LoadEnergy, 1e-6);

            void Near(double value, double reference, double tolerance) => Assert.True(
                Math.Abs(value - reference) <= tolerance * Math.Abs(reference), $"{seed}: {value:R} against {reference:R}, {c}");
        }

        // The sample must not have shrunk to the easy part.
        Assert.True(compared >= 190 && discontinuous >= 60 && stiff >= 25, $"{compared} {discontinuous} {stiff}");
    }
}
