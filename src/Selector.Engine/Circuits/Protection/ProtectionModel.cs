using System.Collections.Immutable;
using Selector.Engine.Circuits.Reservoir;
using Selector.Engine.Parts.Families;
using Selector.Engine.Quantities;
using Selector.Engine.Supplies;
using static Selector.Engine.Circuits.Dependences;

namespace Selector.Engine.Circuits.Protection;

/// <summary>D8: what it blocks in use, and the output capacitor's discharge through it when the input is shorted.</summary>
internal sealed class ProtectionModel : StageModel
{
    private const string D8 = "D8";
    private const string C2 = "C2";

    private readonly bool _toInput;
    private readonly int _output, _short, _busMax, _capacitance, _tolerance, _esr, _slope, _place, _esrPlace;
    private readonly int _reverse, _surge = -1, _integral = -1;

    public ProtectionModel(RequirementValues r)
    {
        _toInput = r.Is(ProtectionFields.Field, ProtectionFields.ToInput);
        var output = InputId.Axis(CommonFields.OutputAxis);
        var (esr, slope) = (InputId.Column(C2, CapacitorFamily.EsrHigh), InputId.Column(D8, RectifierRatings.Slope));
        var (place, esrPlace) = (InputId.Axis(ReservoirCapacitor.CapacitanceAxis(C2)), InputId.Axis(ReservoirCapacitor.EsrAxis(C2)));
        _output = Read(output);
        _short = Read(InputId.Axis(CommonFields.ShortAxis));
        _busMax = Read(InputId.Link(LinkNames.BusMax));
        _capacitance = Read(InputId.Column(C2, CapacitorFamily.Capacitance));
        _tolerance = Read(InputId.Column(C2, CapacitorFamily.Tolerance), 0.2);
        _esr = Read(esr);
        _slope = Read(slope);
        _place = Read(place);
        _esrPlace = Read(esrPlace);
        _reverse = Stress(new(D8, "reverse-voltage", "reverse voltage", Units.Volt, Side.Ceiling, new Bound.Rating(RectifierRatings.Reverse),
            _toInput ? "V = top of the bus, the output shorted" : "V = V_out")
        {
            On = _toInput ? [.. Rises("it is the bus", InputId.Link(LinkNames.BusMax)), .. Falls("the output is against it", output), .. Rises("a short takes the output away", InputId.Axis(CommonFields.ShortAxis))]
                : [.. Rises("it is the output", output), .. Falls("nothing when shorted", InputId.Axis(CommonFields.ShortAxis))],
            Others = Push.None,
        });
        if (_toInput)
        {
            ImmutableArray<Dependence> on =
            [
                .. Rises("it was charged to it", output), .. Falls("less stands in its way", esr, slope, esrPlace), .. Falls("nothing when shorted", InputId.Axis(CommonFields.ShortAxis)),
            ];
            _surge = Stress(new(D8, "surge-current", "surge, input shorted", Units.Ampere, Side.Ceiling, new Bound.Rating(RectifierRatings.Surge), "I = V_out / (ESR + R_d)") { On = on, Others = Push.None });
            _integral = Stress(new(D8, "surge-integral", "surge integral, input shorted", Units.AmpereSquaredSecond, Side.Ceiling, new Bound.Rating(RectifierRatings.MeltingIntegral), "I²t = C V_out² / 2 (ESR + R_d)")
                { On = [.. on, .. Rises("more charge", InputId.Column(C2, CapacitorFamily.Capacitance), place)], Others = Push.None });
        }

        Positions =
        [
            new(D8, _toInput ? "diode from output to input" : "diode across the output", DiodeFamily.Id, 1,
                ImmutableDictionary<string, double>.Empty.Add(RectifierRatings.Slope, 0.05)) { StandInReason = "50 mΩ" },
        ];
        if (!_toInput)
        {
            NotAssessed = [new(D8, "current that a source at the output drives backwards: it depends on that source")];
        }
    }

    public override SolveStatus Solve(ReadOnlySpan<double> inputs, Span<double> links, Span<double> stresses, in Budget budget)
    {
        if (stresses.IsEmpty)
        {
            return SolveStatus.Solved;
        }

        var volts = inputs[_short] > 0.5 ? 0 : inputs[_output];
        stresses[_reverse] = _toInput ? Math.Max(0, inputs[_busMax] - volts) : volts;
        if (_toInput)
        {
            var resistance = Math.Max(1e-6, ReservoirCapacitor.Esr(inputs[_esr], inputs[_esrPlace]) + inputs[_slope]);
            stresses[_surge] = volts / resistance;
            stresses[_integral] = ReservoirCapacitor.Capacitance(inputs[_capacitance], inputs[_tolerance], inputs[_place]) * volts * volts / (2 * resistance);
        }

        return SolveStatus.Solved;
    }
}
