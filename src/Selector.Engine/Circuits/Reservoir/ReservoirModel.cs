using System.Collections.Immutable;
using Selector.Engine.Circuits.Life;
using Selector.Engine.Circuits.Thermal;
using Selector.Engine.Parts;
using Selector.Engine.Parts.Families;
using Selector.Engine.Quantities;
using Selector.Engine.Supplies;
using static Selector.Engine.Circuits.Dependences;

namespace Selector.Engine.Circuits.Reservoir;

/// <summary>What the two front ends share: the reservoir C1 on the bus, and what the regulator draws from it.</summary>
public abstract class ReservoirModel : StageModel
{
    protected const string C1 = "C1";

    /// <summary>Below this share of full power the converter's own loss would be unknown; used only for stand-ins.</summary>
    private const double EverydayEfficiency = 0.8;
    private const double LinearEfficiency = 0.55;

    private readonly int _draw, _bleeder;
    private readonly int _capacitance;
    private readonly int _tolerance;
    private readonly int _esr;
    private readonly int _place;
    private readonly int _esrPlace;
    private readonly int _firstMultiplier;
    private readonly int _voltage;
    private readonly int _ripple;
    private readonly int _temperature;
    private readonly int _esrCold, _lifeRated, _lifeAt, _rippleRise, _rippleRated, _life;
    private readonly int _air;
    private readonly double _localRise;

    protected ReservoirModel(RequirementValues r, string lowestKey, double lowestFrequency)
    {
        FullPower = r[CommonFields.OutputVoltage] * r[CommonFields.LoadFull] / (r.Is(CommonFields.Regulation, CommonFields.Linear) ? LinearEfficiency : EverydayEfficiency);
        _capacitance = Read(InputId.Column(C1, CapacitorFamily.Capacitance));
        _tolerance = Read(InputId.Column(C1, CapacitorFamily.Tolerance), 0.2);
        _esr = Read(InputId.Column(C1, CapacitorFamily.EsrLow));
        _place = Read(InputId.Axis(ReservoirCapacitor.CapacitanceAxis(C1)));
        _esrPlace = Read(InputId.Axis(ReservoirCapacitor.EsrAxis(C1)));
        var air = Surroundings.Air(r);
        _air = Read(air);
        _localRise = Surroundings.LocalRise(r);
        IsCurrent = r.Is(CommonFields.Regulation, CommonFields.Linear);
        DrawLink = InputId.Link(IsCurrent ? LinkNames.RegulatorCurrent : LinkNames.RegulatorPower);
        _draw = Read(DrawLink);
        BleederLink = InputId.Link(IsCurrent ? LinkNames.BleederCurrent : LinkNames.Loss("R1"));
        _bleeder = Read(BleederLink);
        RippleIn = Read(InputId.Link(LinkNames.RegulatorRipple));
        FrequencyIn = Read(InputId.Link(LinkNames.RegulatorFrequency));
        _esrCold = Read(InputId.Column(C1, CapacitorFamily.EsrCold), ColdEsr.Usual);
        _lifeRated = Read(InputId.Column(C1, CapacitorFamily.Life), 0);
        _lifeAt = Read(InputId.Column(C1, CapacitorFamily.TemperatureMax), 85);
        _rippleRise = Read(InputId.Column(C1, CapacitorFamily.RippleRise), 5);
        _rippleRated = Read(InputId.Column(C1, CapacitorFamily.Ripple), 0);
        _firstMultiplier = Inputs.Length;
        foreach (var key in FrequencyMultiplier.Keys)
        {
            Read(InputId.Column(C1, key), 0);
        }

        _voltage = Stress(new(C1, "voltage", "voltage, ripple peak included", Units.Volt, Side.Ceiling, new Bound.Rating(CapacitorFamily.Voltage), "V = greatest bus voltage")
        {
            On = VoltageOn,
            Others = Others,
        });
        _ripple = Stress(new(C1, "ripple-current", "ripple current, weighted", Units.Ampere, Side.Ceiling, new Bound.Rating(CapacitorFamily.Ripple), "I = √( (I_1 / m(f))² + (I_above / m(2 f))² + (I_sw / m(f_sw))² )")
        {
            Needs = [ReservoirCapacitor.RippleTable(C1, lowestKey, lowestFrequency)],
            On = RippleOn,
            Others = Others,
        });
        _life = Stress(new(C1, "life", "life over the load profile, at least", Units.Hour, Side.Floor, LifeFields.Bound(r), LifeFields.Equation)
        {
            Profile = LifeFields.Profile(r),
            Needs =
            [
                new Need(C1, CapacitorFamily.Life, "its life is not known"), new Need(C1, CapacitorFamily.Ripple, "its ripple rating is not known"),
                new Need(C1, CapacitorFamily.TemperatureMax, "its upper temperature is not known"),
            ],
        });
        _temperature = Stress(new(C1, "temperature", "air at its place", Units.Celsius, Side.Temperature, new Bound.Rating(CapacitorFamily.TemperatureMax), "T = T_air + local rise")
        {
            On = [.. Rises("it is the air around it", air)],
            Others = Push.None,
        });
    }

