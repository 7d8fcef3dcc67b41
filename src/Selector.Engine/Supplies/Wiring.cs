using System.Collections.Immutable;
using Selector.Engine.Circuits;

namespace Selector.Engine.Supplies;

/// <summary>Where an input of a stage stands: in which array and at which place.</summary>
/// <param name="Kind">Which array.</param>
/// <param name="Index">Axis, link or position.</param>
/// <param name="Column">Rating of the position's family.</param>
/// <param name="Fallback">NaN when there is none.</param>
internal readonly record struct InputSource(InputKind Kind, int Index, int Column, double Fallback);

/// <summary>Names of inputs turned into places in arrays, once per model.</summary>
internal sealed class Wiring
{
    private readonly ImmutableArray<ImmutableArray<InputSource>> _inputs;
    private readonly ImmutableArray<int> _firstLink;

    public Wiring(SupplyModel model)
    {
        var axes = Places(model.Axes.Select(a => a.Id), "axis");
        var links = Places(model.Links.Select(l => l.Name), "link");
        var positions = Places(model.Positions.Select(p => p.Id), "position");
        _inputs = [.. model.Stages.Select(stage => stage.Inputs.Select(Source).ToImmutableArray())];
        var first = 0;
        _firstLink = [.. model.Stages.Select(s => (first += s.Writes.Length) - s.Writes.Length)];
        Loop = [.. Enumerable.Range(0, model.Links.Length).Where(l => !model.Links[l].IsHint && IsReadBack(l))];

        bool IsReadBack(int link) => _inputs
            .Select((inputs, stage) => (inputs, stage))
            .Any(s => s.stage <= Writer(link) && s.inputs.Any(i => i.Kind == InputKind.Link && i.Index == link));

        int Writer(int link) => _firstLink.Select((at, stage) => (at, stage)).Last(s => s.at <= link && model.Stages[s.stage].Writes.Length > 0).stage;

        InputSource Source(InputSpec input) => new(
            input.Id.Kind,
            input.Id.Kind switch
            {
                InputKind.Axis => Place(axes, input.Id.Name, "axis"),
                InputKind.Link => Place(links, input.Id.Name, "link"),
                _ => Place(positions, input.Id.Position, "position"),
            },
            input.Id.Kind == InputKind.Column
                ? model.FamilyOf(model.Positions[Place(positions, input.Id.Position, "position")]).Ordinal(input.Id.Name)
                : -1,
            input.Fallback ?? double.NaN);
    }

    /// <summary>Links that a stage reads before, or while, they are written in a sweep: the loops run through these.</summary>
    public ImmutableArray<int> Loop { get; }

    public ImmutableArray<InputSource> Inputs(int stage) => _inputs[stage];

    /// <summary>Place of the first link of a stage among all links.</summary>
    public int FirstLink(int stage) => _firstLink[stage];

    private static Dictionary<string, int> Places(IEnumerable<string> names, string what)
    {
        var places = new Dictionary<string, int>(StringComparer.Ordinal);
        foreach (var name in names)
        {
            if (!places.TryAdd(name, places.Count))
            {
                throw new InvalidOperationException($"Two stages declare the {what} '{name}'.");
            }
        }

        return places;
    }

    private static int Place(Dictionary<string, int> places, string name, string what) =>
        places.TryGetValue(name, out var place) ? place : throw new InvalidOperationException($"No stage declares the {what} '{name}'.");
}
