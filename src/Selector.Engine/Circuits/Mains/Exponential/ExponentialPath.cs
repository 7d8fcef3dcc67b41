namespace Selector.Engine.Circuits.Mains.Exponential;

/// <summary>The loop of emf, winding, diodes and reservoir while a pulse flows, and one implicit step along it.</summary>
internal readonly struct ExponentialPath
{
    private const int MostNewton = 80;

    /// <summary>Diagonal of the L-stable singly diagonally implicit method of order two, 1 - 1/√2.</summary>
    public const double Gamma = 0.29289321881345254;

    private readonly ChargingPath _loop;
    private readonly ExponentialDiode _diode;
    private readonly int _diodes;
    private readonly double _damping;
    private readonly double _thermal;

    public ExponentialPath(in ExponentialCase c)
    {
        _loop = new ChargingPath(c.Circuit with { DiodeThreshold = 0, DiodeSlope = 0 });
        (_diode, _diodes, _damping) = (c.Diode, c.Circuit.DiodesInPath, c.Damping);
        _thermal = _diodes * _diode.ThermalVoltage;
    }

    public ChargingPath Loop => _loop;

    public double DiodeVoltage(double j) => _diode.Voltage(Math.Max(0, j));

    /// <summary>Power of one blocking diode, W.</summary>
    public double ReverseLoss(double voltage) => voltage <= 0 ? 0
        : voltage * _diode.SaturationCurrent * (1 - Math.Exp(-voltage / _diode.ThermalVoltage));

    public double Emf(double t) => _loop.Peak * Math.Sin(_loop.Omega * t);

    /// <summary>Terminal voltage at a capacitor voltage and a charging current.</summary>
    public double Terminal(double u, double j) => _loop.TerminalAtRest(u + _loop.Esr * j);

    /// <summary>
    /// Solves one stage: the state after a stretch of the given length from a base, with the loop's laws holding at its end.
    /// </summary>
    /// <param name="t">End of the stage, s.</param>
    /// <param name="step">Length that counts at its end, s.</param>
    /// <param name="u">Base of the capacitor voltage; on return that of the stage.</param>
    /// <param name="inductor">Base of the current in the leakage; on return that of the stage.</param>
    /// <param name="j">Guess of the charging current; on return that of the stage.</param>
    /// <returns>Terminal voltage; NaN when the bus has collapsed.</returns>
    public double Stage(double t, double step, ref double u, ref double inductor, ref double j)
    {
        var emf = Emf(t);
        var share = _loop.Inductance > 0 ? step / _loop.Inductance + 1 / _damping : double.PositiveInfinity;
        var offset = _loop.Inductance > 0 ? inductor / share : 0;
        var rise = step / _loop.Capacitance;
        var linear = _loop.Resistance + _diodes * _diode.SeriesResistance + (share < double.PositiveInfinity ? 1 / share : 0);
        var load = _loop.LoadCurrent(Math.Max(Terminal(u, j), 1e-9));
        var floor = -0.5 * _diode.SaturationCurrent;
        var v = 0.0;
        for (var i = 0; i < MostNewton; i++)
        {
            v = Terminal(u + rise * (j - load), j);
            if (double.IsNaN(v))
            {
                return double.NaN;
            }

            load = _loop.LoadCurrent(Math.Max(v, 1e-9));
            var excess = emf + offset - linear * j - _thermal * Math.Log(1 + j / _diode.SaturationCurrent) - v;
            var slope = linear + rise + _loop.Esr;
            var current = j + _diode.SaturationCurrent;

            // Below the root a step of the logarithm, which cannot creep; above it one of the current, which cannot overshoot.
            var next = excess > 0
                ? Math.Min(current * Math.Exp(Math.Min(50, excess / (_thermal + slope * current))) - _diode.SaturationCurrent, j + excess / slope)
                : Math.Max(floor, j + excess / (slope + _thermal / current));
            var moved = Math.Abs(next - j);
            j = next;
            if (moved <= 1e-12 * (Math.Abs(j) + 1e-6))
            {
                break;
            }
        }

        u += rise * (j - load);
        if (_loop.Inductance > 0)
        {
            var across = (j - inductor) / share;
            inductor += step / _loop.Inductance * across;
        }

        return v;
    }
}
