using Selector.Engine.Circuits.Inlet;
using Selector.Engine.Circuits.Thermal;
using Selector.Engine.Parts.Families;
using Selector.Engine.Supplies;

namespace Selector.Engine.Circuits.Mains;

/// <summary>What the front end reads besides its reservoir, and the circuit that it makes of it.</summary>
internal sealed class MainsInputs
{
    private const string T1 = "T1";

    /// <summary>Winding limit assumed where the transformer does not state its class: class A in normal use, the lowest (IEC 61558-1, from memory).</summary>
    private const double LeastWindingLimit = 100;

    /// <summary>Air in which a transformer's rise is rated, °C. Common practice, no source.</summary>
    private const double RatedAir = 40;

    /// <summary>Copper's share of the heat at rated load. Common practice, no source.</summary>
    private const double CopperShare = 2.0 / 3;

    private readonly double _nominal;
    private readonly double _nominalFrequency;
    private readonly double _impedance;
    private readonly double _low;
    private readonly double _high;
    private readonly int _mains;
    private readonly int _frequency;
    private readonly int _winding;
    private readonly int _air;
    private readonly int _firstOfTransformer;
    private readonly int _tolerance;
    private readonly int _magnetising;
    private readonly int _windingMax;
    private readonly int _windingRise;
    private readonly int _windingTemperature;
    private readonly int _threshold;
    private readonly int _drift;
    private readonly int _slope;
    private readonly int _limiterCold = -1, _limiterHot, _limiterMax, _current;
    private readonly int _capacitive;
    private readonly int _junction;

    /// <param name="read">Declares an input of the stage.</param>
    /// <param name="r">The requirement.</param>
    /// <param name="topology">Of the front end.</param>
    /// <param name="coldStart">Whether everything is still as cold as the room, and no limiter has warmed.</param>
    public MainsInputs(Func<InputId, double?, int> read, RequirementValues r, FrontEndTopology topology, bool coldStart = false)
    {
        _nominal = r[MainsFields.Voltage];
        _nominalFrequency = r[MainsFields.Frequency];
        _impedance = r[MainsFields.Impedance];
        (_low, _high) = (1 - r[MainsFields.Low], 1 + r[MainsFields.High]);
        _mains = read(InputId.Axis(MainsFields.MainsAxis), null);
        _frequency = read(InputId.Axis(MainsFields.FrequencyAxis), null);
        _winding = read(InputId.Axis(MainsFields.WindingAxis), null);
        var room = InputId.Axis(CommonFields.AmbientAxis);
        _air = read(coldStart ? room : Surroundings.Air(r), null);
        Primary = _firstOfTransformer = read(InputId.Column(T1, TransformerFamily.Primary), null);
        Halves = read(InputId.Column(T1, TransformerFamily.Halves), null);
        read(InputId.Column(T1, TransformerFamily.NoLoad), 0);
        read(InputId.Column(T1, TransformerFamily.Resistance), 0);
        read(InputId.Column(T1, TransformerFamily.ResistanceAt), null);
        read(InputId.Column(T1, TransformerFamily.Leakage), 0);
        read(InputId.Column(T1, TransformerFamily.Rated), 0);
        read(InputId.Column(T1, TransformerFamily.Power), 0);
        read(InputId.Column(T1, TransformerFamily.Current), 0);
        read(InputId.Column(T1, TransformerFamily.Regulation), 0);
        read(InputId.Column(T1, TransformerFamily.ShortCircuit), 0);
        read(InputId.Column(T1, TransformerFamily.PrimaryResistance), 0);
        _tolerance = read(InputId.Column(T1, TransformerFamily.Tolerance), 0);
        _magnetising = read(InputId.Column(T1, TransformerFamily.Magnetising), 0);
        FrequencyMin = read(InputId.Column(T1, TransformerFamily.FrequencyMin), _nominalFrequency);
        _windingMax = read(InputId.Column(T1, TransformerFamily.WindingMax), LeastWindingLimit);
        _windingRise = read(InputId.Column(T1, TransformerFamily.WindingRise), 0);
        _windingTemperature = read(coldStart ? room : InputId.Link(LinkNames.Temperature(T1)), null);
        if (InletFields.HasLimiter(r) && !coldStart)
        {
            _limiterCold = read(InputId.Column(InletPositions.RT1, LimiterFamily.Cold), null);
            _limiterHot = read(InputId.Column(InletPositions.RT1, LimiterFamily.Hot), null);
            _limiterMax = read(InputId.Column(InletPositions.RT1, LimiterFamily.Current), null);
            _current = read(InputId.Link(LinkNames.MainsCurrent), null);
        }

        _threshold = read(InputId.Column(topology.Rectifier, RectifierRatings.Threshold), null);
        _drift = read(InputId.Column(topology.Rectifier, RectifierRatings.ThresholdDrift), 0);
        _slope = read(InputId.Column(topology.Rectifier, RectifierRatings.Slope), null);
        _capacitive = read(InputId.Column(topology.Rectifier, RectifierRatings.CapacitiveFactor), 1);
        _junction = read(coldStart ? room : InputId.Link(LinkNames.Temperature(topology.Rectifier)), null);
        Basis = topology.Family == BridgeFamily.Id ? read(InputId.Column(topology.Rectifier, BridgeFamily.Basis), null) : -1;
    }

