using System.Collections.Immutable;
using Selector.Engine.Circuits.Reservoir;
using Selector.Engine.Parts.Families;
using Selector.Engine.Quantities;
using Selector.Engine.Supplies;
using static Selector.Engine.Circuits.Dependences;
using static Selector.Engine.Circuits.StepDown.StepDownPositions;

namespace Selector.Engine.Circuits.StepDown;

/// <summary>
/// The converter on its bus: losses and input at the mean of the bus, peaks at its greatest value, duty at its least.
/// </summary>
internal sealed class StepDownModel : StageModel
{
    private static readonly InputId Load = InputId.Axis(CommonFields.LoadAxis);
    private static readonly InputId Output = InputId.Axis(CommonFields.OutputAxis);

    private readonly double _full;
    private readonly StepDownInputs _in;
    private readonly StepDownStresses _stress;
    private readonly StepDownWindow _window;
    private readonly BypassCapacitor _bypass;
    private readonly int _power, _ripple, _frequency, _current, _switchLoss, _diodeLoss, _coilTemperature;
    private readonly int _coilLoss, _switchSlope, _diodeSlope;

    public StepDownModel(RequirementValues r)
    {
        _full = r[CommonFields.LoadFull];
        _in = new StepDownInputs(Read, r);
        _power = Write(new(LinkNames.RegulatorPower, Units.Watt, 0.1 * r[CommonFields.OutputVoltage] * _full,
            [.. Rises("more load, more power", Load, Output), .. BusLoop, .. Heat]));
        _ripple = Write(new(LinkNames.RegulatorRipple, Units.Ampere, _full / 2));
        _frequency = Write(new(LinkNames.RegulatorFrequency, Units.Hertz, 1e5,
            [new Dependence(InputId.Axis(CommonFields.ShortAxis), Push.Unproven, "a part may lower its frequency when shorted")]) { Others = Push.None });
        _current = Write(new(LinkNames.OutputCurrent, Units.Ampere, _full,
            [.. Rises("it is the load", Load)]));
        _switchLoss = Write(new(LinkNames.Loss(U1), Units.Watt, 0.1, [.. Rises("more load, more loss", Load)]));
        _diodeLoss = Write(new(LinkNames.Loss(D5), Units.Watt, 0.1, [.. Rises("more load, more loss", Load)]));
        _coilTemperature = Write(new(LinkNames.Temperature(L1), Units.Celsius, 40, [.. Rises("more load, more current", Load)]));
        _coilLoss = Write(new(LinkNames.Loss(L1), Units.Watt, 0.1, [.. Rises("more load, more current", Load)]));
        _switchSlope = Write(new(LinkNames.LossSlope(U1), Units.WattPerKelvin, 0, [.. Rises("more load, more loss", Load)]));
        _diodeSlope = Write(new(LinkNames.LossSlope(D5), Units.WattPerKelvin, 0, []));
        OtherLosses = [new(LinkNames.Loss(L1))];
        _stress = new StepDownStresses(Stress, r);
        _window = new StepDownWindow(Stress, r);
        _bypass = new BypassCapacitor(Read, Stress, r);
        Positions = List(r);
        Axes =
        [
            new(StepDownStage.InductanceAxis, new(-1, 1), 0, v => v <= -1 ? "L1 low" : v >= 1 ? "L1 high" : "") { Probes = 1 },
            .. ReservoirCapacitor.Axes(C2),
        ];
        Heats =
        [
            new(U1, LinkNames.Loss(U1), LinkNames.Temperature(U1), RegulatorFamily.Cooling, RegulatorFamily.JunctionMax,
                new Need(U1, RegulatorFamily.Transition, "conduction only"), new Need(U1, RegulatorFamily.Quiescent, "without its own consumption"),
                new Need(D5, RectifierRatings.RecoveryCharge, "without clearing the diode's charge"))
            {
                CaseKey = RegulatorFamily.CaseCooling, SlopeLink = LinkNames.LossSlope(U1),
            },
            new(D5, LinkNames.Loss(D5), LinkNames.Temperature(D5), RectifierRatings.Cooling, RectifierRatings.JunctionMax,
                new Need(D5, RectifierRatings.Leakage, "without heating by leakage"))
            {
                CaseKey = RectifierRatings.CaseCooling, SlopeLink = LinkNames.LossSlope(D5),
            },
        ];
        NotAssessed = OpenPoints;
    }

    private static IEnumerable<Dependence> BusLoop => None(
        "around the loop of bus and power, whose gain is below one: it cannot turn a sign",
        InputId.Link(LinkNames.BusMean), InputId.Link(LinkNames.BusMax), InputId.Link(LinkNames.BusMin));

    private static IEnumerable<Dependence> Heat => None(
        "around the loop of loss and temperature, whose gain is below one: it cannot turn a sign",
        InputId.Link(LinkNames.Temperature(U1)), InputId.Link(LinkNames.Temperature(D5)), InputId.Link(LinkNames.Temperature(L1)));

    public override SolveStatus Solve(ReadOnlySpan<double> x, Span<double> links, Span<double> stresses, in Budget budget) =>
        _in.Shorted(x) ? SolveShorted(x, links, stresses, budget) : SolveRunning(x, links, stresses, budget);

