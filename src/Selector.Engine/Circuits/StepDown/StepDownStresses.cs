using System.Collections.Immutable;
using Selector.Engine.Circuits.Life;
using Selector.Engine.Circuits.Output;
using Selector.Engine.Circuits.Reservoir;
using Selector.Engine.Circuits.Thermal;
using Selector.Engine.Parts.Families;
using Selector.Engine.Quantities;
using Selector.Engine.Supplies;
using static Selector.Engine.Circuits.Dependences;
using static Selector.Engine.Circuits.StepDown.StepDownPositions;

namespace Selector.Engine.Circuits.StepDown;

/// <summary>Stresses of the converter's parts: declared once, written running or shorted.</summary>
internal sealed class StepDownStresses
{
    private static readonly InputId Load = InputId.Axis(CommonFields.LoadAxis);
    private static readonly InputId Short = InputId.Axis(CommonFields.ShortAxis);
    private static readonly InputId Inductance = InputId.Axis(StepDownStage.InductanceAxis);
    private static readonly InputId Preload = InputId.Link(LinkNames.PreloadCurrent);
    private static readonly InputId BusMax = InputId.Link(LinkNames.BusMax);
    private static readonly InputId BusMin = InputId.Link(LinkNames.BusMin);
    private static readonly InputId BusMean = InputId.Link(LinkNames.BusMean);

    private readonly int _input, _lockOut, _duty, _onTime, _output, _outputLow, _outputHigh, _switch;
    private readonly int _reverse, _average, _peak;
    private readonly int _saturation, _saturationShort, _rms;
    private readonly int _voltage, _ripple, _outputRipple, _temperature;
    private readonly int _startUp, _leastLoad, _coil, _life;
    private readonly double _volts, _least, _loadLeast;

