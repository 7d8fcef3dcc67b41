using System.Collections.Frozen;
using System.Collections.Immutable;

namespace Selector.Engine.Parts;

/// <summary>The catalogue at one version, immutable and shared by everybody.</summary>
/// <param name="Version">Counts up with every change of the catalogue.</param>
/// <param name="Families">Parts by family, in the order of their numbers.</param>
public sealed record CatalogueSnapshot(long Version, FrozenDictionary<string, ImmutableArray<Part>> Families)
{
    private readonly FrozenDictionary<int, Part> _byId =
        Families.Values.SelectMany(p => p).Where(p => p.Id != 0).ToFrozenDictionary(p => p.Id);

    public static CatalogueSnapshot Empty { get; } = new(0, FrozenDictionary<string, ImmutableArray<Part>>.Empty);

    /// <summary>Parts of a family; empty for one without.</summary>
    public ImmutableArray<Part> Of(string family) => Families.TryGetValue(family, out var parts) ? parts : [];

    public Part? Find(int id) => _byId.GetValueOrDefault(id);
}
