namespace Selector.Engine.Circuits.Mains;

/// <summary>The circuit while one pulse flows, reduced to one loop: emf, drop, resistance, inductance, reservoir.</summary>
internal readonly struct ChargingPath
{
    /// <summary>Below this share of the resistance at the line frequency a leakage is no longer felt, and its equation too stiff.</summary>
    private const double LeastReactance = 1e-7;

    private readonly RectifierArrangement _arrangement;
    private readonly double _diodeThreshold;
    private readonly double _diodeSlope;

    public ChargingPath(in RectifierCase c)
    {
        Omega = 2 * Math.PI * c.Frequency;
        Peak = Math.Sqrt(2) * c.SecondaryRms;
        Drop = c.DiodesInPath * c.DiodeThreshold;
        Resistance = c.WindingResistance + c.DiodesInPath * c.DiodeSlope;
        Inductance = Omega * c.Leakage < LeastReactance * (Resistance + c.Esr) ? 0 : c.Leakage;
        Capacitance = c.Capacitance;
        Esr = c.Esr;
        _arrangement = c.Arrangement;
        _diodeThreshold = c.DiodeThreshold;
        _diodeSlope = c.DiodeSlope;
        Kind = c.LoadKind;
        Load = c.Load;
        PulsesPerPeriod = c.Arrangement == RectifierArrangement.HalfWave ? 1 : 2;
        Cycle = 1 / (PulsesPerPeriod * c.Frequency);
        Collapsed = 0.3 * Peak;
    }

    public double Omega { get; }

    public double Peak { get; init; }

    public double Drop { get; init; }

    public double Resistance { get; init; }

    public double Inductance { get; init; }

    public double Capacitance { get; }

    public double Esr { get; }

    public LoadKind Kind { get; init; }

    public double Load { get; init; }

    /// <summary>Charging pulses in one period of the mains.</summary>
    public int PulsesPerPeriod { get; }

    /// <summary>Time from pulse to pulse, s.</summary>
    public double Cycle { get; }

    /// <summary>Bus below which a constant power has pulled the source down for good: 0.3 of the peak, as the reference has it.</summary>
    public double Collapsed { get; }

    /// <summary>Emf less the diodes' thresholds, V.</summary>
    public double Drive(double t) => Peak * Math.Sin(Omega * t) - Drop;

    /// <summary>Load current at a terminal voltage, A.</summary>
    public double LoadCurrent(double v) => Kind switch
    {
        LoadKind.Current => Load,
        LoadKind.Resistance => v / Load,
        _ => Load / v,
    };

    /// <summary>Mean over all diodes of the square of the reverse voltage while a pulse flows, V².</summary>
    public double ReverseSquareInPulse(double v, double j, double emf)
    {
        var reverse = _arrangement switch
        {
            RectifierArrangement.Bridge => v + _diodeThreshold + _diodeSlope * j,
            RectifierArrangement.CentreTap => v + emf,
            _ => 0,
        };
        return reverse * reverse / 2;
    }

    /// <summary>The same between pulses; a bridge's floating winding lies half-way, so that its diodes share.</summary>
    public double ReverseSquareAtRest(double v, double emf) => _arrangement switch
    {
        RectifierArrangement.Bridge => (v * v + emf * emf) / 4,
        RectifierArrangement.CentreTap => v * v + emf * emf,
        _ => (v - emf) * (v - emf),
    };

    /// <summary>Terminal voltage with no charging current; NaN where a constant power leaves none.</summary>
    public double TerminalAtRest(double u)
    {
        switch (Kind)
        {
            case LoadKind.Current:
                return u - Esr * Load;
            case LoadKind.Resistance:
                return u / (1 + Esr / Load);
            default:
                var root = u * u - 4 * Esr * Load;
                return u > 0 && root >= 0 ? (u + Math.Sqrt(root)) / 2 : double.NaN;
        }
    }
}
