using System.Collections.Immutable;
using Selector.Engine.Circuits.Reservoir;
using Selector.Engine.Parts.Families;
using Selector.Engine.Quantities;
using Selector.Engine.Supplies;
using static Selector.Engine.Circuits.Dependences;

namespace Selector.Engine.Circuits.Bleeder;

/// <summary>R1 across the reservoir: its heat in use, and how long it takes to empty C1 from the highest bus.</summary>
internal sealed class BleederModel : StageModel
{
    private const string R1 = "R1";
    private const string C1 = "C1";

    private readonly double _safe;
    private readonly int _mean, _max, _resistance, _count, _tolerance, _capacitance, _capacitanceTolerance, _place;
    private readonly int _current, _loss, _power, _voltage, _time;

    public BleederModel(RequirementValues r)
    {
        _safe = r[BleederStage.Safe];
        var (mean, max, resistance) = (InputId.Link(LinkNames.BusMean), InputId.Link(LinkNames.BusMax), InputId.Column(R1, ResistorFamily.Resistance));
        var (capacitance, place) = (InputId.Column(C1, CapacitorFamily.Capacitance), InputId.Axis(ReservoirCapacitor.CapacitanceAxis(C1)));
        _mean = Read(mean);
        _max = Read(max);
        _resistance = Read(resistance);
        _count = Read(InputId.Count(R1));
        _tolerance = Read(InputId.Column(R1, ResistorFamily.Tolerance), 0.05);
        _capacitance = Read(capacitance);
        _capacitanceTolerance = Read(InputId.Column(C1, CapacitorFamily.Tolerance), 0.2);
        _place = Read(place);
        ImmutableArray<Dependence> on = [.. Rises("I = V / R", mean), .. Falls("I = V / R", resistance), .. Rises("in parallel", InputId.Count(R1))];
        _current = Write(new(LinkNames.BleederCurrent, Units.Ampere, 0.01, [.. on]) { Others = Push.None });
        _loss = Write(new(LinkNames.Loss(R1), Units.Watt, 0.1, [.. on]) { Others = Push.None });
        OtherLosses = [new(LinkNames.Loss(R1))];
        _power = Stress(new(R1, "power", "power", Units.Watt, Side.Ceiling, new Bound.Rating(ResistorFamily.Power), "P = V_bus² / (R (1 − t)), mean bus") { On = [.. on.Where(d => d.Input != InputId.Count(R1))], Others = Push.None });
        _voltage = Stress(new(R1, "voltage", "working voltage", Units.Volt, Side.Ceiling, new Bound.Rating(ResistorFamily.Voltage), "V = top of the bus") { On = [.. Rises("it is the bus", max)], Others = Push.None });
        _time = Stress(new(R1, "discharge-time", "time to a safe voltage", Units.Second, Side.Ceiling, new Bound.Required(r[BleederStage.Time], BleederStage.Time),
            "t = R (1 + t) C ln(V_bus / V_safe), nothing else drawing") { On = [.. Rises("from higher", max), .. Rises("more to empty", capacitance, place, resistance), .. Falls("in parallel", InputId.Count(R1))], Others = Push.None });
        Positions =
        [
            new(R1, "bleeder", ResistorFamily.Id, 1, ImmutableDictionary<string, double>.Empty.Add(ResistorFamily.Resistance, 2200)) { StandInReason = "2.2 kΩ" },
        ];
    }

    public override SolveStatus Solve(ReadOnlySpan<double> x, Span<double> links, Span<double> stresses, in Budget budget)
    {
        var mean = x[_mean];
        var whole = x[_resistance] / x[_count];
        links[_current] = mean / whole;
        links[_loss] = mean * mean / whole;
        if (!stresses.IsEmpty)
        {
            var capacitance = ReservoirCapacitor.Capacitance(x[_capacitance], x[_capacitanceTolerance], x[_place]);
            stresses[_power] = mean * mean / (x[_resistance] * (1 - Math.Min(0.99, x[_tolerance])));
            stresses[_voltage] = x[_max];
            stresses[_time] = x[_max] > _safe ? whole * (1 + x[_tolerance]) * capacitance * Math.Log(x[_max] / _safe) : 0;
        }

        return SolveStatus.Solved;
    }
}
