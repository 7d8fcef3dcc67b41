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
    private static readonly InputId Source = InputId.Axis(DirectStage.Axis);

    private readonly double _resistance;
    private readonly int _source;
    private readonly int _mean;
    private readonly int _max;
    private readonly int _min;

    public DirectModel(RequirementValues r)
        : base(r, "multiplier_10k", 1e4)
    {
        _resistance = r[DirectStage.Resistance];
        _source = Read(Source);
        ImmutableArray<Dependence> on = [.. VoltageOn];
        var start = r[DirectStage.Nominal];
        _mean = Write(new(LinkNames.BusMean, Units.Volt, start, [.. on]) { Others = Push.None });
        _max = Write(new(LinkNames.BusMax, Units.Volt, start, [.. on]) { Others = Push.None });
        _min = Write(new(LinkNames.BusMin, Units.Volt, start, [.. on]) { Others = Push.None });
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
        ];
        NotAssessed =
        [
            new("F1", "fuse in the DC line: rating, breaking and fault current"),
            new("J1", "input connector, continuous current"),
            new("D7", "reverse input protection"),
            new(C1, "surge at switch-on"),
                new("R1", "bleeder: power and time to a safe voltage"),
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
        var under = source * source - 4 * _resistance * inputs[Draw];
        if (!IsCurrent && under < 0)
        {
            return SolveStatus.NoOperatingPoint;
        }

        // Of a constant power the upper root: the lower one is the unstable point at which the converter pulls the source down.
        var bus = IsCurrent ? source - _resistance * inputs[Draw] : (source + Math.Sqrt(under)) / 2;
        links[_mean] = links[_max] = links[_min] = bus;
        if (!stresses.IsEmpty)
        {
            WriteReservoir(inputs, stresses, bus, 0, 0);
        }

        return SolveStatus.Solved;
    }
}
