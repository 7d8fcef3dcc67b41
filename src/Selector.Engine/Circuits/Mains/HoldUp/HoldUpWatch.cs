using Selector.Engine.Circuits.Mains.Transient;

namespace Selector.Engine.Circuits.Mains.HoldUp;

/// <summary>Follows the bus: its top before the failure, its valley, its time below the lock-out and the pulse that recharges it.</summary>
internal struct HoldUpWatch(double removal, double period, double lockOut, bool untilLockOut) : ITransientWatch
{
    private const int Samples = 24;

    public double TopAt = double.NaN, Least = double.PositiveInfinity, Below, Peak, LockOutAt = double.NaN;
    private double _top = double.NegativeInfinity;

    public bool Conducts(in TransientPiece piece, double from, double to)
    {
        if (from < removal)
        {
            var (at, top) = Extreme(piece, from, Math.Min(to, removal), 1);
            (_top, TopAt) = top >= _top - 1e-9 * Math.Abs(top) ? (top, at) : (_top, TopAt);
            return true;
        }

        Least = Math.Min(Least, -Extreme(piece, from, to, -1).Value);
        Peak = Math.Max(Peak, PulseSums.Peak(piece, from, to, period).Peak);
        var (low, high) = (piece.Terminal(from) < lockOut, piece.Terminal(to) < lockOut);
        if (low || high)
        {
            var crossing = low == high ? to : Crossing(piece, from, to, low);
            Below += low ? crossing - from : to - crossing;
            if (high && double.IsNaN(LockOutAt))
            {
                LockOutAt = low ? from : crossing;
            }
        }

        return !untilLockOut || double.IsNaN(LockOutAt);
    }

    public bool Rests(in BlockedStretch rest, double from, double to)
    {
        if (from < removal && double.IsNaN(TopAt))
        {
            TopAt = from;
        }

        if (to <= removal)
        {
            return true;
        }

        var end = rest.Terminal(to, out _);
        var last = end >= 0 ? end : 0;
        Least = Math.Min(Least, last);
        if (last < lockOut)
        {
            var at = Crossing(rest, from, to);
            Below += to - at;
            LockOutAt = double.IsNaN(LockOutAt) ? at : LockOutAt;
        }

        return !untilLockOut || double.IsNaN(LockOutAt);
    }

    private readonly (double At, double Value) Extreme(in TransientPiece piece, double from, double to, int sign)
    {
        var (at, value) = (from, double.NegativeInfinity);
        for (var i = 0; i <= Samples; i++)
        {
            var t = from + (to - from) * i / Samples;
            if (sign * piece.Terminal(t) is var v && v > value)
            {
                (at, value) = (t, v);
            }
        }

        var step = (to - from) / Samples;
        var (low, high) = (Math.Max(from, at - step), Math.Min(to, at + step));
        for (var i = 0; i < 60 && high - low > 1e-11 * period; i++)
        {
            var (a, b) = (low + 0.381966011 * (high - low), high - 0.381966011 * (high - low));
            (low, high) = sign * piece.Terminal(a) > sign * piece.Terminal(b) ? (low, b) : (a, high);
        }

        var middle = (low + high) / 2;
        return sign * piece.Terminal(middle) is var inside && inside > value ? (middle, inside) : (at, value);
    }

    private readonly double Crossing(in TransientPiece piece, double from, double to, bool rising)
    {
        var (low, high) = (from, to);
        for (var i = 0; i < 60 && high - low > 1e-13 * period; i++)
        {
            var middle = (low + high) / 2;
            (low, high) = piece.Terminal(middle) < lockOut == rising ? (middle, high) : (low, middle);
        }

        return high;
    }

    private readonly double Crossing(in BlockedStretch rest, double from, double to)
    {
        var (low, high) = (from, to);
        for (var i = 0; i < 60 && high - low > 1e-13 * period; i++)
        {
            var middle = (low + high) / 2;
            (low, high) = rest.Terminal(middle, out _) >= lockOut ? (middle, high) : (low, middle);
        }

        return high;
    }
}
