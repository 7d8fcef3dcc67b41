using System.Collections.Immutable;
using Selector.Engine.Circuits.Reservoir;
using Selector.Engine.Corners;
using Selector.Engine.Parts;
using Selector.Engine.Parts.Families;
using Selector.Engine.Quantities;
using Selector.Engine.Supplies;
using static Selector.Engine.Circuits.Dependences;

namespace Selector.Engine.Circuits.Mains;

/// <summary>Transformer, rectifier and reservoir, loaded with the power or the current that the regulator draws.</summary>
internal sealed class MainsModel : ReservoirModel
{
    private const string T1 = "T1";

    private static readonly InputId Mains = InputId.Axis(MainsFields.MainsAxis);
    private static readonly InputId Winding = InputId.Axis(MainsFields.WindingAxis);

    private readonly FrontEndTopology _topology;
    private readonly MainsInputs _in;
    private readonly int _mean;
    private readonly int _max;
    private readonly int _min;
    private readonly int _loss;
    private readonly int _start;
    private readonly int _slope;
    private readonly int _secondary, _busCurrent, _current, _winding, _transformerLoss, _slopeOfLoss;
    private readonly MainsStresses _stress;

    public MainsModel(RequirementValues r)
        : this(r, FrontEndTopology.Of(r))
    {
    }

    private MainsModel(RequirementValues r, FrontEndTopology topology)
        : base(r, topology.PulsesPerCycle == 2 ? "multiplier_100" : "multiplier_50",
            topology.PulsesPerCycle * r[MainsFields.Frequency] * (1 - r[MainsFields.FrequencyTolerance]))
    {
        _topology = topology;
        _in = new MainsInputs(Read, r, topology);
        var guess = MainsStandIn.Bus(r);
        _mean = Write(new(LinkNames.BusMean, Units.Volt, guess, [.. BusOn]));
        _max = Write(new(LinkNames.BusMax, Units.Volt, guess, [.. BusOn]));
        _min = Write(new(LinkNames.BusMin, Units.Volt, guess, [.. BusOn]));
        _loss = Write(new(LinkNames.Loss(topology.Rectifier), Units.Watt, 0.5, [.. MainsStresses.CurrentOn(topology, DrawLink)]));
        _start = Write(new("rectifier.start", Units.Volt, 0) { Others = Push.None, IsHint = true });
        _slope = Write(new("rectifier.slope", Units.One, 0) { Others = Push.None, IsHint = true });
        _secondary = Write(new(LinkNames.SecondaryCurrent, Units.Ampere, 1, [.. MainsStresses.CurrentOn(topology, DrawLink)]));
        _busCurrent = Write(new(LinkNames.BusCurrent, Units.Ampere, 1, [.. MainsStresses.CurrentOn(topology, DrawLink)]));
        _current = Write(new(LinkNames.MainsCurrent, Units.Ampere, 0.1, [.. MainsStresses.CurrentOn(topology, DrawLink)]));
        _winding = Write(new(LinkNames.Temperature(T1), Units.Celsius, 60, [.. MainsStresses.CurrentOn(topology, DrawLink)]));
        _transformerLoss = Write(new(LinkNames.Loss(T1), Units.Watt, 1, [.. MainsStresses.CurrentOn(topology, DrawLink)]));
        _slopeOfLoss = Write(new(LinkNames.LossSlope(topology.Rectifier), Units.WattPerKelvin, 0, [.. MainsStresses.CurrentOn(topology, DrawLink)]));
        OtherLosses = [new(LinkNames.Loss(T1))];
        _stress = new MainsStresses(Stress, topology, r, DrawLink, BusOn);
        Axes =
        [
            new(MainsFields.MainsAxis, new(1 - r[MainsFields.Low], 1 + r[MainsFields.High]), 1, MainsWords) { Probes = 3 },
            Around(MainsFields.FrequencyAxis, r[MainsFields.Frequency], r[MainsFields.FrequencyTolerance]),
            new(MainsFields.WindingAxis, new(0, 1), 0.5, v => v <= 0 ? "T1 cold" : v >= 1 ? "T1 hot" : "") { Probes = 0 },
            .. ReservoirCapacitor.Axes(C1),
        ];
        Positions =
        [
            MainsStandIn.Transformer(r, topology, FullPower),
            MainsStandIn.Rectifier(topology),
            new(C1, "reservoir", CapacitorFamily.Id, 1, CapacitorStandIn(MainsStandIn.Reservoir(r, topology, FullPower)))
            {
                StandInReason = "bus ripple of a tenth by C = I / (n f V)",
            },
        ];
        Heats =
        [
            new(topology.Rectifier, LinkNames.Loss(topology.Rectifier), LinkNames.Temperature(topology.Rectifier),
                RectifierRatings.Cooling, RectifierRatings.JunctionMax)
            {
                CaseKey = RectifierRatings.CaseCooling, Quantity = topology.Quantity, SlopeLink = LinkNames.LossSlope(topology.Rectifier),
            },
        ];
        // Against the public tables: constant power straightened over pieces of 2 % of the bus.
        Error = 1e-4;
        View = new StageView(
        [
            "Mains can kill. Only a competent person may work on it: isolate, lock off, and prove dead before you touch anything.",
            "The reservoir stays charged after switching off: discharge it through a resistor and prove it dead.",
            "Bond the case to protective earth and test the bond and the insulation before first use; parts at the mains need the local approvals.",
        ]);
    }

