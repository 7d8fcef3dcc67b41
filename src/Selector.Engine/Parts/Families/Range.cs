using Selector.Engine.Quantities;

namespace Selector.Engine.Parts.Families;

/// <summary>Entry ranges that many ratings share: wide enough for anything that is sold, narrow enough to catch a slipped prefix.</summary>
internal static class Range
{
    public static readonly Interval Volts = new(0.1, 10_000);
    public static readonly Interval Drop = new(0, 20);
    public static readonly Interval Amperes = new(1e-3, 10_000);
    public static readonly Interval Ohms = new(0, 1e9);
    public static readonly Interval Degrees = new(-65, 400);
    public static readonly Interval Cooling = new(0.01, 1_000);
    public static readonly Interval Fraction = new(0, 1);
    public static readonly Interval Multiplier = new(0.01, 10);
    public static readonly Interval Length = new(0.1, 2_000);
    public static readonly Interval Frequency = new(1, 1e9);
}
