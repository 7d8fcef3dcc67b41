namespace Selector.Engine.Circuits.Mains;

/// <summary>What is looked up along a pulse.</summary>
internal enum PulseFigure
{
    Current,
    Bus,

    /// <summary>Bus and forward drop of the conducting diode: what the blocking diode of a bridge holds.</summary>
    BridgeReverse,

    /// <summary>Bus and the other half's emf: what the idle diode of a centre tap holds.</summary>
    CentreTapReverse,
}

/// <summary>The pulse as one function of time, over its pieces.</summary>
internal readonly ref struct PulseView
{
    private const double SmallestStep = 1e-6;

    private readonly RectifierCase _case;
    private readonly ChargingPath _path;
    private readonly ReadOnlySpan<ChargingPiece> _pieces;

    public PulseView(in RectifierCase c, in ChargingPath path, ReadOnlySpan<ChargingPiece> pieces)
    {
        _case = c;
        _path = path;
        _pieces = pieces;
    }

    public double Start => _pieces[0].Start;

    public double End => _pieces[^1].End;

    /// <summary>Charging current and terminal voltage at a time of the pulse.</summary>
    public void At(double t, out double j, out double v)
    {
        var i = 0;
        while (i < _pieces.Length - 1 && t > _pieces[i].End)
        {
            i++;
        }

        _pieces[i].At(t, out var u, out j);
        v = _pieces[i].Terminal(u, j);
    }

    public double Of(PulseFigure figure, double t)
    {
        At(t, out var j, out var v);
        return Of(figure, t, j, v);
    }

    /// <summary>The same where current and bus are known already.</summary>
    public double Of(PulseFigure figure, double t, double j, double v)
    {
        return figure switch
        {
            PulseFigure.Current => j,
            PulseFigure.Bus => v,
            PulseFigure.BridgeReverse => v + _case.DiodeThreshold + _case.DiodeSlope * j,
            _ => v + _path.Peak * Math.Sin(_path.Omega * t),
        };
    }

    /// <summary>
    /// The greatest (sign 1) or least (sign -1) value near a time: parabolas through three points, drawn closer each time, never
    /// outside the pulse. Returns the time.
    /// </summary>
    public double Extreme(PulseFigure figure, double near, double step, double sign, out double value)
    {
        var t = near;
        value = sign * Of(figure, t);
        var least = SmallestStep * (End - Start);
        while (step > least)
        {
            var (left, right) = (Math.Max(Start, t - step), Math.Min(End, t + step));
            var (fl, fr) = (sign * Of(figure, left), sign * Of(figure, right));
            var (bestT, best) = fl > value && fl >= fr ? (left, fl) : fr > value ? (right, fr) : (t, value);
            var (a, b) = (t - left, right - t);
            var bend = a * (fr - value) + b * (fl - value);
            if (a > 0 && b > 0 && bend < 0)
            {
                var top = t - (a * a * (fr - value) - b * b * (fl - value)) / (2 * bend);
                if (top > left && top < right && sign * Of(figure, top) is var f && f > best)
                {
                    (bestT, best) = (top, f);
                }
            }

            step = bestT == t || best - value <= 1e-14 * Math.Abs(best) ? step / 8 : Math.Min(step, 2 * Math.Abs(bestT - t) + step / 8);
            (t, value) = (bestT, best);
        }

        value *= sign;
        return t;
    }

    /// <summary>Where the current passes a level between a time at which it is below and one at which it is above.</summary>
    public double Crossing(double level, double below, double above)
    {
        for (var i = 0; i < 30; i++)
        {
            var middle = (below + above) / 2;
            if (Of(PulseFigure.Current, middle) < level)
            {
                below = middle;
            }
            else
            {
                above = middle;
            }
        }

        return (below + above) / 2;
    }
}
