using Selector.Engine.Circuits.Mains;
using Selector.Engine.Circuits.Mains.HoldUp;
using Selector.Engine.Circuits.Reservoir;
using Selector.Engine.Circuits.Thermal;
using Selector.Engine.Parts.Families;
using Selector.Engine.Quantities;
using Selector.Engine.Supplies;
using static Selector.Engine.Circuits.Dependences;

namespace Selector.Engine.Circuits.Events;

/// <summary>The valley of the bus when half a cycle of the mains is missed, against what the regulator needs.</summary>
internal sealed class HoldUpModel : StageModel
{
    private const string C1 = "C1";
    private const string U1 = "U1";

    /// <summary>Stands for a bus that is gone.</summary>
    private const double Hopeless = 100;

    private readonly FrontEndTopology _topology;
    private readonly MainsInputs _in;
    private readonly bool _linear;
    private readonly double _localRise;
    private readonly int _capacitance, _tolerance, _esr, _esrCold, _place, _esrPlace, _air;
    private readonly int _draw, _needed, _neededDrop, _output, _load, _series, _holdUp;

    public HoldUpModel(RequirementValues r)
    {
        OnDemand = true;
        _topology = FrontEndTopology.Of(r);
        _linear = r.Is(CommonFields.Regulation, CommonFields.Linear);
        _localRise = Surroundings.LocalRise(r);
        _in = new MainsInputs(Read, r, _topology);
        var (draw, place, esrPlace) = (InputId.Link(_linear ? LinkNames.RegulatorCurrent : LinkNames.RegulatorPower),
            InputId.Axis(ReservoirCapacitor.CapacitanceAxis(C1)), InputId.Axis(ReservoirCapacitor.EsrAxis(C1)));
        _capacitance = Read(InputId.Column(C1, CapacitorFamily.Capacitance));
        _tolerance = Read(InputId.Column(C1, CapacitorFamily.Tolerance), 0.2);
        _esr = Read(InputId.Column(C1, CapacitorFamily.EsrLow));
        _esrCold = Read(InputId.Column(C1, CapacitorFamily.EsrCold), ColdEsr.Usual);
        _place = Read(place);
        _esrPlace = Read(esrPlace);
        _air = Read(Surroundings.Air(r));
        _draw = Read(draw);
        _needed = Read(InputId.Column(U1, _linear ? LinearRegulatorFamily.Drop : RegulatorFamily.InputMin));
        _neededDrop = _linear ? Read(InputId.Column(U1, LinearRegulatorFamily.DropResistance), 0) : -1;
        _output = Read(InputId.Axis(CommonFields.OutputAxis));
        _load = Read(InputId.Axis(CommonFields.LoadAxis));
        _series = Read(InputId.Link(LinkNames.SeriesResistance));
        _holdUp = Stress(new(C1, "hold-up", "least input needed over valley of a missed half-cycle", Units.Percent, Side.Ceiling, new Bound.Required(1, HoldUpStage.HoldUp),
            "s = V_needed / V_valley of the solved transient")
        {
            On =
            [
                .. Falls("it charges the reservoir", InputId.Axis(MainsFields.MainsAxis)), .. Rises("it draws the reservoir down", draw), .. Falls("more charge", place),
                .. Rises("hot copper charges it less", InputId.Axis(MainsFields.WindingAxis)), .. Rises("in the way of the draw", esrPlace),
                .. Rises("more draw", InputId.Axis(CommonFields.LoadAxis), InputId.Axis(CommonFields.OutputAxis)), .. Rises("more drop", InputId.Link(LinkNames.SeriesResistance)),
                new Dependence(InputId.Axis(MainsFields.FrequencyAxis), Push.Unproven, "a longer gap, but a longer charge before it"),
                new Dependence(Surroundings.Air(r), Push.Unproven, "cold raises the ESR and lowers the copper"),
            ],
            Others = Push.None,
        });
    }

    public override SolveStatus Solve(ReadOnlySpan<double> x, Span<double> links, Span<double> stresses, in Budget budget)
    {
        stresses[_holdUp] = 0;
        if (!(x[_draw] > 0))
        {
            return SolveStatus.Solved;
        }

        var circuit = _in.Circuit(
            x, _in.Transformer(x), _topology, ReservoirCapacitor.Capacitance(x[_capacitance], x[_tolerance], x[_place]),
            ReservoirCapacitor.Esr(x[_esr], x[_esrPlace], x[_esrCold], x[_air] + _localRise), _linear ? LoadKind.Current : LoadKind.Power, x[_draw]);
        var needed = _linear ? x[_output] + x[_load] * x[_series] + x[_needed] + x[_neededDrop] * x[_load] : x[_needed];
        var status = HoldUpSolver.LeastInHalf(circuit, budget, out var least);
        stresses[_holdUp] = status == SolveStatus.Solved && least > needed / Hopeless ? needed / least : Hopeless;
        return status == SolveStatus.NoOperatingPoint ? SolveStatus.Solved : status;
    }
}
