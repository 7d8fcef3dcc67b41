using System.Collections.Immutable;
using Selector.Engine.Circuits.Reservoir;
using Selector.Engine.Circuits.Thermal;
using Selector.Engine.Parts.Families;
using Selector.Engine.Quantities;
using Selector.Engine.Supplies;
using static Selector.Engine.Circuits.Dependences;

namespace Selector.Engine.Circuits.CurrentLimit;

/// <summary>The sense bank R4: n equal resistors in parallel, each with its tolerance; the worst single one is exact over all corners.</summary>
internal sealed class SenseModel : StageModel
{
    private const string R4 = "R4";
    private const string C2 = "C2";
    private const double Reference = 20;

    private static readonly InputId Output = InputId.Axis(CommonFields.OutputAxis);

    private static readonly InputId Current = InputId.Link(LinkNames.OutputCurrent);
    private static readonly InputId Count = InputId.Count(R4);
    private static readonly InputId Resistance = InputId.Column(R4, ResistorFamily.Resistance);
    private static readonly InputId Tolerance = InputId.Column(R4, ResistorFamily.Tolerance);
    private static readonly InputId Drift = InputId.Column(R4, ResistorFamily.Drift);

    private readonly double _target;
    private readonly double _span;
    private readonly int _current, _count, _resistance, _tolerance, _drift;
    private readonly int _series, _loss, _place, _air;
    private readonly double _localRise;
    private readonly int _output, _capacitor, _capacitorTolerance, _capacitorPlace;
    private readonly int _power, _voltage, _error, _pulse;

    public SenseModel(RequirementValues r)
    {
        _target = r[SenseStage.Resistance];
        _span = Math.Max(Math.Abs(r[CommonFields.AmbientHigh] - Reference), Math.Abs(Reference - r[CommonFields.AmbientLow]));
        _current = Read(Current);
        _count = Read(Count);
        _resistance = Read(Resistance);
        _tolerance = Read(Tolerance);
        _drift = Read(Drift, 0);
        _output = Read(Output);
        _capacitor = Read(InputId.Column(C2, CapacitorFamily.Capacitance));
        _capacitorTolerance = Read(InputId.Column(C2, CapacitorFamily.Tolerance), 0.2);
        _capacitorPlace = Read(InputId.Axis(ReservoirCapacitor.CapacitanceAxis(C2)));
        ImmutableArray<Dependence> on = [.. Rises("loss and drop grow with current", Current)];
        _series = Write(new(LinkNames.SeriesResistance, Units.Ohm, _target, [.. Rises("it is the bank", Resistance), .. Falls("in parallel", Count)]) { Others = Push.None });
        var air = Surroundings.Air(r);
        _air = Read(air);
        _localRise = Surroundings.LocalRise(r);
        _loss = Write(new(LinkNames.Loss(R4), Units.Watt, 0.1, [.. on, .. Rises("P = I² R", Resistance), .. Falls("in parallel", Count)]) { Others = Push.None });
        _place = Write(new(LinkNames.Temperature(R4), Units.Celsius, 45, [.. Rises("it is the air around it", air)]) { Others = Push.None });
        OtherLosses = [new(LinkNames.Loss(R4))];
        _power = Stress(new(R4, "power", "power of the worst single resistor", Units.Watt, Side.Ceiling, new Bound.Rating(ResistorFamily.Power),
            "P = I² R over all corners of n tolerances")
            { On = [.. on, .. NotAir(air)], Needs = [new Need(R4, ResistorFamily.Drift, "without drift over temperature")], TemperatureLink = LinkNames.Temperature(R4) });
        _voltage = Stress(new(R4, "voltage", "working voltage", Units.Volt, Side.Ceiling, new Bound.Rating(ResistorFamily.Voltage), "V = I R, bank at its greatest")
            { On = [.. on, .. NotAir(air)] });
        _pulse = Stress(new(R4, "pulse-energy", "pulse when C2 empties into a short", Units.Joule, Side.Ceiling, new Bound.Rating(ResistorFamily.PulseEnergy),
            "E = C V² / 2 in one resistor's share of the bank, as if no other resistance took any")
        {
            On = [.. Rises("it was charged to it", Output), .. Rises("more charge", InputId.Axis(ReservoirCapacitor.CapacitanceAxis(C2)), InputId.Column(C2, CapacitorFamily.Capacitance)), .. Falls("shared", Count)],
            Others = Push.None,
        });
        _error = Stress(new(R4, "resistance-error", "error of the whole bank", Units.Percent, Side.Ceiling, new Bound.Required(r[SenseStage.Accuracy], SenseStage.Accuracy),
            "e = |R / n (1 ± t) − R_asked| / R_asked, t with drift")
            { On = [.. None("a ratio of resistances", Current, air, Output, InputId.Axis(ReservoirCapacitor.CapacitanceAxis(C2)))], Needs = [new Need(R4, ResistorFamily.Drift, "without drift over temperature")] });
        Positions =
        [
            new(R4, "sense bank", ResistorFamily.Id, 1, ImmutableDictionary<string, double>.Empty
                .Add(ResistorFamily.Resistance, _target).Add(ResistorFamily.Tolerance, 0.01))
            {
                StandInReason = "one resistor of the resistance asked, 1 %",
            },
        ];
        NotAssessed =
        [
            new("U2", "difference amplifier and limit loop: reading and limit error"),
        ];
    }

    private static IEnumerable<Dependence> NotAir(InputId air) => [.. None("drift is taken over the whole span of the ambient", air), .. None("of the load, not of a pulse", Output, InputId.Axis(ReservoirCapacitor.CapacitanceAxis(C2)))];

    public override SolveStatus Solve(ReadOnlySpan<double> inputs, Span<double> links, Span<double> stresses, in Budget budget)
    {
        var n = (int)inputs[_count];
        var each = inputs[_resistance];
        links[_series] = each / n;
        links[_loss] = inputs[_current] * inputs[_current] * each / n;
        links[_place] = inputs[_air] + _localRise;
        if (stresses.IsEmpty)
        {
            return SolveStatus.Solved;
        }

        var tolerance = inputs[_tolerance] + inputs[_drift] * _span;
        var status = SenseBank.AtCurrent(n, each, tolerance, inputs[_current], out var bank);
        stresses[_power] = bank.OneWorstPower;
        stresses[_voltage] = inputs[_current] * bank.ParallelMaximum;
        stresses[_pulse] = ReservoirCapacitor.Capacitance(inputs[_capacitor], inputs[_capacitorTolerance], inputs[_capacitorPlace])
            * inputs[_output] * inputs[_output] / 2 / n * (1 + tolerance) / (1 - Math.Min(0.99, tolerance));
        stresses[_error] = Math.Max(Math.Abs(bank.ParallelMaximum - _target), Math.Abs(bank.ParallelMinimum - _target)) / _target;
        return status;
    }
}
