namespace Selector.Engine.Circuits.StepDown;

/// <summary>
/// Natural frequencies of a linear circuit of order at most three: one real root and one pair. The pair is kept as its half sum
/// and half difference squared, so that damped, critically damped and ringing circuits share one real expression.
/// </summary>
/// <param name="Fast">The real root, 1/s; 0 with an empty projector where the order is two.</param>
/// <param name="Decay">Half the sum of the pair, 1/s.</param>
/// <param name="Square">Square of the pair's angular frequency, 1/s²; negative for two real roots.</param>
/// <param name="Slow">Where the pair is real, its root nearer to zero, 1/s.</param>
internal readonly record struct NaturalModes(double Fast, double Decay, double Square, double Slow)
{
    /// <summary>Modes of s² - sum s + product, without a third root.</summary>
    public static NaturalModes OfPair(double sum, double product) => OfPair(0, sum, product);

    /// <summary>Modes of (s - fast)(s² - sum s + product).</summary>
    public static NaturalModes OfPair(double fast, double sum, double product)
    {
        var half = sum / 2;
        var square = product - half * half;
        // Half sum and half difference nearly cancel in the slow root of a stiff pair; the product does not.
        var slow = square < 0 ? product / (half - Math.Sqrt(-square)) : 0;
        return new(fast, half, square, slow);
    }

    /// <summary>The three time functions at time <paramref name="t"/> in seconds.</summary>
    public ModeValues At(double t)
    {
        var fast = Fast == 0 ? 1 : Math.Exp(Fast * t);
        if (Square > 0)
        {
            var omega = Math.Sqrt(Square);
            var (sine, cosine) = Math.SinCos(omega * t);
            var envelope = Math.Exp(Decay * t);
            return new(fast, envelope * cosine, envelope * sine / omega);
        }

        var spread = Math.Sqrt(-Square);
        if (spread * t < 0.5)
        {
            var envelope = Math.Exp(Decay * t);
            var odd = spread * t < 1e-8 ? t : Math.Sinh(spread * t) / spread;
            return new(fast, envelope * Math.Cosh(spread * t), envelope * odd);
        }

        var late = Math.Exp(Slow * t);
        var early = Math.Exp((Decay - spread) * t);
        return new(fast, (late + early) / 2, (late - early) / (2 * spread));
    }

    /// <summary>The largest rate at which any mode changes, 1/s.</summary>
    public double FastestRate =>
        Math.Max(-Fast, Square > 0 ? Math.Sqrt(Square + Decay * Decay) : Math.Sqrt(-Square) - Decay);

    /// <summary>Angular frequency of the pair, rad/s; 0 where it does not ring.</summary>
    public double Omega => Square > 0 ? Math.Sqrt(Square) : 0;
}

/// <summary>
/// Time functions of <see cref="NaturalModes"/>: exp(Fast t); exp(Decay t) cos(w t); exp(Decay t) sin(w t)/w, with their limits
/// for w = 0 and w imaginary. At t = 0 they are 1, 1, 0.
/// </summary>
internal readonly record struct ModeValues(double Fast, double Even, double Odd)
{
    /// <summary>The functions at the sum of the two times, by the addition theorems.</summary>
    public ModeValues Then(in ModeValues later, double square) =>
        new(Fast * later.Fast, Even * later.Even - square * Odd * later.Odd, Even * later.Odd + Odd * later.Even);
}
