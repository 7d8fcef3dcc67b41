using System.Collections.Immutable;
using Selector.Engine.Circuits.Output;
using Selector.Engine.Circuits.Protection;
using Selector.Engine.Circuits.Thermal;
using Selector.Engine.Parts.Families;
using Selector.Engine.Quantities;
using Selector.Engine.Supplies;
using static Selector.Engine.Circuits.Dependences;

namespace Selector.Engine.Circuits.Series;

/// <summary>Stresses of the series regulator and its output capacitor.</summary>
internal sealed class SeriesStresses
{
    private const string U1 = "U1";
    private const string C2 = "C2";

    private static readonly InputId Load = InputId.Axis(CommonFields.LoadAxis);
    private static readonly InputId Output = InputId.Axis(CommonFields.OutputAxis);
    private static readonly InputId Short = InputId.Axis(CommonFields.ShortAxis);
    private static readonly InputId BusMax = InputId.Link(LinkNames.BusMax);
    private static readonly InputId BusMin = InputId.Link(LinkNames.BusMin);
    private static readonly InputId BusMean = InputId.Link(LinkNames.BusMean);
    private static readonly InputId Rejection = InputId.Column(U1, LinearRegulatorFamily.Rejection);

    private readonly double _least, _greatest, _leastLoad, _full, _hasDiode;
    private readonly int _air, _rejection, _preload;
    private readonly int _input, _differential, _output, _low, _high, _dropOut, _start, _loadMin, _ripple, _reverse;
    private readonly int _voltage, _temperature;

