namespace Selector.Engine.Quantities;

/// <summary>A closed interval of real numbers; either end may be infinite. The default is the single point 0.</summary>
public readonly record struct Interval(double Low, double High)
{
    public double Width => High - Low;

    /// <summary>Both ends included; false for NaN.</summary>
    public bool Contains(double value) => value >= Low && value <= High;

    /// <summary>The point a share of the way from <see cref="Low"/> (0) to <see cref="High"/> (1); exact at both ends.</summary>
    public double At(double share) => share <= 0 ? Low : share >= 1 ? High : Low + (High - Low) * share;
}
