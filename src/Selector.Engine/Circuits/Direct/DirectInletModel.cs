using System.Collections.Immutable;
using Selector.Engine.Circuits.Inlet;
using Selector.Engine.Circuits.Life;
using Selector.Engine.Circuits.Reservoir;
using Selector.Engine.Parts.Families;
using Selector.Engine.Quantities;
using Selector.Engine.Supplies;
using static Selector.Engine.Circuits.Dependences;

namespace Selector.Engine.Circuits.Direct;

/// <summary>What the DC line carries, what its fuse must break, and the surge into the empty reservoir.</summary>
internal sealed class DirectInletModel : StageModel
{
    private const string J1 = "J1";
    private const string F1 = "F1";
    private const string D7 = "D7";
    private const string C1 = "C1";

    /// <summary>Stiffest source and leads that are reckoned with, ohm.</summary>
    private const double Stiffest = 1e-3;

    private readonly double _resistance, _share;
    private readonly bool _hasDiode;
    private readonly int _source, _current, _capacitance, _tolerance, _esr, _place, _esrPlace, _fuse, _opensAt, _busMax;
    private readonly int _inlet, _inletVoltage, _fuseCurrent, _fuseVoltage, _breaking, _clears, _melting;
    private readonly int _average = -1, _reverse = -1, _surge = -1, _integral = -1;

