using Selector.Engine.Circuits.Mains;

namespace Selector.Engine.Circuits.Reservoir.Combined;

/// <summary>The equations of rectifier, reservoir and converter, and one step along them by the classical method of Runge and Kutta.</summary>
internal readonly struct CombinedCircuit
{
    private readonly CombinedCase _c;
    private readonly double _omega, _peak, _drop, _resistance, _leakage;
    private readonly bool _halfWave;

    public CombinedCircuit(in CombinedCase c)
    {
        _c = c;
        var r = c.Rectifier;
        _omega = 2 * Math.PI * r.Frequency;
        _peak = Math.Sqrt(2) * r.SecondaryRms;
        _drop = r.DiodesInPath * r.DiodeThreshold;
        _resistance = r.WindingResistance + r.DiodesInPath * r.DiodeSlope;
        _leakage = _omega * r.Leakage < 1e-7 * (_resistance + r.Esr) ? 0 : r.Leakage;
        _halfWave = r.Arrangement == RectifierArrangement.HalfWave;
    }

    /// <summary>Emf of the half-wave that can conduct, V.</summary>
    public double Emf(double t)
    {
        var sine = Math.Sin(_omega * t);
        return _peak * (_halfWave ? sine : Math.Abs(sine));
    }

    /// <summary>Charging current, A: a state with leakage; else by the loop.</summary>
    public double Charge(in CombinedState s, double emf, CoilPath path) => _leakage > 0 ? s.Charge
        : Math.Max(0, (emf - _drop - s.Bus + _c.Rectifier.Esr * Drawn(s, path)) / (_resistance + _c.Rectifier.Esr));

    public static double Drawn(in CombinedState s, CoilPath path) => path == CoilPath.Switch ? s.Coil : 0;

    /// <summary>At the terminals of the reservoir, V.</summary>
    public double Terminal(in CombinedState s, double charge, CoilPath path) => s.Bus + _c.Rectifier.Esr * (charge - Drawn(s, path));

    public double OutputTerminal(in CombinedState s) => s.Output + _c.Esr * (s.Coil - _c.Load);

    /// <summary>One step; a charging current that would turn round stays at nothing.</summary>
    public CombinedState Step(in CombinedState s, double t, double h, CoilPath path)
    {
        var (e0, e1, e2) = (Emf(t), Emf(t + h / 2), Emf(t + h));
        var k1 = Slope(s, e0, path);
        var k2 = Slope(s + h / 2 * k1, e1, path);
        var k3 = Slope(s + h / 2 * k2, e1, path);
        var k4 = Slope(s + h * k3, e2, path);
        var next = s + h / 6 * (k1 + 2 * k2 + 2 * k3 + k4);
        next.Charge = Math.Max(0, next.Charge);
        return next;
    }

    private CombinedState Slope(in CombinedState s, double emf, CoilPath path)
    {
        var charge = Charge(s, emf, path);
        var bus = Terminal(s, charge, path);
        var across = emf - _drop - _resistance * charge - bus;
        var output = OutputTerminal(s);
        return new CombinedState
        {
            Bus = (charge - Drawn(s, path)) / _c.Rectifier.Capacitance,
            Charge = _leakage > 0 && (charge > 0 || across > 0) ? across / _leakage : 0,
            Coil = path switch
            {
                CoilPath.Switch => (bus - _c.SwitchDrop - (_c.SwitchResistance + _c.CoilResistance) * s.Coil - output) / _c.Inductance,
                CoilPath.Diode => (-_c.DiodeThreshold - (_c.DiodeSlope + _c.CoilResistance) * s.Coil - output) / _c.Inductance,
                _ => 0,
            },
            Output = (s.Coil - _c.Load) / _c.Capacitance,
        };
    }
}
