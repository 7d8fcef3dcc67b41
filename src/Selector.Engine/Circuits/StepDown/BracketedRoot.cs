namespace Selector.Engine.Circuits.StepDown;

/// <summary>A function whose root is wanted.</summary>
internal interface IRootFunction
{
    /// <summary>The value at <paramref name="x"/>, and its slope or NaN where that is not known.</summary>
    double At(double x, out double slope);
}

/// <summary>Newton's method or, without a slope, the secant rule, kept inside a bracket by bisection.</summary>
internal static class BracketedRoot
{
    /// <summary>
    /// Finds x with |f(x)| at most <paramref name="valueTolerance"/>, or a step at most <paramref name="stepTolerance"/>. The
    /// function has the sign of <paramref name="lowSign"/> at <paramref name="low"/> and the other at <paramref name="high"/>.
    /// The last evaluation made is the one at the returned x.
    /// </summary>
    public static SolveStatus Find<T>(
        ref T f, double low, double high, int lowSign, double guess, double stepTolerance, double valueTolerance,
        in Budget budget, out double x)
        where T : struct, IRootFunction
    {
        x = guess > low && guess < high ? guess : low + (high - low) / 2;
        double lastX = double.NaN, lastValue = double.NaN, lastStep = double.PositiveInfinity;
        var width = high - low;
        for (var i = 0; i < budget.Iterations; i++)
        {
            if (budget.Cancel.IsCancellationRequested)
            {
                return SolveStatus.Cancelled;
            }

            var value = f.At(x, out var slope);
            if (Math.Abs(value) <= valueTolerance || Math.Abs(lastStep) <= stepTolerance || high - low <= stepTolerance)
            {
                return SolveStatus.Solved;
            }

            if (double.IsNaN(value))
            {
                return SolveStatus.BadInput;
            }

            if (value > 0 == lowSign > 0)
            {
                low = x;
            }
            else
            {
                high = x;
            }

            if (!double.IsFinite(slope))
            {
                slope = (value - lastValue) / (x - lastX);
            }

            var next = x - value / slope;
            // Newton creeps where rounding hides the slope: from the sixth step on, each third must have halved the bracket.
            var creeps = false;
            if (i >= 6 && i % 3 == 0)
            {
                creeps = high - low > width / 2;
                width = high - low;
            }

            // Bisect when the step leaves the bracket or the steps no longer shrink.
            if (creeps || !(next > low && next < high) || Math.Abs(next - x) > Math.Abs(lastStep))
            {
                next = low + (high - low) / 2;
            }

            (lastX, lastValue, lastStep, x) = (x, value, next - x, next);
        }

        return SolveStatus.OutOfBudget;
    }
}