    public DirectInletModel(RequirementValues r)
    {
        _resistance = Math.Max(Stiffest, r[DirectStage.Resistance]);
        _share = PulseWithstand.Share(r[LifeFields.Switchings]);
        _hasDiode = DirectStage.HasDiode(r);
        var (source, current) = (InputId.Axis(DirectStage.Axis), InputId.Link(LinkNames.SourceCurrent));
        var (capacitance, place, esrPlace) = (InputId.Column(C1, CapacitorFamily.Capacitance), InputId.Axis(ReservoirCapacitor.CapacitanceAxis(C1)), InputId.Axis(ReservoirCapacitor.EsrAxis(C1)));
        _source = Read(source);
        _current = Read(current);
        _busMax = Read(InputId.Link(LinkNames.BusMax));
        _capacitance = Read(capacitance);
        _tolerance = Read(InputId.Column(C1, CapacitorFamily.Tolerance), 0.2);
        _esr = Read(InputId.Column(C1, CapacitorFamily.EsrLow));
        _place = Read(place);
        _esrPlace = Read(esrPlace);
        _fuse = Read(InputId.Column(F1, FuseFamily.Current));
        _opensAt = Read(InputId.Column(F1, FuseFamily.OpensAt));
        ImmutableArray<Dependence> carries = [.. Rises("it is that current", current)];
        ImmutableArray<Dependence> charge = [.. Rises("it drives the charge", source), .. Falls("in its way", esrPlace, InputId.Column(C1, CapacitorFamily.EsrLow))];
        ImmutableArray<Dependence> melt = [.. charge, .. Rises("more charge", capacitance, place)];
        _inlet = Stress(new(J1, "current", "current, mean", Units.Ampere, Side.Ceiling, new Bound.Rating(ConnectorFamily.Current), "I = P / V_bus") { On = carries, Others = Push.None });
        _inletVoltage = Stress(new(J1, "voltage", "voltage", Units.Volt, Side.Ceiling, new Bound.Limit(ConnectorFamily.Voltage), "V = greatest source") { On = [.. Rises("it is the source", source)], Others = Push.None, IsMatch = true });
        _fuseCurrent = Stress(new(F1, "current", "current, mean", Units.Ampere, Side.Ceiling, new Bound.Rating(FuseFamily.Current), "I = P / V_bus") { On = carries, Others = Push.None });
        _fuseVoltage = Stress(new(F1, "voltage", "DC voltage", Units.Volt, Side.Ceiling, new Bound.Limit(FuseFamily.VoltageDc), "V = greatest source") { On = [.. Rises("it is the source", source)], Others = Push.None, IsMatch = true });
        _breaking = Stress(new(F1, "breaking-current", "direct current to break", Units.Ampere, Side.Ceiling, new Bound.Limit(FuseFamily.BreakingDc), "I = V / R_source") { On = [.. Rises("it is the source", source)], Others = Push.None });
        _clears = Stress(new(F1, "fault-current", "opening current over fault current, bus shorted", Units.Percent, Side.Ceiling, new Bound.Required(1, DirectStage.Resistance), "s = k I_n R_source / V")
            { On = [.. Falls("it drives the fault", source), .. Rises("it is the fuse", InputId.Column(F1, FuseFamily.Current), InputId.Column(F1, FuseFamily.OpensAt))], Others = Push.None });
        _melting = Stress(new(F1, "melting-integral", "melting integral that connection asks for", Units.AmpereSquaredSecond, Side.Ceiling, new Bound.Rating(FuseFamily.Melting),
            "I²t = C V² / 2 (R_source + ESR) / share left by the number of switchings") { On = melt, Others = Push.None });
        ImmutableArray<PositionSpec> always =
        [
            new(J1, "DC inlet", ConnectorFamily.Id, 1, ImmutableDictionary<string, double>.Empty) { Technologies = [ConnectorFamily.Terminal] },
            new(F1, "fuse in the DC line", FuseFamily.Id, 1, ImmutableDictionary<string, double>.Empty
                .Add(FuseFamily.Current, 2 * r[CommonFields.OutputVoltage] * r[CommonFields.LoadFull] / r[DirectStage.Low]).Add(FuseFamily.OpensAt, 2.75)) { StandInReason = "twice the output power over the least source" },
        ];
        Positions = always;
        if (_hasDiode)
        {
            _average = Stress(new(D7, "average-current", "current, mean", Units.Ampere, Side.Ceiling, new Bound.Rating(RectifierRatings.Average), "I = P / V_bus") { On = carries, Others = Push.None });
            _reverse = Stress(new(D7, "reverse-voltage", "source reversed on a charged reservoir", Units.Volt, Side.Ceiling, new Bound.Rating(RectifierRatings.Reverse), "V = source + top of the bus")
                { On = [.. Rises("both stand across it", source, InputId.Link(LinkNames.BusMax))], Others = Push.None });
            _surge = Stress(new(D7, "surge-current", "surge at connection", Units.Ampere, Side.Ceiling, new Bound.Rating(RectifierRatings.Surge), "I = V / (R_source + ESR)") { On = charge, Others = Push.None });
            _integral = Stress(new(D7, "surge-integral", "surge integral at connection", Units.AmpereSquaredSecond, Side.Ceiling, new Bound.Rating(RectifierRatings.MeltingIntegral), "I²t = C V² / 2 (R_source + ESR)") { On = melt, Others = Push.None });
        }
    }

    public override SolveStatus Solve(ReadOnlySpan<double> x, Span<double> links, Span<double> stresses, in Budget budget)
    {
        if (stresses.IsEmpty)
        {
            return SolveStatus.Solved;
        }

        var source = x[_source];
        var loop = _resistance + ReservoirCapacitor.Esr(x[_esr], x[_esrPlace]);
        var charge = ReservoirCapacitor.Capacitance(x[_capacitance], x[_tolerance], x[_place]) * source * source / (2 * loop);
        stresses[_inlet] = stresses[_fuseCurrent] = x[_current];
        stresses[_inletVoltage] = stresses[_fuseVoltage] = source;
        stresses[_breaking] = source / _resistance;
        stresses[_clears] = x[_opensAt] * x[_fuse] * _resistance / source;
        stresses[_melting] = charge / _share;
        if (_hasDiode)
        {
            stresses[_average] = x[_current];
            stresses[_reverse] = source + x[_busMax];
            stresses[_surge] = source / loop;
            stresses[_integral] = charge;
        }

        return SolveStatus.Solved;
    }
}
