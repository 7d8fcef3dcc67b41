namespace Selector.Engine.Circuits.Mains.Transient;

/// <summary>Peaks and integrals of a stretch of current.</summary>
internal static class PulseSums
{
    private const int SamplesPerPeriod = 96;

    private static ReadOnlySpan<double> Nodes => [-0.906179845938664, -0.5384693101056831, 0, 0.5384693101056831, 0.906179845938664];

    private static ReadOnlySpan<double> Weights => [0.23692688505618908, 0.47862867049936647, 0.5688888888888889, 0.47862867049936647, 0.23692688505618908];

    /// <summary>Integral of the square of the current, A²s.</summary>
    public static double Square(in TransientPiece piece, double from, double to, double period)
    {
        if (!(to > from))
        {
            return 0;
        }

        // A stiff source springs up: the first panels grow with the fastest decay.
        var sum = 0.0;
        var start = from;
        if (piece.FastestRate > 0 && from == piece.Start)
        {
            foreach (var share in (ReadOnlySpan<double>)[1, 3, 8])
            {
                var end = Math.Min(from + share / piece.FastestRate, to);
                if (end - start > 1e-15 * period && end < to)
                {
                    sum += Panel(piece, start, end);
                    start = end;
                }
            }
        }

        var panels = Math.Min(400, 1 + (int)((to - start) * Math.Max(24 / period, piece.RingRate)));
        var width = (to - start) / panels;
        for (var p = 0; p < panels; p++)
        {
            sum += Panel(piece, start + p * width, start + (p + 1) * width);
        }

        return sum;
    }

    /// <summary>Largest current in a stretch and when, by samples and then the golden section.</summary>
    public static (double At, double Peak) Peak(in TransientPiece piece, double from, double to, double period)
    {
        var samples = Math.Clamp((int)((to - from) * Math.Max(SamplesPerPeriod / period, 3 * piece.RingRate)), 4, 2000);
        var step = (to - from) / samples;
        var (at, peak) = (from, double.NegativeInfinity);
        for (var i = 0; i <= samples; i++)
        {
            var t = i == samples ? to : from + i * step;
            if (piece.Total(t) is var j && j > peak)
            {
                (at, peak) = (t, j);
            }
        }

        var (low, high) = (Math.Max(from, at - step), Math.Min(to, at + step));
        for (var i = 0; i < 60 && high - low > 1e-11 * period; i++)
        {
            var (a, b) = (low + 0.381966011 * (high - low), high - 0.381966011 * (high - low));
            (low, high) = piece.Total(a) > piece.Total(b) ? (low, b) : (a, high);
        }

        var middle = (low + high) / 2;
        return piece.Total(middle) > peak ? (middle, piece.Total(middle)) : (at, peak);
    }

    private static double Panel(in TransientPiece piece, double from, double to)
    {
        var (sum, half) = (0.0, (to - from) / 2);
        for (var n = 0; n < Nodes.Length; n++)
        {
            var j = piece.Total(from + half * (1 + Nodes[n]));
            sum += Weights[n] * half * j * j;
        }

        return sum;
    }
}
