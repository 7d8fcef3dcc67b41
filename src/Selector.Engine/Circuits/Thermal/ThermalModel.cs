using System.Collections.Immutable;
using Selector.Engine.Parts.Families;
using Selector.Engine.Quantities;
using Selector.Engine.Supplies;
using static Selector.Engine.Circuits.Dependences;

namespace Selector.Engine.Circuits.Thermal;

/// <summary>
/// From losses to temperatures: air in the case, heat sink, junctions. The losses depend on the temperatures: the supply solver
/// closes the loop.
/// </summary>
internal sealed class ThermalModel : StageModel
{
    private const string Sink = "HS1";
    private const string Pad = "IN1";

    /// <summary>Hotter than this nothing is left of a part, and the loop is running away.</summary>
    private const double Destroyed = 1000;

    /// <summary>Dry contact of a tab with paste, K/W. Common practice, no source.</summary>
    private const double Paste = 0.5;

    /// <summary>Beyond this gain of the loop of loss and temperature a part is too near to running away. Common practice, no source.</summary>
    private const double GreatestGain = 0.5;

    private static readonly InputId Ambient = InputId.Axis(CommonFields.AmbientAxis);

    private readonly ImmutableArray<Junction> _junctions;
    private readonly ImmutableArray<(int Loss, int Quantity)> _inside;
    private readonly CaseAir? _case;
    private readonly double _pressure;
    private readonly bool _sinkOutside;
    private readonly int _ambient, _sinkCooling = -1, _sinkRise = -1, _pad = -1;
    private readonly int _air = -1, _sinkTemperature = -1, _sinkStress = -1;

    public ThermalModel(RequirementValues r, ImmutableArray<HeatSource> heats, ImmutableArray<LossLink> others)
    {
        _pressure = Altitude.Pressure(r[ThermalStage.HeightAbove]);
        _sinkOutside = !r.Is(ThermalStage.Sink, ThermalStage.NoSink) && r.Is(ThermalStage.SinkPlace, "outside");
        _case = CaseAir.Of(r, _pressure);
        _ambient = Read(Ambient);
        var onSink = heats.Where(h => h.CaseKey is not null && SinkMembers.Has(r, h.Position)).Select(h => h.Position).ToImmutableHashSet();
        var insulated = !onSink.IsEmpty && r.Is(ThermalStage.SinkInsulated, "yes");
        Positions = SinkMembers.Positions(onSink, insulated);
        var inside = heats.Where(h => !_sinkOutside || !onSink.Contains(h.Position)).Select(h => new LossLink(h.LossLink, h.Quantity)).Concat(others).ToImmutableArray();
        _inside = _case is null ? [] : [.. inside.Select(l => (Read(InputId.Link(l.Link)), l.Quantity))];
        if (!onSink.IsEmpty)
        {
            _sinkCooling = Read(InputId.Column(Sink, HeatSinkFamily.Cooling));
            _sinkRise = Read(InputId.Column(Sink, HeatSinkFamily.Rise));
            _pad = insulated ? Read(InputId.Column(Pad, InterfaceFamily.Cooling)) : -1;
        }

        ImmutableArray<Dependence> onAir =
        [
            .. Rises("the room's air comes in", Ambient),
            .. _case is null ? [] : Rises("more heat in the case", LinksOf(inside)),
        ];
        if (_case is not null)
        {
            _air = Write(new LinkSpec(Surroundings.AirLink, Units.Celsius, 45, [.. onAir]) { Others = Push.None });
        }

        var hot = LinksOf([.. heats.Where(h => onSink.Contains(h.Position)).Select(h => new LossLink(h.LossLink))]);
        ImmutableArray<Dependence> onSinkTemperature =
        [
            .. onAir, .. Rises("all parts on it heat the sink", hot), .. Rises("less cooling", InputId.Column(Sink, HeatSinkFamily.Cooling), InputId.Column(Sink, HeatSinkFamily.Rise)),
        ];
        if (!onSink.IsEmpty)
        {
            _sinkTemperature = Write(new LinkSpec(LinkNames.Temperature(Sink), Units.Celsius, 60, [.. onSinkTemperature]) { Others = Push.None });
            _sinkStress = Stress(new StressSpec(Sink, "surface-temperature", "surface", Units.Celsius, Side.Temperature, new Bound.Required(SinkMembers.HotToTouch, ThermalStage.Sink),
                "T = T_air + (Σ P R ΔT_stated^¼)^0.8") { On = onSinkTemperature, Others = Push.None });
        }

        _junctions = [.. heats.Select(h => Declare(h, onSink.Contains(h.Position), onAir, onSinkTemperature))];
    }

