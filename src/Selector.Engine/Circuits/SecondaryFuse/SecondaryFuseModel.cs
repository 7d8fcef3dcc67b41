using System.Collections.Immutable;
using Selector.Engine.Circuits.Mains;
using Selector.Engine.Circuits.Reservoir;
using Selector.Engine.Parts.Families;
using Selector.Engine.Quantities;
using Selector.Engine.Supplies;
using static Selector.Engine.Circuits.Dependences;

namespace Selector.Engine.Circuits.SecondaryFuse;

/// <summary>F2: what it carries, what it must break, and whether the transformer's fault current opens it.</summary>
internal sealed class SecondaryFuseModel : StageModel
{
    private const string F2 = "F2";
    private const string C1 = "C1";

    /// <summary>Rectified mean of a sine over its rms.</summary>
    private const double MeanOverRms = 0.9;

    private readonly bool _onBus;
    private readonly FrontEndTopology _topology;
    private readonly MainsInputs _in;
    private readonly int _fuse, _opensAt, _currentIn, _busMax, _esr, _esrPlace;
    private readonly int _current, _voltage, _breaking, _clears;

    public SecondaryFuseModel(RequirementValues r)
    {
        _onBus = r.Is(SecondaryFuseStage.Field, SecondaryFuseStage.OnBus);
        _topology = FrontEndTopology.Of(r);
        _in = new MainsInputs(Read, r, _topology);
        var current = InputId.Link(_onBus ? LinkNames.BusCurrent : LinkNames.SecondaryCurrent);
        var (esr, esrPlace) = (InputId.Column(C1, CapacitorFamily.EsrLow), InputId.Axis(ReservoirCapacitor.EsrAxis(C1)));
        var (mains, busMax) = (InputId.Axis(MainsFields.MainsAxis), InputId.Link(LinkNames.BusMax));
        var (rated, opens) = (InputId.Column(F2, FuseFamily.Current), InputId.Column(F2, FuseFamily.OpensAt));
        _fuse = Read(rated);
        _opensAt = Read(opens);
        _currentIn = Read(current);
        _busMax = Read(busMax);
        _esr = Read(esr);
        _esrPlace = Read(esrPlace);
        ImmutableArray<Dependence> height = _onBus ? [.. Rises("it is the top of the bus", busMax)] : [.. Rises("it follows the mains", mains)];
        _current = Stress(new(F2, "current", _onBus ? "current, mean" : "current, rms", Units.Ampere, Side.Ceiling, new Bound.Rating(FuseFamily.Current),
            _onBus ? "I = mean current into the regulator" : "I = √( mean of i² ) of the solved pulses") { On = [.. Rises("it is that current", current)], Others = Push.None });
        _voltage = Stress(new(F2, "voltage", _onBus ? "DC voltage" : "secondary voltage, rms", Units.Volt, Side.Ceiling, new Bound.Limit(_onBus ? FuseFamily.VoltageDc : FuseFamily.VoltageAc),
            _onBus ? "V = greatest bus voltage" : "V = secondary without load") { On = height, Others = Push.None });
        _breaking = Stress(new(F2, "breaking-current", _onBus ? "direct current to break, bus shorted" : "current to break, secondary shorted", Units.Ampere, Side.Ceiling,
            new Bound.Limit(_onBus ? FuseFamily.BreakingDc : FuseFamily.BreakingAc), _onBus ? "I = V_bus / ESR of C1, and what the transformer adds" : "I = V / |Z| of the transformer, cold")
        {
            On = [.. height, .. Rises("it drives the fault", mains), .. Falls("in its way", InputId.Axis(MainsFields.WindingAxis), esrPlace, esr)],
        });
        _clears = Stress(new(F2, "fault-current", "opening current over fault current, bus shorted", Units.Percent, Side.Ceiling, new Bound.Required(1, SecondaryFuseStage.Field),
            "s = k I_n / I_fault of the transformer, hot")
        {
            On = [.. Falls("it drives the fault", mains), .. Rises("it is the fuse", rated, opens), .. Rises("hot copper hinders it", InputId.Axis(MainsFields.WindingAxis), InputId.Link(LinkNames.Temperature("T1")))],
        });
        Positions =
        [
            new(F2, _onBus ? "fuse on the bus" : "fuse in the secondary", FuseFamily.Id, 1, ImmutableDictionary<string, double>.Empty
                .Add(FuseFamily.Current, 2 * r[CommonFields.LoadFull]).Add(FuseFamily.OpensAt, 2.75)) { StandInReason = "twice the full load" },
        ];
        NotAssessed = _onBus ? [] : [new(F2, "melting by the charging pulses at switch-on; take n² times that of F1")];
    }

    public override SolveStatus Solve(ReadOnlySpan<double> x, Span<double> links, Span<double> stresses, in Budget budget)
    {
        if (stresses.IsEmpty)
        {
            return SolveStatus.Solved;
        }

        var t = _in.Transformer(x);
        var halves = _topology.Halves == 1 ? x[_in.Halves] : 1;
        var fault = _in.FaultCurrent(x, _topology) / Math.Max(1e-9, t.Turns * halves);
        var discharge = _onBus ? x[_busMax] / Math.Max(1e-4, ReservoirCapacitor.Esr(x[_esr], x[_esrPlace])) : 0;
        stresses[_current] = x[_currentIn];
        stresses[_voltage] = _onBus ? x[_busMax] : t.Voltage * halves * _in.EmfFactor(x);
        stresses[_breaking] = fault + discharge;
        stresses[_clears] = x[_opensAt] * x[_fuse] / Math.Max(1e-9, _onBus ? MeanOverRms * fault : fault);
        return SolveStatus.Solved;
    }
}
