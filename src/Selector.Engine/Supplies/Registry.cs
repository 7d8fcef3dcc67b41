using System.Collections.Frozen;
using System.Collections.Immutable;
using Selector.Engine.Circuits;
using Selector.Engine.Parts;

namespace Selector.Engine.Supplies;

/// <summary>The stages and families that a program knows. The only list of them; everything else asks it.</summary>
public sealed class Registry
{
    private readonly FrozenDictionary<string, FamilySpec> _families;

    /// <param name="stages">In the order of the signal path; a stage may look at the ones before it.</param>
    /// <param name="families">In the order of the catalogue's index.</param>
    /// <exception cref="ArgumentException">Two stages, families or fields have the same name.</exception>
    public Registry(ImmutableArray<IStage> stages, ImmutableArray<FamilySpec> families)
    {
        Stages = stages;
        Families = families;
        Fields = [.. stages.SelectMany(s => s.Fields)];
        Checks = [.. stages.SelectMany(s => s.Checks)];
        _families = families.ToFrozenDictionary(f => f.Id, StringComparer.Ordinal);
        if (Fields.GroupBy(f => f.Key, StringComparer.Ordinal).FirstOrDefault(g => g.Count() > 1) is { } twice)
        {
            throw new ArgumentException($"Two stages declare the field '{twice.Key}'.", nameof(stages));
        }
    }

    public ImmutableArray<IStage> Stages { get; }

    public ImmutableArray<FamilySpec> Families { get; }

    public ImmutableArray<FieldSpec> Fields { get; }

    public ImmutableArray<FieldCheck> Checks { get; }

    /// <exception cref="KeyNotFoundException">No such family.</exception>
    public FamilySpec Family(string id) => _families.TryGetValue(id, out var family)
        ? family : throw new KeyNotFoundException($"There is no family '{id}'.");

    public FamilySpec? FindFamily(string id) => _families.GetValueOrDefault(id);

    /// <summary>A registry with more stages and families after these.</summary>
    public Registry With(ImmutableArray<IStage> stages, ImmutableArray<FamilySpec> families) =>
        new(Stages.AddRange(stages), Families.AddRange(families));
}