    public StepDownStresses(Func<StressSpec, int> stress, RequirementValues r)
    {
        _volts = r[CommonFields.OutputVoltage];
        _loadLeast = r[CommonFields.LoadLeast];
        _least = r.Is(CommonFields.OutputAdjust, OutputStage.Adjustable) ? r[CommonFields.OutputLeast] : _volts;
        _input = stress(new(U1, "input-voltage", "input voltage", Units.Volt, Side.Ceiling, new Bound.Rating(RegulatorFamily.InputMax), "V = greatest bus voltage")
            { On = [.. Rises("it is the top of the bus", BusMax)], Others = Push.None });
        _lockOut = stress(new(U1, "input-least", "input at the valley, at least", Units.Volt, Side.Floor, new Bound.Limit(RegulatorFamily.InputMin), "V = least bus voltage")
            { On = [.. Rises("it is the valley of the bus", BusMin)], Others = Push.None });
        _startUp = stress(new(U1, "start-voltage", "input when it starts, at least", Units.Volt, Side.Floor, new Bound.Limit(RegulatorFamily.Start), "V = top of the bus; before the start it stands there")
            { On = [.. Rises("it is the top of the bus", BusMax)], Others = Push.None });
        _leastLoad = stress(new(U1, "load-least", "least load, at least", Units.Ampere, Side.Floor, new Bound.Limit(RegulatorFamily.LoadMin), "I = least load + preload")
            { On = [.. Rises("it is that current", Preload), .. Rises("the preload follows the output", InputId.Axis(CommonFields.OutputAxis))], Others = Push.None });
        _duty = stress(new(U1, "duty", "duty at the valley", Units.Percent, Side.Ceiling, new Bound.Limit(RegulatorFamily.DutyMax), "D at which the mean output is reached")
            { On = [.. Falls("less input, more duty", BusMin), .. Rises("drops grow with load", Load), .. Falls("the limit shortens the duty", Short), .. NotAt(BusMax, BusMean)] });
        _onTime = stress(new(U1, "on-time", "on-time at full load, at least", Units.Second, Side.Floor, new Bound.Limit(RegulatorFamily.OnTimeMin), "t = D / f at the top of the bus")
            { On = [.. Falls("more input, less duty", BusMax), .. None("taken at full load; below it pulses are skipped", Load), .. Rises("when shorted the least on-time is part of the model", Short), .. NotAt(BusMin, BusMean)] });
        _output = stress(new(U1, "output-current", "output current", Units.Ampere, Side.Ceiling, new Bound.Rating(RegulatorFamily.OutputCurrent), "I = load")
            { On = [.. Rises("it is the load", Load)], Others = Push.None });
        _outputLow = stress(new(U1, "output-low", "output, at least", Units.Volt, Side.Floor, new Bound.Limit(RegulatorFamily.OutputMin), "V = output asked") { Others = Push.None, IsMatch = true });
        _outputHigh = stress(new(U1, "output-high", "output", Units.Volt, Side.Ceiling, new Bound.Limit(RegulatorFamily.OutputMax), "V = output asked") { Others = Push.None, IsMatch = true });
        _switch = stress(new(U1, "switch-current", "switch peak before its limit", Units.Ampere, Side.Ceiling, new Bound.Rating(RegulatorFamily.LimitMin), "I = I_load + ΔI / 2, exact") { On = Peak });
        _reverse = stress(new(D5, "reverse-voltage", "reverse voltage", Units.Volt, Side.Ceiling, new Bound.Rating(RectifierRatings.Reverse), "V = greatest bus voltage, the closed switch without drop")
            { On = [.. Rises("it is the top of the bus", BusMax)], Others = Push.None });
        _average = stress(new(D5, "average-current", "average current", Units.Ampere, Side.Ceiling, new Bound.Rating(RectifierRatings.Average), "I = mean of the coil current while the switch is open")
            { On = [.. Rises("more load, more current", Load), .. NotAt(BusMin, BusMean)] });
        _peak = stress(new(D5, "repetitive-peak", "repetitive peak current", Units.Ampere, Side.Ceiling, new Bound.Rating(RectifierRatings.Peak), "I = top of the coil current")
            { On = [.. Rises("more load, more current", Load), .. NotAt(BusMin, BusMean)] });
        _saturation = stress(new(L1, "saturation-current", "peak current in load", Units.Ampere, Side.Ceiling, new Bound.Rating(InductorFamily.Saturation), "I = (I_load + ΔI / 2) over the share of the rating left hot") { On = SaturationOn });
        _saturationShort = stress(new(L1, "saturation-current-short", "peak current in a short", Units.Ampere, Side.Ceiling, new Bound.Rating(InductorFamily.Saturation), "I = greatest limit of U1, or what its least on-time lets through, over the share of the rating left hot")
            { On = [.. Rises("only there", Short), .. None("no load in a short", Load), .. NotAt(BusMin, BusMean)] });
        _rms = stress(new(L1, "rms-current", "rms current", Units.Ampere, Side.Ceiling, new Bound.Rating(InductorFamily.Rms), "I = √( mean of i² )")
            { On = [.. Rises("more load, more current", Load), .. NotAt(BusMin, BusMean)] });
        _coil = stress(new(L1, "temperature", "coil", Units.Celsius, Side.Temperature, new Bound.Rating(InductorFamily.TemperatureMax), "T = T_air + ΔT_rated (P_copper + P_core) / P_rated")
        {
            On = [.. Rises("it is that temperature", InputId.Link(LinkNames.Temperature(L1)))], Others = Push.None,
            Needs = [new Need(L1, InductorFamily.CoreLoss, "without core loss"), new Need(L1, InductorFamily.Rms, "its rise is not known")],
        });
        _voltage = stress(new(C2, "voltage", "voltage, ripple peak included", Units.Volt, Side.Ceiling, new Bound.Rating(CapacitorFamily.Voltage), "V = V_out + I R_series + ripple above the mean") { On = Ripple });
        _ripple = stress(new(C2, "ripple-current", "ripple current, weighted", Units.Ampere, Side.Ceiling, new Bound.Rating(CapacitorFamily.Ripple), "I = I_C / m(f_sw)")
            { Needs = [ReservoirCapacitor.RippleTable(C2, "multiplier_10k", 1e4)], On = [.. Ripple] });
        _outputRipple = stress(new(C2, "output-ripple", "output ripple, peak to peak", Units.Volt, Side.Ceiling, new Bound.Required(r[CommonFields.OutputRipple], CommonFields.OutputRipple), "ΔV at the terminals of C2 with ESR and ESL, exact") { On = Ripple, Needs = [new Need(C2, CapacitorFamily.Esl, "without its series inductance")] });
        _life = stress(new(C2, "life", "life over the load profile, at least", Units.Hour, Side.Floor, LifeFields.Bound(r), LifeFields.Equation)
        {
            Profile = LifeFields.Profile(r),
            Needs = [new Need(C2, CapacitorFamily.Life, "its life is not known"), new Need(C2, CapacitorFamily.Ripple, "its ripple rating is not known"), new Need(C2, CapacitorFamily.TemperatureMax, "its upper temperature is not known")],
        });
        _temperature = stress(new(C2, "temperature", "air at its place", Units.Celsius, Side.Temperature, new Bound.Rating(CapacitorFamily.TemperatureMax), "T = T_air")
            { On = [.. Rises("it is the air around it", Surroundings.Air(r))], Others = Push.None });
    }

