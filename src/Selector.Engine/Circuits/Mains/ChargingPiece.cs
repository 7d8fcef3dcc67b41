namespace Selector.Engine.Circuits.Mains;

/// <summary>
/// A stretch of the pulse in closed form. State: voltage u of the ideal capacitor and charging current j. With leakage the pair
/// follows a linear system of order two driven by the sine; without it j is given by u. Solution of x' = A x + b + s sin ωt as
/// the steady part (constant, sine, cosine) and the transient by the exponential of a two-by-two matrix.
/// </summary>
internal struct ChargingPiece
{
    private double _omega, _start, _share, _esrLoad;
    private double _esr;
    private double _uConstant, _uCos, _uSin, _jConstant, _jCos, _jSin;
    private double _u0, _j0, _mean, _root, _du, _dj;
    private double _jFromU, _jOffset, _jFromSine;
    private bool _inductive;

    public double End;

    public readonly double Start => _start;

    /// <summary>From state (u, j) at a time, with the load straightened.</summary>
    public ChargingPiece(in ChargingPath p, in LinearLoad load, double start, double end, double u, double j)
    {
        _omega = p.Omega;
        _start = start;
        End = end;
        _esr = p.Esr;
        _share = 1 / (1 + p.Esr * load.Conductance);
        _esrLoad = p.Esr * load.Current;
        _inductive = p.Inductance > 0;
        if (_inductive)
        {
            Inductive(p, load, u, j);
        }
        else
        {
            Resistive(p, load, u);
        }
    }

    /// <summary>Fastest rate at which a transient dies away without ringing, 1/s; 0 where it rings.</summary>
    public readonly double FastestRate => !_inductive ? -_mean : _root > 0 ? Math.Sqrt(_root) - _mean : 0;

    /// <summary>Angular frequency at which leakage and reservoir ring, 1/s; 0 when they do not.</summary>
    public readonly double RingRate => _inductive && _root < 0 ? Math.Sqrt(-_root) : 0;

    /// <summary>State at a time inside the piece.</summary>
    public readonly void At(double t, out double u, out double j)
    {
        var (sin, cos) = Math.SinCos(_omega * t);
        At(t, sin, cos, out u, out j);
    }

    /// <summary>The same where sine and cosine of the mains are known already.</summary>
    public readonly void At(double t, double sin, double cos, out double u, out double j)
    {
        var tau = t - _start;
        if (!_inductive)
        {
            u = _uConstant + _uCos * cos + _uSin * sin + _u0 * Math.Exp(_mean * tau);
            j = _jFromU * u + _jOffset + _jFromSine * sin;
            return;
        }

        double even, odd;
        if (_root >= 0)
        {
            var delta = Math.Sqrt(_root);
            var (fast, slow) = (Math.Exp((_mean - delta) * tau), Math.Exp((_mean + delta) * tau));
            even = (slow + fast) / 2;
            odd = delta * tau > 1e-6 ? (slow - fast) / (2 * delta) : tau * even;
        }
        else
        {
            var delta = Math.Sqrt(-_root);
            var decay = Math.Exp(_mean * tau);
            var (s, c) = Math.SinCos(delta * tau);
            even = decay * c;
            odd = delta * tau > 1e-6 ? decay * s / delta : tau * decay;
        }

        u = _uConstant + _uCos * cos + _uSin * sin + even * _u0 + odd * _du;
        j = _jConstant + _jCos * cos + _jSin * sin + even * _j0 + odd * _dj;
    }

    /// <summary>Terminal voltage that belongs to a state of this piece.</summary>
    public readonly double Terminal(double u, double j) => _share * (u + _esr * j - _esrLoad);

    /// <summary>Charging current at a time, for the search of its zero.</summary>
    public readonly double Current(double t)
    {
        At(t, out _, out var j);
        return j;
    }

    private void Inductive(in ChargingPath p, in LinearLoad load, double u, double j)
    {
        var (k, g, l, c) = (_share, load.Conductance, p.Inductance, p.Capacitance);
        var (a11, a12) = (-g * k / c, k / c);
        var (a21, a22) = (-k / l, -(p.Resistance + k * p.Esr) / l);
        var (b1, b2) = (-k * load.Current / c, (-p.Drop + k * _esrLoad) / l);
        var determinant = a11 * a22 - a12 * a21;
        _uConstant = -(a22 * b1 - a12 * b2) / determinant;
        _jConstant = -(-a21 * b1 + a11 * b2) / determinant;

        // (A² + ω² I) P = -ω s for the cosine part P, and Q = A P / ω for the sine part.
        var s = p.Peak / l;
        var (m11, m12) = (a11 * a11 + a12 * a21 + _omega * _omega, a12 * (a11 + a22));
        var (m21, m22) = (a21 * (a11 + a22), a22 * a22 + a12 * a21 + _omega * _omega);
        var m = m11 * m22 - m12 * m21;
        _uCos = m12 * _omega * s / m;
        _jCos = -m11 * _omega * s / m;
        _uSin = (a11 * _uCos + a12 * _jCos) / _omega;
        _jSin = (a21 * _uCos + a22 * _jCos) / _omega;

        var (sin, cos) = Math.SinCos(_omega * _start);
        _u0 = u - _uConstant - _uCos * cos - _uSin * sin;
        _j0 = j - _jConstant - _jCos * cos - _jSin * sin;
        _mean = (a11 + a22) / 2;
        var half = (a11 - a22) / 2;
        _root = half * half + a12 * a21;
        _du = half * _u0 + a12 * _j0;
        _dj = a21 * _u0 - half * _j0;
    }

    private void Resistive(in ChargingPath p, in LinearLoad load, double u)
    {
        var (k, g, c) = (_share, load.Conductance, p.Capacitance);
        var loop = p.Resistance + k * p.Esr;
        _jFromU = -k / loop;
        _jOffset = (-p.Drop + k * _esrLoad) / loop;
        _jFromSine = p.Peak / loop;
        _mean = (k * _jFromU - g * k) / c;
        var offset = k * (_jOffset - load.Current) / c;
        var drive = k * _jFromSine / c;
        var square = _omega * _omega + _mean * _mean;
        _uConstant = -offset / _mean;
        _uCos = -drive * _omega / square;
        _uSin = -drive * _mean / square;
        var (sin, cos) = Math.SinCos(_omega * _start);
        _u0 = u - _uConstant - _uCos * cos - _uSin * sin;
    }
}
