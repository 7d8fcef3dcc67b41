using Selector.Engine.Parts.Families;
using Selector.Engine.Supplies;

namespace Selector.Engine.Circuits.Mains;

/// <summary>What the front end reads besides its reservoir, and the circuit that it makes of it.</summary>
internal sealed class MainsInputs
{
    private const string T1 = "T1";

    /// <summary>Winding limit assumed where the transformer does not state its class: class A in normal use, the lowest (IEC 61558-1, from memory).</summary>
    private const double LeastWindingLimit = 100;

    private readonly int _mains;
    private readonly int _frequency;
    private readonly int _winding;
    private readonly int _ambient;
    private readonly int _noLoad;
    private readonly int _resistance;
    private readonly int _resistanceAt;
    private readonly int _leakage;
    private readonly int _windingMax;
    private readonly int _threshold;
    private readonly int _drift;
    private readonly int _slope;
    private readonly int _junction;

    public MainsInputs(Func<InputId, double?, int> read, FrontEndTopology topology)
    {
        _mains = read(InputId.Axis(MainsStage.MainsAxis), null);
        _frequency = read(InputId.Axis(MainsStage.FrequencyAxis), null);
        _winding = read(InputId.Axis(MainsStage.WindingAxis), null);
        _ambient = read(InputId.Axis(CommonFields.AmbientAxis), null);
        Primary = read(InputId.Column(T1, TransformerFamily.Primary), null);
        Halves = read(InputId.Column(T1, TransformerFamily.Halves), null);
        _noLoad = read(InputId.Column(T1, TransformerFamily.NoLoad), null);
        _resistance = read(InputId.Column(T1, TransformerFamily.Resistance), null);
        _resistanceAt = read(InputId.Column(T1, TransformerFamily.ResistanceAt), null);
        _leakage = read(InputId.Column(T1, TransformerFamily.Leakage), 0);
        _windingMax = read(InputId.Column(T1, TransformerFamily.WindingMax), LeastWindingLimit);
        _threshold = read(InputId.Column(topology.Rectifier, RectifierRatings.Threshold), null);
        _drift = read(InputId.Column(topology.Rectifier, RectifierRatings.ThresholdDrift), 0);
        _slope = read(InputId.Column(topology.Rectifier, RectifierRatings.Slope), null);
        _junction = read(InputId.Link(LinkNames.Temperature(topology.Rectifier)), null);
        Basis = topology.Family == BridgeFamily.Id ? read(InputId.Column(topology.Rectifier, BridgeFamily.Basis), null) : -1;
    }

    /// <summary>Place of the transformer's primary voltage.</summary>
    public int Primary { get; }

    /// <summary>Place of the number of secondary halves.</summary>
    public int Halves { get; }

    /// <summary>Place of the basis of a bridge's current rating; -1 for single diodes.</summary>
    public int Basis { get; }

    /// <summary>The circuit at a condition.</summary>
    public RectifierCase Circuit(ReadOnlySpan<double> inputs, FrontEndTopology topology, double nominal, double capacitance, double esr, double power)
    {
        var temperature = inputs[_ambient] + inputs[_winding] * Math.Max(0, inputs[_windingMax] - inputs[_ambient]);
        var resistance = Copper.At(inputs[_resistance], inputs[_resistanceAt], temperature);

        // A single winding with two halves in series feeds a bridge or a half wave with both.
        var halves = topology.Halves == 1 ? inputs[Halves] : 1;
        return new RectifierCase(
            topology.Arrangement,
            inputs[_frequency],
            inputs[_noLoad] * halves * inputs[_mains] * nominal / inputs[Primary],
            resistance * halves,
            inputs[_leakage] * halves,
            Math.Max(0, inputs[_threshold] + inputs[_drift] * (inputs[_junction] - 25)),
            inputs[_slope],
            capacitance,
            esr,
            LoadKind.Power,
            power);
    }
}