    public override SolveStatus Solve(ReadOnlySpan<double> inputs, Span<double> links, Span<double> stresses, in Budget budget)
    {
        var ambient = inputs[_ambient];
        var total = 0.0;
        foreach (var (loss, quantity) in _inside)
        {
            total += quantity * Math.Max(0, inputs[loss]);
        }

        var air = ambient + (_case?.Rise(total, ambient) ?? 0);
        if (_air >= 0)
        {
            links[_air] = air;
        }

        var sink = 0.0;
        if (_sinkTemperature >= 0)
        {
            var power = 0.0;
            foreach (var j in _junctions)
            {
                power += j.OnSink ? j.Quantity * Math.Max(0, inputs[j.Loss]) : 0;
            }

            sink = (_sinkOutside ? ambient : air) + SinkLaw.Rise(power, inputs[_sinkCooling], inputs[_sinkRise], _pressure);
            links[_sinkTemperature] = sink;
            if (!stresses.IsEmpty)
            {
                stresses[_sinkStress] = sink;
            }
        }

        foreach (var j in _junctions)
        {
            var resistance = inputs[j.Cooling] + (!j.OnSink ? 0 : _pad >= 0 ? inputs[_pad] : Paste);
            var temperature = (j.OnSink ? sink : air) + inputs[j.Loss] * resistance;
            if (!(temperature < Destroyed))
            {
                return SolveStatus.ThermalRunaway;
            }

            links[j.Link] = temperature;
            if (!stresses.IsEmpty)
            {
                stresses[j.Stress] = temperature;
                if (j.Gain >= 0)
                {
                    var whole = resistance + (j.OnSink ? j.Quantity * inputs[_sinkCooling] : 0);
                    stresses[j.Gain] = whole * inputs[j.Slope];
                }
            }
        }

        return SolveStatus.Solved;
    }

    private Junction Declare(HeatSource h, bool onSink, ImmutableArray<Dependence> onAir, ImmutableArray<Dependence> onSinkTemperature)
    {
        var cooling = InputId.Column(h.Position, onSink ? h.CaseKey! : h.ResistanceKey);
        ImmutableArray<Dependence> on =
        [
            .. Rises("T = T_air + P R", InputId.Link(h.LossLink), cooling),
            .. (onSink ? onSinkTemperature : onAir).Where(d => d.Input != InputId.Link(h.LossLink)),
            .. onSink && _pad >= 0 ? Rises("less cooling", InputId.Column(Pad, InterfaceFamily.Cooling)) : [],
        ];
        var (loss, place) = (Read(InputId.Link(h.LossLink)), Read(cooling));
        var (slope, gain) = (-1, -1);
        if (h.SlopeLink is { } name)
        {
            slope = Read(InputId.Link(name));
            gain = Stress(new StressSpec(h.Position, "thermal-gain", "gain of the loop of loss and temperature", Units.One, Side.Ceiling, new Bound.Required(GreatestGain, Surroundings.Case),
                "g = R_th dP/dT; at 1 it runs away") { On = [.. Rises("it is the slope", InputId.Link(name)), .. Rises("less cooling", cooling)], Others = Push.None });
        }

        var link = Write(new LinkSpec(h.TemperatureLink, Units.Celsius, 60, [.. on]) { Others = Push.None });
        var stress = Stress(new StressSpec(h.Position, "junction-temperature", "junction", Units.Celsius, Side.Temperature, new Bound.Rating(h.LimitKey),
            onSink ? "T = T_sink + P (R_jc + R_cs)" : "T = T_air + P R_ja") { On = on, Others = Push.None, Needs = [.. h.Needs] });
        return new Junction(loss, place, h.Quantity, onSink, slope, link, stress, gain);
    }

    private static InputId[] LinksOf(ImmutableArray<LossLink> losses) => [.. losses.Select(l => InputId.Link(l.Link))];

    /// <summary>Places of one junction among inputs, links and stresses.</summary>
    private readonly record struct Junction(int Loss, int Cooling, int Quantity, bool OnSink, int Slope, int Link, int Stress, int Gain);
}
