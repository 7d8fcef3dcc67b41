using System.Collections.Immutable;
using Selector.Engine.Parts;
using Selector.Engine.Parts.Families;
using Selector.Engine.Quantities;
using Selector.Engine.Supplies;
using static Selector.Engine.Circuits.Dependences;

namespace Selector.Engine.Circuits.Mains;

/// <summary>Stresses of transformer and rectifier.</summary>
internal sealed class MainsStresses
{
    private const string T1 = "T1";

    private readonly int _secondary;
    private readonly int _primary;
    private readonly int _frequency;
    private readonly int _halves;
    private readonly int _reverse;
    private readonly int _average;
    private readonly int _peak;
    private readonly double _nominal;
    private readonly double _nominalFrequency;

    public MainsStresses(Func<StressSpec, int> stress, FrontEndTopology topology, double nominal, double nominalFrequency, ImmutableArray<Dependence> busOn)
    {
        _nominal = nominal;
        _nominalFrequency = nominalFrequency;
        var d = topology.Rectifier;
        _secondary = stress(new(T1, "secondary-current", "secondary current, rms", Units.Ampere, Side.Ceiling, new Bound.Rating(TransformerFamily.Current), "I = √( mean of i² ) of the solved pulses") { On = CurrentOn(topology) });
        _primary = stress(new(T1, "primary-voltage", "nominal mains on the primary", Units.Volt, Side.Ceiling, new Bound.Limit(TransformerFamily.Primary), "V = nominal mains") { Others = Push.None });
        _frequency = stress(new(T1, "frequency", "nominal frequency, at least", Units.Hertz, Side.Floor, new Bound.Limit(TransformerFamily.FrequencyMin), "f = nominal mains frequency") { Others = Push.None });
        _halves = stress(new(T1, "halves", "secondary halves, at least", Units.One, Side.Floor, new Bound.Required(topology.Halves, MainsStage.FrontEnd), "as the front end needs")
        {
            On = [new Dependence(InputId.Column(T1, TransformerFamily.Halves), Push.Rises, "it is the number itself")],
            Others = Push.None,
        });
        _reverse = stress(new(d, "reverse-voltage", "reverse voltage", Units.Volt, Side.Ceiling, new Bound.Rating(RectifierRatings.Reverse), topology.Arrangement == RectifierArrangement.Bridge
            ? "V = greatest voltage across a blocking diode of the bridge" : "V = secondary peak + bus") { On = busOn });
        _average = stress(new(d, "average-current", topology.DiodesInPart > 1 ? "average current, as rated" : "average current", Units.Ampere, Side.Ceiling, new Bound.Rating(RectifierRatings.Average), "I = mean of the diode's pulses; twice that where the part is rated for its DC output") { On = CurrentOn(topology) });
        _peak = stress(new(d, "repetitive-peak", "repetitive peak current", Units.Ampere, Side.Ceiling, new Bound.Rating(RectifierRatings.Peak), "I = top of the solved pulse") { On = CurrentOn(topology) });
    }

    /// <summary>Directions of the currents that the charging pulses bring.</summary>
    public static ImmutableArray<Dependence> CurrentOn(FrontEndTopology topology) =>
    [
        .. Rises("more power needs more current", InputId.Link(LinkNames.RegulatorPower)),
        .. None("the rectifier sees only the mean power", InputId.Link(LinkNames.RegulatorRipple), InputId.Link(LinkNames.RegulatorFrequency)),
        .. None("around the loop of loss and temperature, whose gain is below one", InputId.Link(LinkNames.Temperature(topology.Rectifier))),
        .. None("a weight of the reservoir's rating only", [.. FrequencyMultiplier.Keys.Select(k => InputId.Column("C1", k))]),
    ];

    public void Write(ReadOnlySpan<double> inputs, Span<double> stresses, MainsInputs places, in RectifierSolution s)
    {
        stresses[_secondary] = s.SecondaryRms;
        stresses[_primary] = _nominal;
        stresses[_frequency] = _nominalFrequency;
        stresses[_halves] = inputs[places.Halves];
        stresses[_reverse] = s.DiodeReversePeak;
        stresses[_average] = places.Basis >= 0 && inputs[places.Basis] == BridgeFamily.BasisOutput ? 2 * s.DiodeAverage : s.DiodeAverage;
        stresses[_peak] = s.DiodePeak;
    }
}