    /// <summary>Place of the transformer's primary voltage.</summary>
    public int Primary { get; }

    /// <summary>Place of the number of secondary halves.</summary>
    public int Halves { get; }

    /// <summary>Place of the lowest frequency for which it is built.</summary>
    public int FrequencyMin { get; }

    /// <summary>Place of the basis of a bridge's current rating; -1 for single diodes.</summary>
    public int Basis { get; }

    public double Frequency(ReadOnlySpan<double> x) => x[_frequency];

    /// <summary>Mains voltage, V rms.</summary>
    public double Voltage(ReadOnlySpan<double> x) => x[_mains] * _nominal;

    /// <summary>Voltage over frequency, as a share of that for which the core is rated.</summary>
    public double Flux(ReadOnlySpan<double> x, double ratedFrequency) =>
        Voltage(x) / x[_frequency] / (x[Primary] / ratedFrequency);

    /// <summary>Share of the rated average current that a reservoir behind the rectifier leaves.</summary>
    public double CapacitiveFactor(ReadOnlySpan<double> x) => x[_capacitive];

    public double Drift(ReadOnlySpan<double> x) => x[_drift];

    public Transformer Transformer(ReadOnlySpan<double> x)
    {
        var t = x[_firstOfTransformer..];
        return new Transformer(t[0], t[1], t[2], t[3], t[4], t[5], t[6], t[7], t[8], t[9], t[10], t[11], _nominalFrequency);
    }

    /// <summary>
    /// The emf's factor: mains over nominal, and the transformer's own tolerance with it. Both multiply the same emf and nothing else
    /// of the secondary, so that the worst of both together is the worst of their product.
    /// </summary>
    public double EmfFactor(ReadOnlySpan<double> x)
    {
        var place = _high > _low ? 2 * (x[_mains] - _low) / (_high - _low) - 1 : 0;
        return x[_mains] * _nominal / x[Primary] * (1 + x[_tolerance] * place);
    }

