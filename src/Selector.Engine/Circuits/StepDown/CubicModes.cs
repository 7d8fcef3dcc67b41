namespace Selector.Engine.Circuits.StepDown;

/// <summary>Natural frequencies of coil, capacitor and ESL with a resistive load: the roots of a cubic.</summary>
internal static class CubicModes
{
    /// <summary>
    /// Finds the real root (the most negative one, where all three are real) and the pair that remains.
    /// <paramref name="square"/> is (fast - a)(fast - b) over the pair a, b, in 1/s². False where the real root coincides with
    /// one of the pair so closely that dividing by it would cost more than half of the digits.
    /// </summary>
    public static bool TryFind(in ConverterCase c, double esl, double resistance, out NaturalModes modes, out double square)
    {
        var load = c.Load;
        var p = (resistance + load) / c.Inductance + (load + c.Esr) / esl;
        var q = (resistance * load + resistance * c.Esr + load * c.Esr) / (c.Inductance * esl) + 1 / (esl * c.Capacitance);
        var r = (resistance + load) / (c.Inductance * esl * c.Capacitance);
        var fast = RealRoot(p, q, r);
        var product = -r / fast;
        // Of the two ways to the pair's sum, the one whose terms do not cancel.
        var sum = -fast > p / 2 ? (q - product) / fast : -p - fast;
        modes = NaturalModes.OfPair(fast, sum, product);
        square = fast * fast - sum * fast + product;
        return Math.Abs(square) > 1e-5 * fast * fast;
    }

    // All coefficients are positive, so the real root lies between -p and 0, and the polynomial is negative at -p.
    private static double RealRoot(double p, double q, double r)
    {
        var (low, high) = (-p, 0.0);
        var x = low;
        for (var i = 0; i < 200; i++)
        {
            var value = ((x + p) * x + q) * x + r;
            if (value < 0)
            {
                low = x;
            }
            else
            {
                high = x;
            }

            var next = x - value / ((3 * x + 2 * p) * x + q);
            if (!(next >= low && next <= high))
            {
                next = low + (high - low) / 2;
            }

            if (Math.Abs(next - x) <= 4e-16 * Math.Abs(x) || value == 0)
            {
                return next;
            }

            x = next;
        }

        return x;
    }
}
