namespace Selector.Engine.Quantities;

/// <summary>How far a part may lie from its nominal value, as fractions of it. The default is exact.</summary>
public readonly record struct Tolerance
{
    /// <summary>A tolerance with different sides, such as -20 % +80 %.</summary>
    /// <param name="minus">How far the magnitude may fall short: 0 to 1.</param>
    /// <param name="plus">How far the magnitude may go beyond: 0 and up, finite.</param>
    /// <exception cref="ArgumentOutOfRangeException">A side is negative or not finite, or minus is above 1.</exception>
    public Tolerance(double minus, double plus)
    {
        if (!(minus >= 0 && minus <= 1))
        {
            throw new ArgumentOutOfRangeException(nameof(minus), "A part can fall short of its value by 0 to 100 %.");
        }

        if (!(plus >= 0 && double.IsFinite(plus)))
        {
            throw new ArgumentOutOfRangeException(nameof(plus), "The upper side of a tolerance is a finite share of 0 or more.");
        }

        Minus = minus;
        Plus = plus;
    }

    /// <summary>The lower side as a fraction, 0 to 1.</summary>
    public double Minus { get; }

    /// <summary>The upper side as a fraction, 0 or more.</summary>
    public double Plus { get; }

    /// <summary>The same on both sides: 0.05 for ±5 %.</summary>
    /// <exception cref="ArgumentOutOfRangeException">Not from 0 to 1.</exception>
    public static Tolerance Symmetric(double fraction) => new(fraction, fraction);

    /// <summary>The lowest value of a part of this nominal value, in the unit of the value; for a negative one the larger magnitude.</summary>
    public double Low(double nominal) => nominal * (nominal < 0 ? 1 + Plus : 1 - Minus);

    /// <summary>The highest value of a part of this nominal value, in the unit of the value.</summary>
    public double High(double nominal) => nominal * (nominal < 0 ? 1 - Minus : 1 + Plus);

    /// <summary>Both ends.</summary>
    public Interval Around(double nominal) => new(Low(nominal), High(nominal));
}
