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
    private readonly int _winding, _flux, _direct;
    private readonly double _nominal;
    private readonly double _nominalFrequency;

    public MainsStresses(Func<StressSpec, int> stress, FrontEndTopology topology, RequirementValues r, InputId draw, ImmutableArray<Dependence> busOn)
    {
        _nominal = r[MainsFields.Voltage];
        _nominalFrequency = r[MainsFields.Frequency];
        var d = topology.Rectifier;
        _secondary = stress(new(T1, "secondary-current", "secondary current, rms", Units.Ampere, Side.Ceiling, new Bound.Rating(TransformerFamily.Current), "I = √( mean of i² ) of the solved pulses") { On = CurrentOn(topology, draw) });
        _primary = stress(new(T1, "primary-voltage", "nominal mains on the primary", Units.Volt, Side.Ceiling, new Bound.Limit(TransformerFamily.Primary), "V = nominal mains") { Others = Push.None, IsMatch = true });
        _frequency = stress(new(T1, "frequency", "nominal frequency, at least", Units.Hertz, Side.Floor, new Bound.Limit(TransformerFamily.FrequencyMin), "f = nominal mains frequency") { Others = Push.None, IsMatch = true });
        _halves = stress(new(T1, "halves", "secondary halves, at least", Units.One, Side.Floor, new Bound.Required(topology.Halves, MainsFields.FrontEnd), "as the front end needs")
        {
            On = [new Dependence(InputId.Column(T1, TransformerFamily.Halves), Push.Rises, "it is the number itself")],
            Others = Push.None,
            IsMatch = true,
        });
        _winding = stress(new(T1, "winding-temperature", "winding", Units.Celsius, Side.Temperature, new Bound.Rating(TransformerFamily.WindingMax),
            "T = T_air + ΔT_rated (P_copper + P_core) / P_rated, two thirds of it in the copper at rated load")
            { On = CurrentOn(topology, draw), Needs = [new Need(T1, TransformerFamily.Current, "without its rated load") { Lacking = part => !part.Has(TransformerFamily.Current) && !part.Has(TransformerFamily.Power) }] });
        _flux = stress(new(T1, "volt-seconds", "volt-seconds over rated", Units.Percent, Side.Ceiling, new Bound.Limit(TransformerFamily.FluxMax), "φ = (V / f) / (V_rated / f_rated)")
        {
            On =
            [
                .. Rises("it is the mains voltage", InputId.Axis(MainsFields.MainsAxis)), .. Falls("a longer half-wave", InputId.Axis(MainsFields.FrequencyAxis)),
                new Dependence(InputId.Column(T1, TransformerFamily.Primary), Push.Falls, "rated for more"),
            ],
            Others = Push.None,
            Needs = [new Need(T1, TransformerFamily.FrequencyMin, "taken at the nominal frequency")],
        });
        _direct = topology.Arrangement != RectifierArrangement.HalfWave ? -1 : stress(new(T1, "direct-current", "direct current through the core", Units.Ampere, Side.Ceiling,
            new Bound.Limit(TransformerFamily.DirectMax), "I = mean current of the half wave, all in one direction") { On = CurrentOn(topology, draw) });
                _reverse = stress(new(d, "reverse-voltage", "reverse voltage", Units.Volt, Side.Ceiling, new Bound.Rating(RectifierRatings.Reverse), topology.Arrangement == RectifierArrangement.Bridge
            ? "V = greatest voltage across a blocking diode of the bridge" : "V = secondary peak + bus") { On = busOn });
        _average = stress(new(d, "average-current", topology.DiodesInPart > 1 ? "average current, as rated" : "average current", Units.Ampere, Side.Ceiling, new Bound.Rating(RectifierRatings.Average), "I = mean of the diode's pulses; twice that where the part is rated for its DC output; over the share that a capacitive load leaves of the rating") { On = CurrentOn(topology, draw) });
        _peak = stress(new(d, "repetitive-peak", "repetitive peak current", Units.Ampere, Side.Ceiling, new Bound.Rating(RectifierRatings.Peak), "I = top of the solved pulse") { On = CurrentOn(topology, draw) });
    }

    /// <summary>Directions of the currents that the charging pulses bring.</summary>
    public static ImmutableArray<Dependence> CurrentOn(FrontEndTopology topology, InputId draw) =>
    [
        .. Rises("more power needs more current", draw),
        .. None("around the loop of bus and bleeder, whose gain is far below one", InputId.Link(LinkNames.BleederCurrent), InputId.Link(LinkNames.Loss("R1"))),
        .. None("the rectifier sees only the mean power", InputId.Link(LinkNames.RegulatorRipple), InputId.Link(LinkNames.RegulatorFrequency)),
        .. None("around the loop of loss and temperature, whose gain is below one", InputId.Link(LinkNames.Temperature(topology.Rectifier)), InputId.Link(LinkNames.Temperature(T1))),
        .. None("a weight of the reservoir's rating only", [.. FrequencyMultiplier.Keys.Select(k => InputId.Column("C1", k))]),
    ];

    public void Write(ReadOnlySpan<double> inputs, Span<double> stresses, MainsInputs places, in RectifierSolution s, double winding)
    {
        stresses[_secondary] = s.SecondaryRms;
        stresses[_primary] = _nominal;
        stresses[_frequency] = _nominalFrequency;
        stresses[_halves] = inputs[places.Halves];
        stresses[_winding] = winding;
        stresses[_flux] = places.Flux(inputs, inputs[places.FrequencyMin]);
        if (_direct >= 0)
        {
            stresses[_direct] = s.DiodeAverage;
        }

        stresses[_reverse] = s.DiodeReversePeak;
        stresses[_average] = 1 / places.CapacitiveFactor(inputs) * (places.Basis >= 0 && inputs[places.Basis] == BridgeFamily.BasisOutput ? 2 * s.DiodeAverage : s.DiodeAverage);
        stresses[_peak] = s.DiodePeak;
    }
}
