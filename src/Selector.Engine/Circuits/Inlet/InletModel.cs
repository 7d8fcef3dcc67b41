using System.Collections.Immutable;
using Selector.Engine.Circuits.Mains;
using Selector.Engine.Circuits.Thermal;
using Selector.Engine.Parts.Families;
using Selector.Engine.Quantities;
using Selector.Engine.Supplies;
using static Selector.Engine.Circuits.Dependences;
using static Selector.Engine.Circuits.Inlet.InletPositions;

namespace Selector.Engine.Circuits.Inlet;

/// <summary>What the primary circuit carries in use, and whether the fuse clears a shorted secondary.</summary>
internal sealed class InletModel : StageModel
{
    private static readonly InputId Current = InputId.Link(LinkNames.MainsCurrent);
    private static readonly InputId Mains = InputId.Axis(MainsFields.MainsAxis);

    private readonly double _nominal;
    private readonly FrontEndTopology _topology;
    private readonly MainsInputs _transformer;
    private readonly int _current, _mains, _fuse, _opensAt, _loss;
    private readonly int _inlet, _inletVoltage, _switch, _switchVoltage, _fuseCurrent, _fuseVoltage, _breaking, _clears, _largest;
    private readonly int _holderCurrent, _holderVoltage, _holderPower, _limiter = -1, _varistor = -1;

    public InletModel(RequirementValues r)
    {
        _nominal = r[MainsFields.Voltage];
        _topology = FrontEndTopology.Of(r);
        _current = Read(Current);
        _mains = Read(Mains);
        _fuse = Read(InputId.Column(F1, FuseFamily.Current));
        _opensAt = Read(InputId.Column(F1, FuseFamily.OpensAt));
        _loss = Read(InputId.Column(F1, FuseFamily.Loss));
        _transformer = new MainsInputs(Read, r, _topology);
        ImmutableArray<Dependence> carries = [.. Rises("it is that current", Current)];
        _inlet = Carries(J1, "current", "current, rms", new Bound.Rating(ConnectorFamily.Current), carries);
        _inletVoltage = Nominal(J1, ConnectorFamily.Voltage);
        _switch = Carries(S1, "current", "current, rms", new Bound.Rating(SwitchFamily.Current), carries);
        _switchVoltage = Nominal(S1, SwitchFamily.Voltage);
        _fuseCurrent = Carries(F1, "current", "current, rms", new Bound.Rating(FuseFamily.Current), carries);
        _fuseVoltage = Nominal(F1, FuseFamily.VoltageAc);
        _breaking = Stress(new(F1, "breaking-current", "current to break, primary shorted", Units.Ampere, Side.Ceiling, new Bound.Limit(FuseFamily.BreakingAc),
            "I = V_high / Z_mains") { On = [.. Rises("it is the mains", Mains)], Others = Push.None });
        _clears = Stress(new(F1, "fault-current", "opening current over fault current, secondary shorted", Units.Percent, Side.Ceiling, new Bound.Required(1, MainsFields.Impedance),
            "s = k I_n / I_fault, I_fault = V / |Z| of the transformer, hot, behind the mains impedance")
        {
            On =
            [
                .. Falls("it drives the fault", Mains), .. Rises("hot copper hinders it", InputId.Axis(MainsFields.WindingAxis), Surroundings.Air(r), InputId.Link(LinkNames.Temperature("T1"))),
                .. Rises("it is the fuse", InputId.Column(F1, FuseFamily.Current), InputId.Column(F1, FuseFamily.OpensAt)),
                .. Rises("more leakage", InputId.Axis(MainsFields.FrequencyAxis)),
            ],
            Others = Push.None,
        });
        _largest = Stress(new("T1", "fuse", "fuse before it", Units.Ampere, Side.Ceiling, new Bound.Limit(TransformerFamily.FuseMax), "I = rated current of F1")
            { On = [.. Rises("it is the fuse", InputId.Column(F1, FuseFamily.Current))], Others = Push.None, IsMatch = true });
        _holderCurrent = Carries(XF1, "current", "current, rms", new Bound.Rating(FuseHolderFamily.Current), carries);
        _holderVoltage = Nominal(XF1, FuseHolderFamily.Voltage);
        _holderPower = Stress(new(XF1, "power", "heat of the link", Units.Watt, Side.Ceiling, new Bound.Rating(FuseHolderFamily.Power), "P = P_rated (I / I_n)² of F1")
            { On = [.. carries, .. Rises("it is the link's", InputId.Column(F1, FuseFamily.Loss)), .. Falls("a larger link is cooler", InputId.Column(F1, FuseFamily.Current))], Others = Push.None });
        if (InletFields.HasLimiter(r))
        {
            _limiter = Carries(RT1, "steady-current", "current, rms", new Bound.Rating(LimiterFamily.Current), carries);
        }

        if (r.Is(InletFields.Varistor, "yes"))
        {
            _varistor = Stress(new(RV1, "voltage", "highest mains", Units.Volt, Side.Ceiling, new Bound.Rating(VaristorFamily.VoltageAc), "V = greatest mains, rms")
                { On = [.. Rises("it is the mains", Mains)], Others = Push.None });
            NotAssessed = [new(RV1, "energy of surges: take it from the surge standard of the product")];
        }

        Positions = List(r);
    }

    public override SolveStatus Solve(ReadOnlySpan<double> x, Span<double> links, Span<double> stresses, in Budget budget)
    {
        if (stresses.IsEmpty)
        {
            return SolveStatus.Solved;
        }

        var current = x[_current];
        stresses[_inlet] = stresses[_switch] = stresses[_fuseCurrent] = stresses[_holderCurrent] = current;
        stresses[_inletVoltage] = stresses[_switchVoltage] = stresses[_fuseVoltage] = stresses[_holderVoltage] = _nominal;
        var volts = x[_mains] * _nominal;
        stresses[_breaking] = volts / Math.Max(1e-3, _transformer.MainsImpedance);
        stresses[_clears] = x[_opensAt] * x[_fuse] / Math.Max(1e-9, _transformer.FaultCurrent(x, _topology));
        stresses[_largest] = x[_fuse];
        stresses[_holderPower] = x[_loss] * current * current / (x[_fuse] * x[_fuse]);
        if (_limiter >= 0)
        {
            stresses[_limiter] = current;
        }

        if (_varistor >= 0)
        {
            stresses[_varistor] = volts;
        }

        return SolveStatus.Solved;
    }

    private int Carries(string position, string kind, string name, Bound bound, ImmutableArray<Dependence> on) =>
        Stress(new(position, kind, name, Units.Ampere, Side.Ceiling, bound, "I = √( (n I_secondary)² + I_magnetising² )")
        {
            On = on, Others = Push.None, Needs = [new Need("T1", TransformerFamily.Magnetising, "without the magnetising current")],
        });

    private int Nominal(string position, string key) => Stress(new(position, "voltage", "nominal mains", Units.Volt, Side.Ceiling, new Bound.Limit(key), "V = nominal mains, as the rating is of a system")
        { Others = Push.None, IsMatch = true });
}
