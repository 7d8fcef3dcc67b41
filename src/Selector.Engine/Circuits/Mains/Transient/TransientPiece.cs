namespace Selector.Engine.Circuits.Mains.Transient;

/// <summary>
/// A stretch in which the same diodes conduct, in closed form. One winding: capacitor and current follow the charging path of its
/// half-wave. Both halves of a centre tap at once: their sum sees half the resistance and leakage and no emf, their difference twice
/// the emf and no capacitor, so that each is closed by itself.
/// </summary>
internal struct TransientPiece
{
    private ChargingPiece _sum;
    private readonly double _shift;
    private readonly double _omega;
    private readonly double _sin, _cos, _decay, _rate, _start;

    private TransientPiece(in ChargingPath path, in ChargingPiece sum, double start, double shift)
    {
        _sum = sum;
        (_start, _shift, _omega) = (start, shift, path.Omega);
    }

    private TransientPiece(in ChargingPath path, in ChargingPiece sum, double start, double positive, double negative)
        : this(path, sum, start, 0)
    {
        Overlaps = true;
        _rate = path.Resistance / path.Inductance;
        var drive = 2 * path.Peak / path.Inductance / (_rate * _rate + _omega * _omega);
        (_sin, _cos) = (drive * _rate, -drive * _omega);
        var (sin, cos) = Math.SinCos(_omega * start);
        _decay = positive - negative - _sin * sin - _cos * cos;
    }

    /// <summary>One winding alone, or the bridge.</summary>
    /// <param name="path">With the load as it is in this stretch.</param>
    /// <param name="load">Straightened.</param>
    /// <param name="t">Start, s.</param>
    /// <param name="shift">Half a period for the negative half-wave, which is the positive one that much later.</param>
    /// <param name="u">Ideal capacitor, V.</param>
    /// <param name="j">Current, A.</param>
    public static TransientPiece One(in ChargingPath path, in LinearLoad load, double t, double shift, double u, double j) =>
        new(path, new ChargingPiece(path, load, t - shift, double.PositiveInfinity, u, j), t, shift);

    /// <summary>Both halves of a centre tap, with leakage.</summary>
    public static TransientPiece Both(in ChargingPath path, in LinearLoad load, double t, double u, double positive, double negative)
    {
        var both = path with { Peak = 0, Resistance = path.Resistance / 2, Inductance = path.Inductance / 2 };
        return new(path, new ChargingPiece(both, load, t, double.PositiveInfinity, u, positive + negative), t, positive, negative);
    }

    public bool Overlaps { get; }

    public readonly double Start => _start;

    /// <summary>Rate of ringing, 1/s; 0 when it does not.</summary>
    public readonly double RingRate => _sum.RingRate;

    /// <summary>Fastest decay, 1/s.</summary>
    public readonly double FastestRate => _sum.FastestRate;

    /// <summary>Ideal capacitor and the current of all windings together.</summary>
    public readonly void At(double t, out double u, out double total) => _sum.At(t - _shift, out u, out total);

    public readonly double Total(double t)
    {
        At(t, out _, out var total);
        return total;
    }

    public readonly double Terminal(double t)
    {
        At(t, out var u, out var total);
        return _sum.Terminal(u, total);
    }

    /// <summary>Current of the half on the positive half-wave; only while both conduct.</summary>
    public readonly double Positive(double t) => (Total(t) + Difference(t)) / 2;

    /// <summary>Current of the other half.</summary>
    public readonly double Negative(double t) => (Total(t) - Difference(t)) / 2;

    private readonly double Difference(double t)
    {
        var (sin, cos) = Math.SinCos(_omega * t);
        return _sin * sin + _cos * cos + _decay * Math.Exp(-_rate * (t - _start));
    }
}
