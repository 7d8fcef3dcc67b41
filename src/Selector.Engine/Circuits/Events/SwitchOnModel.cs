using System.Collections.Immutable;
using Selector.Engine.Circuits.Inlet;
using Selector.Engine.Circuits.Life;
using Selector.Engine.Circuits.Mains;
using Selector.Engine.Circuits.Mains.SwitchOn;
using Selector.Engine.Circuits.Reservoir;
using Selector.Engine.Parts.Families;
using Selector.Engine.Quantities;
using Selector.Engine.Supplies;
using static Selector.Engine.Circuits.Dependences;

namespace Selector.Engine.Circuits.Events;

/// <summary>Stresses of fuse, switch, rectifier and limiter at switch-on with an empty reservoir.</summary>
internal sealed class SwitchOnModel : StageModel
{
    private const string C1 = "C1";
    private const string F1 = InletPositions.F1;
    private const string S1 = InletPositions.S1;
    private const string RT1 = InletPositions.RT1;
    private const int Train = 24;
    private const double CoarsePhase = Math.PI / 12;
    private const double FinePhase = Math.PI / 180;

    /// <summary>Surges that follow each other count by the fourth root of their place. Common practice, no source.</summary>
    private const double TrainExponent = 0.25;

    /// <summary>Share of the expected bus from which the regulator draws its full power while the reservoir charges.</summary>
    private const double StartShare = 0.5;

    private readonly FrontEndTopology _topology;
    private readonly MainsInputs _in;
    private readonly double _switchings;
    private readonly double _fullCurrent, _bus;
    private readonly bool _hasLimiter;
    private readonly int _capacitance, _tolerance, _esr, _place, _esrPlace, _air, _cold, _beta, _hot, _restart;
    private readonly int _surge, _integral, _melting, _core, _contacts, _energy = -1;

    public SwitchOnModel(RequirementValues r)
    {
        OnDemand = true;
        _topology = FrontEndTopology.Of(r);
        _switchings = r[LifeFields.Switchings];
        _bus = MainsStandIn.Bus(r);
        _fullCurrent = r[CommonFields.OutputVoltage] * r[CommonFields.LoadFull] / 0.8 / _bus;
        _hasLimiter = InletFields.HasLimiter(r);
        _in = new MainsInputs(Read, r, _topology, coldStart: true);
        var (capacitance, place, esrPlace) = (InputId.Column(C1, CapacitorFamily.Capacitance), InputId.Axis(ReservoirCapacitor.CapacitanceAxis(C1)), InputId.Axis(ReservoirCapacitor.EsrAxis(C1)));
        _capacitance = Read(capacitance);
        _tolerance = Read(InputId.Column(C1, CapacitorFamily.Tolerance), 0.2);
        _esr = Read(InputId.Column(C1, CapacitorFamily.EsrLow));
        _place = Read(place);
        _esrPlace = Read(esrPlace);
        _air = Read(InputId.Axis(CommonFields.AmbientAxis));
        var restart = InputId.Axis(InletFields.RestartAxis);
        if (_hasLimiter)
        {
            _cold = Read(InputId.Column(RT1, LimiterFamily.Cold));
            _beta = Read(InputId.Column(RT1, LimiterFamily.Beta), 3000);
            _hot = Read(InputId.Column(RT1, LimiterFamily.Hot));
            _restart = Read(restart);
            Axes = [new(InletFields.RestartAxis, new(0, 1), 0, v => v > 0.5 ? "hot restart" : "cold start") { EndsOnly = true }];
        }

        ImmutableArray<Dependence> on =
        [
            .. Rises("it drives the charge", InputId.Axis(MainsFields.MainsAxis)), .. Rises("more charge", capacitance, place),
            .. Falls("cold copper and stiff mains limit less", InputId.Axis(MainsFields.WindingAxis)), .. Falls("in the way of the charge", esrPlace),
            .. _hasLimiter ? Rises("a hot limiter limits little", restart) : [],
        ];
        var d = _topology.Rectifier;
        _surge = Stress(new(d, "surge-current", "surge at switch-on", Units.Ampere, Side.Ceiling, new Bound.Rating(RectifierRatings.Surge),
            "I = greatest of i_k k^¼ over the pulses k at the worst phase") { On = on });
        _integral = Stress(new(d, "surge-integral", "surge integral at switch-on", Units.AmpereSquaredSecond, Side.Ceiling, new Bound.Rating(RectifierRatings.MeltingIntegral),
            "I²t of the largest pulse at the worst phase") { On = on });
        _melting = Stress(new(F1, "melting-integral", "melting integral that switch-on asks for", Units.AmpereSquaredSecond, Side.Ceiling, new Bound.Rating(FuseFamily.Melting),
            "I²t = n² Σ ∫ i² dt of the charging pulses / share left by the number of switchings") { On = on });
        _core = Stress(new(F1, "core-inrush", "melting integral that core inrush asks for, at most", Units.AmpereSquaredSecond, Side.Ceiling, new Bound.Rating(FuseFamily.Melting),
            "I²t = ( √2 V / R_primary )² / 4 f / share left by the number of switchings") { On = Core(on), Others = Push.None });
        _contacts = Stress(new(S1, "inrush-current", "peak at switch-on, charge or core", Units.Ampere, Side.Ceiling, new Bound.Rating(SwitchFamily.Inrush),
            "I = greater of n i_peak and √2 V / R_primary") { On = on });
        if (_hasLimiter)
        {
            _energy = Stress(new(RT1, "energy", "heat of one cold start", Units.Joule, Side.Ceiling, new Bound.Rating(LimiterFamily.Energy),
                "E = C V² / 2, as if all of it stayed in the limiter") { On = [.. on.Where(x => x.Input != restart), .. None("of a cold start", restart)] });
        }
    }

