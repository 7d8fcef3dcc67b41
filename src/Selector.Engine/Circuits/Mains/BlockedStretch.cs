namespace Selector.Engine.Circuits.Mains;

/// <summary>The stretch between two pulses, in closed form: the load alone empties the reservoir.</summary>
internal readonly struct BlockedStretch
{
    private readonly ChargingPath _path;
    private readonly double _start;
    private readonly double _u0;
    private readonly double _v0;

    public BlockedStretch(in ChargingPath path, double start, double u)
    {
        _path = path;
        _start = start;
        _u0 = u;
        _v0 = path.TerminalAtRest(u);
    }

    /// <summary>Terminal voltage and its slope at a time; NaN where a constant power has emptied the reservoir.</summary>
    public double Terminal(double t, out double slope)
    {
        var tau = t - _start;
        var c = _path.Capacitance;
        switch (_path.Kind)
        {
            case LoadKind.Current:
                slope = -_path.Load / c;
                return _v0 + slope * tau;
            case LoadKind.Resistance:
                var time = c * (_path.Load + _path.Esr);
                var v = _v0 * Math.Exp(-tau / time);
                slope = -v / time;
                return v;
            default:
                return ConstantPower(tau, out slope);
        }
    }

    /// <summary>Voltage on the ideal capacitor that belongs to a terminal voltage.</summary>
    public double Ideal(double v) => v + _path.Esr * _path.LoadCurrent(v);

    /// <summary>
    /// C (v - r P / v) dv = -P dt has the integral C ( (v0² - v²)/2 - r P ln(v0/v) ) = P t; Newton's method inverts it, from the
    /// value without ESR, from which it falls steadily: a last step of 1e-7 leaves its square.
    /// </summary>
    private double ConstantPower(double tau, out double slope)
    {
        var (c, power) = (_path.Capacitance, _path.Load);
        var rise = _path.Esr * power;
        var square = _v0 * _v0 - 2 * power * tau / c;
        var v = square > 0 ? Math.Sqrt(square) : double.NaN;
        for (var i = 0; i < 8 && rise > 0; i++)
        {
            var error = (_v0 * _v0 - v * v) / 2 - rise * Math.Log(_v0 / v) - power * tau / c;
            var step = error / (v - rise / v);
            v += step;
            if (Math.Abs(step) <= 1e-7 * v)
            {
                break;
            }
        }

        slope = -power / (c * (v - rise / v));
        return v;
    }
}