    /// <summary>The circuit at a condition. A cold winding is on stiff mains, a hot one behind the mains impedance.</summary>
    public RectifierCase Circuit(ReadOnlySpan<double> x, in Transformer t, FrontEndTopology topology, double capacitance, double esr, LoadKind kind, double draw)
    {
        var temperature = x[_air] + x[_winding] * Math.Max(0, x[_windingTemperature] - x[_air]);

        // A single winding with two halves in series feeds a bridge or a half wave with both.
        var whole = topology.Halves == 1;
        var halves = whole ? x[Halves] : 1;
        var turns = t.Turns * halves;
        var resistance = whole ? t.SeriesResistance : t.HalfResistance;
        return new RectifierCase(
            topology.Arrangement,
            x[_frequency],
            t.Voltage * halves * EmfFactor(x),
            Copper.At(resistance, t.MeasuredAt, temperature) + x[_winding] * (_impedance + Limiter(x)) * turns * turns,
            t.HalfLeakage * halves * (t.LeakageIsKnown ? 1 : x[_winding]),
            Math.Max(0, x[_threshold] + x[_drift] * (x[_junction] - 25)),
            x[_slope],
            capacitance,
            esr,
            kind,
            draw);
    }

    /// <summary>The inrush limiter as the steady current keeps it warm, ohm; 0 without one.</summary>
    private double Limiter(ReadOnlySpan<double> x) => _limiterCold < 0 ? 0
        : LimiterLaw.Steady(x[_limiterHot], x[_limiterMax], x[_limiterCold], x[_current]);

    /// <summary>Of the line, ohm.</summary>
    public double MainsImpedance => _impedance;

    /// <summary>Rms current in the primary with the working winding shorted, all of it at the temperature that the axis says, A.</summary>
    public double FaultCurrent(ReadOnlySpan<double> x, FrontEndTopology topology)
    {
        var t = Transformer(x);
        var whole = topology.Halves == 1;
        var turns = t.Turns * (whole ? x[Halves] : 1);
        var temperature = x[_air] + x[_winding] * Math.Max(0, x[_windingTemperature] - x[_air]);
        var resistance = Copper.At(whole ? t.SeriesResistance : t.HalfResistance, t.MeasuredAt, temperature) / (turns * turns) + _impedance;
        var reactance = 2 * Math.PI * x[_frequency] * t.HalfLeakage * (whole ? x[Halves] : 1) / (turns * turns);
        return Voltage(x) / Math.Sqrt(resistance * resistance + reactance * reactance);
    }

    /// <summary>Peak of the current into an empty core with its remanence at the worst, limited by the cold primary alone on stiff mains, A: an upper bound.</summary>
    public double CoreInrush(ReadOnlySpan<double> x, double extraResistance)
    {
        var t = Transformer(x);
        return Math.Sqrt(2) * Voltage(x) / Math.Max(1e-6, Copper.At(t.Primary, t.MeasuredAt, x[_air]) + extraResistance);
    }

    /// <summary>Heat in core and windings, W, and the winding's temperature once it has settled, °C.</summary>
    /// <param name="x">Inputs.</param>
    /// <param name="t">The transformer.</param>
    /// <param name="copper">Loss in the windings as solved, W.</param>
    public (double Loss, double Temperature) Heat(ReadOnlySpan<double> x, in Transformer t, double copper)
    {
        var limit = x[_windingMax];
        var rise = x[_windingRise] > 0 ? x[_windingRise] : Math.Max(1, limit - RatedAir);
        var rated = Copper.At(t.SeriesResistance, t.MeasuredAt, limit) * t.Current * t.Current;
        if (!(rated > 0))
        {
            return (copper, limit);
        }

        var core = (1 / CopperShare - 1) * rated * x[_mains] * x[_mains];
        return (copper + core, x[_air] + rise * CopperShare * (copper + core) / rated);
    }

    /// <summary>Rms current in the primary: the load's by the turns, and the magnetising current at right angles to it, A.</summary>
    public double PrimaryCurrent(ReadOnlySpan<double> x, in Transformer t, FrontEndTopology topology, double secondary)
    {
        var load = topology.Halves == 1 ? t.Turns * x[Halves] * secondary : t.Turns * Math.Sqrt(2) * secondary;
        var magnetising = x[_magnetising] * x[_mains];
        return Math.Sqrt(load * load + magnetising * magnetising);
    }
}