    /// <summary>As the peak, but for the heat of the coil, which takes from the rating: with the ambient that is searched.</summary>
    private static ImmutableArray<Dependence> SaturationOn => [.. Peak.Where(d => d.Input != Inductance && d.Input != BusMax)];

    private static ImmutableArray<Dependence> Peak =>
    [
        .. Rises("the peak rides on the load", Load), .. Falls("less inductance, more ripple", Inductance), .. Falls("of the supply in load", Short),
        .. Rises("more input, more ripple for the same output", BusMax), .. NotAt(BusMin, BusMean),
    ];

    private static ImmutableArray<Dependence> Ripple =>
    [
        .. Falls("less inductance, more ripple", Inductance), .. Falls("of the supply in load", Short),
        .. Rises("more input, more ripple for the same output", BusMax), .. NotAt(BusMin, BusMean),
    ];

    public void WriteDuties(Span<double> stresses, double duty, double onTime)
    {
        stresses[_duty] = duty;
        stresses[_onTime] = onTime;
    }

    public void WriteRunning(ReadOnlySpan<double> x, Span<double> stresses, StepDownInputs places, double output, in ConverterSolution high)
    {
        WriteBus(x, stresses, places);
        stresses[_switch] = high.SwitchPeak;
        stresses[_average] = high.DiodeMean;
        stresses[_peak] = high.DiodePeak;
        stresses[_saturation] = high.CoilPeak / places.SaturationLeft(x);
        stresses[_saturationShort] = 0;
        stresses[_life] = places.Life(x, high.OutputCapacitorRms);
        stresses[_rms] = high.CoilRms;
        stresses[_voltage] = Math.Max(output, high.OutputMaximum);
        stresses[_ripple] = places.WeightedRipple(x, high.OutputCapacitorRms);
        stresses[_outputRipple] = high.OutputRipple;
    }

    public void WriteShorted(ReadOnlySpan<double> x, Span<double> stresses, StepDownInputs places, in ShortCircuitSolution high)
    {
        WriteBus(x, stresses, places);
        stresses[_switch] = 0;
        stresses[_average] = high.DiodeMean;
        stresses[_peak] = high.DiodePeak;
        stresses[_saturation] = 0;
        stresses[_saturationShort] = high.CoilPeak / places.SaturationLeft(x);
        stresses[_life] = places.Life(x, 0);
        stresses[_rms] = high.CoilRms;
        stresses[_voltage] = 0;
        stresses[_ripple] = 0;
        stresses[_outputRipple] = 0;
    }

    private void WriteBus(ReadOnlySpan<double> x, Span<double> stresses, StepDownInputs places)
    {
        stresses[_input] = places.BusMax(x);
        stresses[_startUp] = places.BusMax(x);
        stresses[_leastLoad] = _loadLeast + places.Preload(x);
        stresses[_coil] = places.CoilTemperature(x);
        stresses[_lockOut] = places.BusMin(x);
        stresses[_output] = places.Load(x);
        stresses[_outputLow] = _least;
        stresses[_outputHigh] = _volts;
        stresses[_reverse] = places.BusMax(x);
        stresses[_temperature] = places.Air(x);
    }

    private static IEnumerable<Dependence> NotAt(params InputId[] buses) => None("the stress is taken at another point of the bus", buses);
}
