namespace Selector.Engine.Circuits.Series;

/// <summary>A series regulator as its data sheet gives it, SI units.</summary>
/// <param name="LimitMin">Guaranteed least current limit, A; 0 when not given.</param>
/// <param name="LimitMax">Greatest current limit, A.</param>
/// <param name="FoldBackFrom">Differential from which the limit falls, V; 0 for no fold-back.</param>
/// <param name="FoldBackTo">Limit that is left at the greatest differential, A.</param>
/// <param name="DifferentialMax">Where that is, V.</param>
/// <param name="Drop">Drop-out without current, V.</param>
/// <param name="DropResistance">How it grows, ohm.</param>
public readonly record struct SeriesRegulator(
    double LimitMin, double LimitMax, double FoldBackFrom, double FoldBackTo, double DifferentialMax, double Drop, double DropResistance)
{
    /// <summary>Greatest limit at a differential from input to output, A.</summary>
    public double Limit(double differential) => LimitMax * Left(differential);

    /// <summary>Least limit there, A: the guaranteed one, falling in the same proportion.</summary>
    public double LeastLimit(double differential) => LimitMin * Left(differential);

    /// <summary>Voltage that it needs between input and output, V.</summary>
    public double DropOut(double current) => Drop + DropResistance * current;

    /// <summary>
    /// Largest share of the least limit that a resistive load asks for on the way from nothing to the full output: above 1 it hangs
    /// on the way up. Both lines are straight between the kinks, so that the kinks and ends suffice.
    /// </summary>
    /// <param name="bus">V.</param>
    /// <param name="output">V, above 0.</param>
    /// <param name="current">Load at the full output, A.</param>
    public double StartShare(double bus, double output, double current)
    {
        var worst = 0.0;
        foreach (var at in (ReadOnlySpan<double>)[output, Math.Clamp(bus - FoldBackFrom, 0, output), Math.Clamp(bus - DifferentialMax, 0, output)])
        {
            var limit = LeastLimit(bus - at);
            var asked = current * at / output;
            worst = Math.Max(worst, limit > 0 ? asked / limit : asked > 0 ? Hopeless : 0);
        }

        return Math.Min(worst, Hopeless);
    }

    /// <summary>Stands for a share of nothing.</summary>
    public const double Hopeless = 1000;

    private double Left(double differential)
    {
        if (!(FoldBackFrom > 0) || differential <= FoldBackFrom || !(DifferentialMax > FoldBackFrom))
        {
            return 1;
        }

        var end = LimitMax > 0 ? Math.Min(1, FoldBackTo / LimitMax) : 0;
        var way = Math.Min(1, (differential - FoldBackFrom) / (DifferentialMax - FoldBackFrom));
        return 1 + (end - 1) * way;
    }
}