    public override SolveStatus Solve(ReadOnlySpan<double> x, Span<double> links, Span<double> stresses, in Budget budget)
    {
        var transformer = _in.Transformer(x);
        var capacitance = ReservoirCapacitor.Capacitance(x[_capacitance], x[_tolerance], x[_place]);
        var circuit = _in.Circuit(x, transformer, _topology, capacitance, ReservoirCapacitor.Esr(x[_esr], x[_esrPlace]), LoadKind.Current, _fullCurrent);
        var turns = transformer.Turns * (_topology.Halves == 1 ? x[_in.Halves] : 1);
        var cold = _hasLimiter ? LimiterLaw.Cold(x[_cold], x[_beta], x[_air]) : 0;
        var limiter = !_hasLimiter ? 0 : x[_restart] > 0.5 ? x[_hot] : cold;
        var status = SwitchOn(circuit, turns, limiter, stresses, out var peak, budget);
        if (status != SolveStatus.Solved)
        {
            return status;
        }

        var core = _in.CoreInrush(x, limiter);
        var share = PulseWithstand.Share(_switchings);
        stresses[_core] = core * core / (4 * _in.Frequency(x)) / share;
        stresses[_contacts] = Math.Max(core, turns * peak);
        if (_hasLimiter)
        {
            var volts = Math.Sqrt(2) * circuit.SecondaryRms;
            stresses[_energy] = capacitance * volts * volts / 2;
        }

        return SolveStatus.Solved;
    }

    private SolveStatus SwitchOn(in RectifierCase circuit, double turns, double limiter, Span<double> stresses, out double peak, in Budget budget)
    {
        peak = 0;
        var c = new SwitchOnCase(circuit with { WindingResistance = circuit.WindingResistance + limiter * turns * turns }, 0, StartShare * _bus);
        var status = SwitchOnSolver.WorstPhase(c, CoarsePhase, FinePhase, budget, out var phase);
        Span<SwitchOnPulse> train = stackalloc SwitchOnPulse[Train];
        train.Clear();
        status = status == SolveStatus.Solved ? SwitchOnSolver.Solve(c with { Phase = phase }, train, budget, out _) : status;
        if (status != SolveStatus.Solved)
        {
            return status;
        }

        var (surge, integral, sum) = (0.0, 0.0, 0.0);
        for (var k = 0; k < train.Length; k++)
        {
            surge = Math.Max(surge, train[k].Peak * Math.Pow(k + 1, TrainExponent));
            integral = Math.Max(integral, train[k].Integral);
            sum += train[k].Integral;
            peak = Math.Max(peak, train[k].Peak);
        }

        stresses[_surge] = surge;
        stresses[_integral] = integral;
        stresses[_melting] = turns * turns * sum / PulseWithstand.Share(_switchings);
        return SolveStatus.Solved;
    }

    private static ImmutableArray<Dependence> Core(ImmutableArray<Dependence> on) =>
    [
        .. Rises("it drives the core", InputId.Axis(MainsFields.MainsAxis)), .. Falls("longer half-waves", InputId.Axis(MainsFields.FrequencyAxis)), .. Falls("cold copper limits less", InputId.Axis(CommonFields.AmbientAxis)),
        .. on.Where(d => d.Input == InputId.Axis(InletFields.RestartAxis)),
        .. None("the primary alone", InputId.Axis(MainsFields.WindingAxis), InputId.Axis(ReservoirCapacitor.CapacitanceAxis(C1)), InputId.Axis(ReservoirCapacitor.EsrAxis(C1)), InputId.Column(C1, CapacitorFamily.Capacitance)),
    ];
}
