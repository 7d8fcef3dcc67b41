using System.Collections.Immutable;
using Selector.Engine.Circuits;
using Selector.Engine.Corners;
using Selector.Engine.Parts;

namespace Selector.Engine.Supplies;

/// <summary>A stress with its place in the model.</summary>
/// <param name="Spec">As the stage declares it.</param>
/// <param name="Stage">Place of the stage.</param>
/// <param name="Local">Place among the stage's stresses.</param>
public sealed record StressRef(StressSpec Spec, int Stage, int Local);

/// <summary>
/// The stages that one requirement asks for, wired together: names become places in arrays, directions are followed from axis
/// to stress. Immutable, shared by threads, independent of the parts.
/// </summary>
public sealed class SupplyModel
{
    private SupplyModel(Registry registry, RequirementValues requirement, ImmutableArray<StageModel> stages)
    {
        Registry = registry;
        Requirement = requirement;
        Stages = stages;
        Positions = [.. stages.SelectMany(s => s.Positions)];
        Axes = [.. stages.SelectMany(s => s.Axes)];
        Links = [.. stages.SelectMany(s => s.Writes)];
        Stresses = [.. stages.SelectMany((s, i) => s.Stresses.Select((spec, local) => new StressRef(spec, i, local)))];
        Wiring = new Wiring(this);
        Directions = new Directions(this);
        AmbientAxis = Axes.FindIndex(a => a.Id == CommonFields.AmbientAxis);
    }

    public Registry Registry { get; }

    public RequirementValues Requirement { get; }

    public ImmutableArray<StageModel> Stages { get; }

    /// <summary>In the order of the signal path.</summary>
    public ImmutableArray<PositionSpec> Positions { get; }

    public ImmutableArray<AxisSpec> Axes { get; }

    public ImmutableArray<LinkSpec> Links { get; }

    public ImmutableArray<StressRef> Stresses { get; }

    /// <summary>Place of the ambient temperature among the axes; -1 when no stage brings it in.</summary>
    public int AmbientAxis { get; }

    internal Wiring Wiring { get; }

    internal Directions Directions { get; }

    /// <summary>Builds the model of a requirement.</summary>
    /// <exception cref="ArgumentException">The requirement has faults.</exception>
    /// <exception cref="InvalidOperationException">Stages contradict each other: a programming error, named.</exception>
    public static SupplyModel Build(Registry registry, RequirementValues requirement)
    {
        if (!requirement.Ok)
        {
            throw new ArgumentException("The requirement has faults; there is nothing to build.", nameof(requirement));
        }

        var stages = ImmutableArray<StageModel>.Empty;
        foreach (var stage in registry.Stages.Where(s => s.Applies(requirement)))
        {
            stages = stages.Add(stage.Build(requirement, stages));
        }

        return new SupplyModel(registry, requirement, stages);
    }

    public int PositionOrdinal(string id) => Positions.FindIndex(p => p.Id == id);

    public FamilySpec FamilyOf(PositionSpec position) => Registry.Family(position.Family);
}

/// <summary>Search that immutable arrays lack.</summary>
internal static class ImmutableArraySearch
{
    public static int FindIndex<T>(this ImmutableArray<T> items, Func<T, bool> match)
    {
        for (var i = 0; i < items.Length; i++)
        {
            if (match(items[i]))
            {
                return i;
            }
        }

        return -1;
    }
}