    protected override ImmutableArray<Dependence> VoltageOn => BusOn;

    private ImmutableArray<Dependence> BusOn =>
    [
        .. Rises("the bus follows the secondary", Mains),
        .. Falls("more power drops more in winding and diodes", DrawLink),
        .. None("around the loop of bus and bleeder, whose gain is far below one", BleederLink),
        .. Falls("a hot winding drops more, and has the mains impedance before it", Winding),
        .. None("the rectifier sees only the mean power", InputId.Link(LinkNames.RegulatorRipple), InputId.Link(LinkNames.RegulatorFrequency)),
        .. None("a weight of the ripple rating only", [.. FrequencyMultiplier.Keys.Select(k => InputId.Column(C1, k))]),
    ];

    public override SolveStatus Solve(ReadOnlySpan<double> inputs, Span<double> links, Span<double> stresses, in Budget budget)
    {
        var transformer = _in.Transformer(inputs);
        var circuit = _in.Circuit(inputs, transformer, _topology, CapacitanceAt(inputs), EsrAt(inputs), IsCurrent ? LoadKind.Current : LoadKind.Power, Draw(inputs));
        var status = RectifierSolver.Solve(
            circuit, budget, new RectifierStart(links[_start], links[_slope]), stresses.IsEmpty ? RectifierDetail.Loop : RectifierDetail.All, out var s);
        if (status != SolveStatus.Solved)
        {
            return status;
        }

        links[_start] = s.Next.Voltage;
        links[_slope] = double.IsFinite(s.Next.Slope) ? s.Next.Slope : 0;
        links[_mean] = s.BusMean;
        links[_loss] = s.DiodeLoss * _topology.DiodesInPart;
        links[_secondary] = s.SecondaryRms;
        links[_busCurrent] = s.LoadMean;
        links[_current] = _in.PrimaryCurrent(inputs, transformer, _topology, s.SecondaryRms);
        (links[_transformerLoss], links[_winding]) = _in.Heat(inputs, transformer, s.WindingLoss);
        links[_slopeOfLoss] = Math.Max(0, _in.Drift(inputs)) * s.DiodeAverage * _topology.DiodesInPart;
        if (!stresses.IsEmpty)
        {
            // No loop runs through the extremes of the bus: they are only asked for once the loops are closed.
            links[_max] = s.BusMax;
            links[_min] = s.BusMin;
            WriteReservoir(inputs, stresses, s.BusMax, s.CapacitorRms, s.CapacitorFundamentalRms, _topology.PulsesPerCycle * circuit.Frequency);
            _stress.Write(inputs, stresses, _in, s, links[_winding]);
        }

        return SolveStatus.Solved;
    }

    private static string MainsWords(double share)
    {
        var change = Math.Round((share - 1) * 100, 1);
        return change switch
        {
            0 => "mains nominal",
            > 0 => $"mains +{Plain(change)} %",
            _ => $"mains −{Plain(-change)} %",
        };
    }

    private static AxisSpec Around(string id, double nominal, double tolerance) =>
        new(id, new(nominal * (1 - tolerance), nominal * (1 + tolerance)), nominal, v => QuantityWriter.Write(v, Units.Hertz)) { Probes = 0 };

    private static string Plain(double value) => value.ToString("0.#", System.Globalization.CultureInfo.InvariantCulture);
}
