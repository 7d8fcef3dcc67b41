using System.Collections.Immutable;
using Selector.Engine.Quantities;
using Selector.Engine.Supplies;
using static Selector.Engine.Circuits.Dependences;

namespace Selector.Engine.Circuits.Thermal;

/// <summary>T = ambient + loss × thermal resistance, for every source of heat. The loss depends on T: the supply solver closes the loop.</summary>
internal sealed class ThermalModel : StageModel
{
    /// <summary>Hotter than this nothing is left of a part, and the loop is running away.</summary>
    private const double Destroyed = 1000;

    private readonly int _ambient;
    private readonly ImmutableArray<(int Loss, int Cooling)> _sources;

    public ThermalModel(ImmutableArray<HeatSource> heats)
    {
        var ambient = InputId.Axis(CommonFields.AmbientAxis);
        _ambient = Read(ambient);
        _sources = [.. heats.Select(h => (Read(InputId.Link(h.LossLink)), Read(InputId.Column(h.Position, h.ResistanceKey))))];
        foreach (var h in heats)
        {
            ImmutableArray<Dependence> on =
            [
                .. Rises("T = ambient + P R", ambient, InputId.Link(h.LossLink), InputId.Column(h.Position, h.ResistanceKey)),
            ];
            Write(new LinkSpec(h.TemperatureLink, Units.Celsius, 60, [.. on]) { Others = Push.None });
            Stress(new StressSpec(h.Position, "junction-temperature", "junction", Units.Celsius, Side.Temperature, new Bound.Rating(h.LimitKey), "T = T_air + P R_ja")
            {
                On = on,
                Others = Push.None,
                Needs = [.. h.Needs],
            });
        }

        NotAssessed = heats.IsEmpty ? [] : [new("HS1", "heat sinks, case and air inside it: each part stands in open air")];
    }

    public override SolveStatus Solve(ReadOnlySpan<double> inputs, Span<double> links, Span<double> stresses, in Budget budget)
    {
        for (var i = 0; i < _sources.Length; i++)
        {
            var junction = inputs[_ambient] + inputs[_sources[i].Loss] * inputs[_sources[i].Cooling];
            if (!(junction < Destroyed))
            {
                return SolveStatus.ThermalRunaway;
            }

            links[i] = junction;
            if (!stresses.IsEmpty)
            {
                stresses[i] = junction;
            }
        }

        return SolveStatus.Solved;
    }
}
