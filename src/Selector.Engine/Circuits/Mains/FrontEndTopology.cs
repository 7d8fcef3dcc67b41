using System.Collections.Immutable;
using Selector.Engine.Parts.Families;
using Selector.Engine.Supplies;

namespace Selector.Engine.Circuits.Mains;

/// <summary>A way to rectify: which positions it has and how the pulses reach the bus.</summary>
/// <param name="Arrangement">For the solver.</param>
/// <param name="Rectifier">Designator of the rectifier.</param>
/// <param name="Role">In words.</param>
/// <param name="Family">Family of the rectifier.</param>
/// <param name="Quantity">Parts in the position.</param>
/// <param name="DiodesInPart">Diodes that share one case.</param>
/// <param name="Halves">Secondary halves that the transformer must have.</param>
/// <param name="PulsesPerCycle">Charging pulses in one mains cycle.</param>
internal sealed record FrontEndTopology(
    RectifierArrangement Arrangement, string Rectifier, string Role, string Family, int Quantity, int DiodesInPart, int Halves, int PulsesPerCycle)
{
    private static readonly ImmutableDictionary<string, FrontEndTopology> All = ImmutableDictionary<string, FrontEndTopology>.Empty
        .Add(MainsFields.BridgePart, new(RectifierArrangement.Bridge, "BR1", "bridge rectifier", BridgeFamily.Id, 1, 4, 1, 2))
        .Add(MainsFields.BridgeDiodes, new(RectifierArrangement.Bridge, "D1-D4", "bridge of four diodes", DiodeFamily.Id, 4, 1, 1, 2))
        .Add(MainsFields.CentreTap, new(RectifierArrangement.CentreTap, "D1-D2", "two diodes at a centre tap", DiodeFamily.Id, 2, 1, 2, 2))
        .Add(MainsFields.HalfWave, new(RectifierArrangement.HalfWave, "D1", "half-wave rectifier", DiodeFamily.Id, 1, 1, 1, 1));

    /// <summary>Diodes in the path of the current.</summary>
    public int InPath => Arrangement == RectifierArrangement.Bridge ? 2 : 1;

    public static FrontEndTopology Of(RequirementValues r) => All.Single(t => r.Is(MainsFields.FrontEnd, t.Key)).Value;
}
