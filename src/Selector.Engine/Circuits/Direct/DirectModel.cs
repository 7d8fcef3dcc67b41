using System.Collections.Immutable;
using Selector.Engine.Circuits.Reservoir;
using Selector.Engine.Parts;
using Selector.Engine.Parts.Families;
using Selector.Engine.Quantities;
using Selector.Engine.Supplies;
using static Selector.Engine.Circuits.Dependences;

namespace Selector.Engine.Circuits.Direct;

/// <summary>The bus behind a DC source: one quadratic equation where the regulator draws constant power.</summary>
internal sealed class DirectModel : ReservoirModel
{
    private const string D7 = "D7";

    private static readonly InputId Source = InputId.Axis(DirectStage.Axis);

    private readonly double _resistance;
    private readonly int _source;
    private readonly int _mean;
    private readonly int _max;
    private readonly int _min;
    private readonly int _current;
    private readonly int _threshold = -1, _drift = -1, _slope = -1, _junction = -1, _loss = -1;

    public DirectModel(RequirementValues r)
        : base(r, "multiplier_10k", 1e4)
    {
        _resistance = r[DirectStage.Resistance];
        _source = Read(Source);
        ImmutableArray<Dependence> on = [.. VoltageOn];
        var start = r[DirectStage.Nominal];
        _mean = Write(new(LinkNames.BusMean, Units.Volt, start, [.. on]) { Others = Push.None });
        _max = Write(new(LinkNames.BusMax, Units.Volt, start, [.. on]) { Others = Push.None });
        _current = Write(new(LinkNames.SourceCurrent, Units.Ampere, r[CommonFields.LoadFull], [.. Rises("more draw, more current", DrawLink), .. Falls("less bus for the same power", Source)]) { Others = Push.None });
        _min = Write(new(LinkNames.BusMin, Units.Volt, start, [.. on]) { Others = Push.None });
        if (DirectStage.HasDiode(r))
        {
            _threshold = Read(InputId.Column(D7, RectifierRatings.Threshold));
            _drift = Read(InputId.Column(D7, RectifierRatings.ThresholdDrift), 0);
            _slope = Read(InputId.Column(D7, RectifierRatings.Slope));
            _junction = Read(InputId.Link(LinkNames.Temperature(D7)));
            _loss = Write(new(LinkNames.Loss(D7), Units.Watt, 0.5, [.. Rises("more draw, more loss", DrawLink), .. Falls("less current for the same power", Source)]) { Others = Push.None });
            Heats = [new(D7, LinkNames.Loss(D7), LinkNames.Temperature(D7), RectifierRatings.Cooling, RectifierRatings.JunctionMax) { CaseKey = RectifierRatings.CaseCooling }];
        }

        Axes =
        [
            new(DirectStage.Axis, new(r[DirectStage.Low], r[DirectStage.High]), start, v => $"{QuantityWriter.Write(v, Units.Volt)} DC") { Probes = 3 },
            .. ReservoirCapacitor.Axes(C1),
        ];
        Positions =
        [
            new(C1, "reservoir", CapacitorFamily.Id, 1, CapacitorStandIn(100e-6 * Math.Max(1, r[CommonFields.LoadFull])))
            {
                StandInReason = "100 µF per ampere of load",
            },
            .. DirectStage.HasDiode(r)
                ? [new PositionSpec(D7, "diode against reversal", DiodeFamily.Id, 1, ImmutableDictionary<string, double>.Empty
                    .Add(RectifierRatings.Threshold, 0.4).Add(RectifierRatings.Slope, 0.03).Add(RectifierRatings.Cooling, 40).Add(RectifierRatings.CaseCooling, 5)) { StandInReason = "0.4 V and 30 mΩ" }]
                : ImmutableArray<PositionSpec>.Empty,
        ];
        View = new StageView(["The reservoir stays charged after the source is gone: discharge it and prove it dead."]);
    }

    protected override ImmutableArray<Dependence> VoltageOn =>
    [
        .. Rises("the bus follows the source", Source),
        .. Falls("more power drops more in the source resistance", DrawLink),
    ];

    protected override ImmutableArray<Dependence> RippleOn =>
    [
        .. Rises("it is the ripple", InputId.Link(LinkNames.RegulatorRipple)),
        .. Falls("the multiplier grows with frequency", InputId.Link(LinkNames.RegulatorFrequency)),
    ];

    /// <summary>At rest the capacitor carries no mean current, and the source resistance keeps the ripple in it whatever its size.</summary>
    protected override Push Others => Push.None;

    public override SolveStatus Solve(ReadOnlySpan<double> inputs, Span<double> links, Span<double> stresses, in Budget budget)
    {
        var source = inputs[_source];
        var threshold = _threshold < 0 ? 0 : Math.Max(0, inputs[_threshold] + inputs[_drift] * (inputs[_junction] - 25));
        var resistance = _resistance + (_slope < 0 ? 0 : inputs[_slope]);
        var draw = Draw(inputs);
        source -= threshold;
        var under = source * source - 4 * resistance * draw;
        if (!(source > 0) || (!IsCurrent && under < 0))
        {
            return SolveStatus.NoOperatingPoint;
        }

        // Of a constant power the upper root: the lower one is the unstable point at which the converter pulls the source down.
        var bus = IsCurrent ? source - resistance * draw : (source + Math.Sqrt(under)) / 2;
        if (!(bus > 0))
        {
            return SolveStatus.NoOperatingPoint;
        }

        var current = IsCurrent ? draw : draw / bus;
        links[_current] = current;
        if (_loss >= 0)
        {
            links[_loss] = threshold * current + inputs[_slope] * current * current;
        }

        links[_mean] = links[_max] = links[_min] = bus;
        if (!stresses.IsEmpty)
        {
            WriteReservoir(inputs, stresses, bus, 0, 0, 0);
        }

        return SolveStatus.Solved;
    }
}