    public SeriesStresses(Func<StressSpec, int> stress, Func<InputId, double?, int> read, RequirementValues r)
    {
        var air = Surroundings.Air(r);
        _air = read(air, null);
        _rejection = read(Rejection, null);
        _preload = read(InputId.Link(LinkNames.PreloadCurrent), null);
        _greatest = r[CommonFields.OutputVoltage];
        _least = r.Is(CommonFields.OutputAdjust, OutputStage.Adjustable) ? r[CommonFields.OutputLeast] : _greatest;
        _leastLoad = r[CommonFields.LoadLeast];
        _full = r[CommonFields.LoadFull];
        _hasDiode = ProtectionFields.HasOutputDiode(r) ? 1 : 0;
        _input = stress(new(U1, "input-voltage", "input voltage", Units.Volt, Side.Ceiling, new Bound.Rating(LinearRegulatorFamily.InputMax), "V = greatest bus voltage")
            { On = [.. Rises("it is the top of the bus", BusMax)], Others = Push.None });
        _differential = stress(new(U1, "differential-voltage", "input to output", Units.Volt, Side.Ceiling, new Bound.Rating(LinearRegulatorFamily.DifferentialMax), "V = greatest bus voltage − output; the whole bus when shorted")
            { On = [.. Rises("it is the top of the bus", BusMax), .. Rises("a short takes the output away", Short), .. Falls("less is left", Output), new Dependence(Load, Push.None, "the sense resistance helps only a little")], Others = Push.None });
        _output = stress(new(U1, "output-current", "output current", Units.Ampere, Side.Ceiling, new Bound.Rating(LinearRegulatorFamily.OutputCurrent), "I = load")
            { On = [.. Rises("it is the load", Load)], Others = Push.None });
        _low = stress(new(U1, "output-low", "output, at least", Units.Volt, Side.Floor, new Bound.Limit(LinearRegulatorFamily.OutputMin), "V = output asked") { Others = Push.None, IsMatch = true });
        _high = stress(new(U1, "output-high", "output", Units.Volt, Side.Ceiling, new Bound.Limit(LinearRegulatorFamily.OutputMax), "V = output asked") { Others = Push.None, IsMatch = true });
        _dropOut = stress(new(U1, "drop-out", "drop-out over what the valley leaves", Units.Percent, Side.Ceiling, new Bound.Required(1, CommonFields.OutputVoltage), "s = (V_do + R_do I) / (V_valley − V_out − I R_series)")
        {
            On =
            [
                .. Falls("more is left in the valley", BusMin), .. Rises("less is left", Output), .. Rises("the drop-out grows, and the drop before it", Load, InputId.Link(LinkNames.PreloadCurrent), InputId.Link(LinkNames.SeriesResistance)),
                .. Rises("it is the drop-out", InputId.Column(U1, LinearRegulatorFamily.Drop), InputId.Column(U1, LinearRegulatorFamily.DropResistance)), .. Falls("not when shorted", Short),
            ],
            Others = Push.None,
        });
        _start = stress(new(U1, "start-up", "load over folded-back limit on the way up", Units.Percent, Side.Ceiling, new Bound.Required(1, CommonFields.LoadFull), "s = greatest of I_full V / V_out over I_limit(V_bus − V), V from 0 to V_out")
        {
            On = [.. Rises("more differential, less limit", BusMax), .. None("taken at full load", Load, Short, BusMin, BusMean), .. None("not in it", air, Rejection)],
            Needs = [new Need(U1, LinearRegulatorFamily.LimitMin, "its least limit is not known")],
        });
        _loadMin = stress(new(U1, "load-least", "least load, at least", Units.Ampere, Side.Floor, new Bound.Limit(LinearRegulatorFamily.LoadMin), "I = least load + preload")
            { On = [.. Rises("it is that current", InputId.Link(LinkNames.PreloadCurrent)), .. Rises("the preload follows the output", Output)], Others = Push.None });
        _ripple = stress(new(U1, "output-ripple", "output ripple, peak to peak", Units.Volt, Side.Ceiling, new Bound.Required(r[CommonFields.OutputRipple], CommonFields.OutputRipple), "ΔV = ripple of the bus / rejection")
            { On = [.. Rises("it is the ripple", BusMax), .. Falls("it is the ripple", BusMin), .. Falls("rejected", Rejection), .. Falls("not when shorted", Short)], Others = Push.None });
        _reverse = stress(new(U1, "reverse-diode", "diode from output to input", Units.One, Side.Floor, new Bound.Limit(LinearRegulatorFamily.ReverseDiode), "1 where the requirement has D8") { Others = Push.None, IsMatch = true });
        _voltage = stress(new(C2, "voltage", "voltage", Units.Volt, Side.Ceiling, new Bound.Rating(CapacitorFamily.Voltage), "V = V_out + I R_series")
            { On = [.. Rises("it is the output", Output), .. Rises("the drop after it", Load, InputId.Link(LinkNames.SeriesResistance)), .. Falls("nothing when shorted", Short)], Others = Push.None });
        _temperature = stress(new(C2, "temperature", "air at its place", Units.Celsius, Side.Temperature, new Bound.Rating(CapacitorFamily.TemperatureMax), "T = T_air")
            { On = [.. Rises("it is the air around it", air)], Others = Push.None });
    }

    public void Write(ReadOnlySpan<double> x, Span<double> stresses, in SeriesPoint p)
    {
        var left = p.BusMin - p.Output;
        stresses[_input] = p.BusMax;
        stresses[_differential] = Math.Max(0, p.BusMax - p.Output);
        stresses[_output] = p.Shorted ? 0 : p.Current;
        stresses[_low] = _least;
        stresses[_high] = _greatest;
        stresses[_dropOut] = p.Shorted ? 0 : left > 0 ? Math.Min(SeriesRegulator.Hopeless, p.Part.DropOut(p.Current) / left) : SeriesRegulator.Hopeless;
        stresses[_start] = p.Part.StartShare(p.BusMax, p.Set, _full);
        stresses[_loadMin] = _leastLoad + x[_preload];
        stresses[_ripple] = p.Shorted ? 0 : (p.BusMax - p.BusMin) / x[_rejection];
        stresses[_reverse] = _hasDiode;
        stresses[_voltage] = p.Output;
        stresses[_temperature] = x[_air];
    }
}