    private SolveStatus SolveRunning(ReadOnlySpan<double> x, Span<double> links, Span<double> stresses, in Budget budget)
    {
        var load = _in.Load(x);
        var output = _in.Output(x) + load * _in.Series(x);
        var mean = _in.Circuit(x, _in.BusMean(x), load);
        var status = ConverterSolver.SolveForOutput(mean, output, budget, out var duty, out var s);
        if (status != SolveStatus.Solved)
        {
            return status;
        }

        var own = SwitchingLoss.Transition(mean.InputVoltage, (s.CoilPeak + s.CoilValley) / 2, _in.TransitionTime(x), mean.Frequency)
            + SwitchingLoss.Quiescent(mean.InputVoltage, _in.Quiescent(x))
            + _in.RecoveryLoss(x, mean.InputVoltage, s.CoilValley > 0 ? mean.Frequency : 0);
        var core = _in.CoreLoss(x, s.CoilRipple, mean.Frequency);
        var leakage = _in.LeakageLoss(x, mean.InputVoltage, duty);
        links[_power] = s.InputPower + own + core + leakage;
        links[_ripple] = s.InputCapacitorRms;
        links[_frequency] = mean.Frequency;
        links[_current] = load;
        links[_switchLoss] = s.SwitchLoss + own;
        links[_diodeLoss] = s.DiodeLoss + leakage;
        links[_coilLoss] = s.CoilLoss + core;
        links[_coilTemperature] = _in.CoilTemperature(x, s.CoilLoss, core);
        links[_switchSlope] = _in.SwitchLossSlope(x, s.SwitchRms);
        links[_diodeSlope] = _in.DiodeLossSlope(x, leakage, s.DiodeMean);
        if (stresses.IsEmpty)
        {
            return SolveStatus.Solved;
        }

        _bypass.Write(x, stresses, duty, s.SwitchMean, mean.Frequency, _in.BusMax(x), _in.Air(x));
        return WriteRunning(x, stresses, output, budget);
    }

    private SolveStatus WriteRunning(ReadOnlySpan<double> x, Span<double> stresses, double output, in Budget budget)
    {
        var status = ConverterSolver.SolveForOutput(
            _in.Circuit(x, _in.BusMax(x), _in.Load(x)), output, budget, out _, out var high);
        if (status != SolveStatus.Solved)
        {
            return status;
        }

        status = WriteDuties(x, stresses, output, _in.Load(x), budget);
        _stress.WriteRunning(x, stresses, _in, output, high);
        _window.Write(x, stresses, _in);
        return status;
    }

    /// <summary>Duty at the valley and on-time at the top of the bus. Where the valley is too low for any duty, the averaged law says by how much.</summary>
    private SolveStatus WriteDuties(ReadOnlySpan<double> x, Span<double> stresses, double output, double load, in Budget budget)
    {
        var valley = _in.Circuit(x, _in.BusMin(x), load);
        var status = ConverterSolver.SolveForOutput(valley, output, budget, out var duty, out _);
        if (status == SolveStatus.NoOperatingPoint)
        {
            duty = AveragedLaw.Duty(valley, output, out _) is >= 1 and < 100 and var wanted ? wanted : 100;
        }
        else if (status != SolveStatus.Solved)
        {
            return status;
        }

        status = ConverterSolver.SolveForOutput(
            _in.Circuit(x, _in.BusMax(x), _full), _in.Output(x) + _full * _in.Series(x), budget, out var least, out _);
        _stress.WriteDuties(stresses, duty, status == SolveStatus.Solved ? least / _in.Frequency(x) : 1 / _in.Frequency(x));
        return SolveStatus.Solved;
    }

    private SolveStatus SolveShorted(ReadOnlySpan<double> x, Span<double> links, Span<double> stresses, in Budget budget)
    {
        var circuit = _in.Short(x, _in.BusMean(x));
        var status = ShortCircuit.Solve(circuit, budget, out var s);
        if (status != SolveStatus.Solved)
        {
            return status;
        }

        var own = SwitchingLoss.Transition(circuit.InputVoltage, s.CoilMean, _in.TransitionTime(x), circuit.Frequency)
            + SwitchingLoss.Quiescent(circuit.InputVoltage, _in.Quiescent(x))
            + _in.RecoveryLoss(x, circuit.InputVoltage, s.CoilValley > 0 ? s.PulseRate : 0);
        var core = _in.CoreLoss(x, s.CoilPeak - s.CoilValley, circuit.Frequency);
        var leakage = _in.LeakageLoss(x, circuit.InputVoltage, s.Duty);
        links[_power] = circuit.InputVoltage * s.SwitchMean + own + core + leakage;
        links[_ripple] = Math.Sqrt(Math.Max(0, s.SwitchRms * s.SwitchRms - s.SwitchMean * s.SwitchMean));
        links[_frequency] = circuit.Frequency;
        links[_current] = s.CoilMean;
        links[_switchLoss] = circuit.SwitchDrop * s.SwitchMean + circuit.SwitchResistance * s.SwitchRms * s.SwitchRms + own;
        links[_diodeLoss] = circuit.DiodeThreshold * s.DiodeMean + circuit.DiodeSlope * s.DiodeRms * s.DiodeRms + leakage;
        links[_coilLoss] = s.CoilLoss + core;
        links[_coilTemperature] = _in.CoilTemperature(x, s.CoilLoss, core);
        links[_switchSlope] = _in.SwitchLossSlope(x, s.SwitchRms);
        links[_diodeSlope] = _in.DiodeLossSlope(x, leakage, s.DiodeMean);
        if (stresses.IsEmpty)
        {
            return SolveStatus.Solved;
        }

        _window.Write(x, stresses, _in);
        _bypass.Write(x, stresses, s.Duty, s.SwitchMean, circuit.Frequency, _in.BusMax(x), _in.Air(x));
        status = ShortCircuit.Solve(_in.Short(x, _in.BusMax(x)), budget, out var high);
        if (status == SolveStatus.Solved)
        {
            _stress.WriteDuties(stresses, s.Duty, 1 / _in.Frequency(x));
            _stress.WriteShorted(x, stresses, _in, high);
        }

        return status;
    }
}