    /// <summary>Rough power from the bus at full load, for stand-ins only, W.</summary>
    protected double FullPower { get; }

    /// <summary>Whether the regulator draws a current of its own, as a series regulator does, instead of a power.</summary>
    protected bool IsCurrent { get; }

    /// <summary>What the regulator draws: a current in A or a power in W.</summary>
    protected InputId DrawLink { get; }

    /// <summary>What the bleeder draws, in the same unit.</summary>
    protected InputId BleederLink { get; }

    /// <summary>What regulator and bleeder draw together, A or W.</summary>
    protected double Draw(ReadOnlySpan<double> inputs) => inputs[_draw] + inputs[_bleeder];

    /// <summary>Places of the links that the regulator writes.</summary>

    protected int RippleIn { get; }

    protected int FrequencyIn { get; }

    /// <summary>Directions of the greatest bus voltage in what the front end reads; the same for link and stress.</summary>
    protected abstract ImmutableArray<Dependence> VoltageOn { get; }

    /// <summary>Directions of the weighted ripple current.</summary>
    protected virtual ImmutableArray<Dependence> RippleOn => [];

    /// <summary>Direction of both in what is not listed.</summary>
    protected virtual Push Others => Push.Unproven;

    protected static ImmutableDictionary<string, double> CapacitorStandIn(double capacitance) => ImmutableDictionary<string, double>.Empty
        .Add(CapacitorFamily.Capacitance, capacitance)
        .Add(CapacitorFamily.EsrLow, 0.2 * 1e-3 / capacitance)
        .Add(CapacitorFamily.EsrHigh, 0.1 * 1e-3 / capacitance);

    protected double CapacitanceAt(ReadOnlySpan<double> inputs) =>
        ReservoirCapacitor.Capacitance(inputs[_capacitance], inputs[_tolerance], inputs[_place]);

    protected double EsrAt(ReadOnlySpan<double> inputs) => 
        ReservoirCapacitor.Esr(inputs[_esr], inputs[_esrPlace], inputs[_esrCold], inputs[_air] + _localRise);

    /// <summary>Writes the stresses of C1.</summary>
    protected void WriteReservoir(ReadOnlySpan<double> inputs, Span<double> stresses, double busMax, double lowRipple, double fundamental, double lowFrequency)
    {
        var table = inputs.Slice(_firstMultiplier, FrequencyMultiplier.Keys.Length);
        stresses[_voltage] = busMax;
        stresses[_ripple] = RippleWeight.Equivalent(table, lowRipple, fundamental, lowFrequency, inputs[RippleIn], inputs[FrequencyIn]);
        stresses[_life] = ElectrolyticLife.Hours(
            inputs[_lifeRated], inputs[_lifeAt], inputs[_rippleRise], inputs[_air] + _localRise, inputs[_rippleRated] > 0 ? stresses[_ripple] / inputs[_rippleRated] : 1);
        stresses[_temperature] = inputs[_air] + _localRise;
    }
}
