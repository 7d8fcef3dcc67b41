using System.Collections.Immutable;
using Selector.Engine.Circuits;
using Selector.Engine.Parts;
using Selector.Engine.Supplies;

namespace Selector.Application.Supplies;

/// <summary>A design as read from the texts of a supply.</summary>
/// <param name="Design">Requirement and the fittings that could be read.</param>
/// <param name="Faults">A sentence for each fitting that could not; its position counts as empty.</param>
public sealed record DesignReading(Design Design, ImmutableArray<string> Faults);

/// <summary>Turns the texts of a supply into a design. Never throws on what a store may hold.</summary>
public static class DesignReader
{
    public static DesignReading Read(SupplyState state, CatalogueSnapshot catalogue, Registry registry)
    {
        ArgumentNullException.ThrowIfNull(state);
        var design = new Design(state.Requirement, Design.Empty.Fittings);
        var places = Places(registry, state.Requirement);
        var faults = ImmutableArray.CreateBuilder<string>();
        foreach (var (field, text) in state.Texts.Where(t => SupplyFields.IsFit(t.Key)))
        {
            var position = SupplyFields.PositionOf(field);
            var (fitting, fault) = FittingText.Parse(text, catalogue, registry);
            if (fault is null && fitting is not null && places.TryGetValue(position, out var place) && !place.Takes(fitting.Part))
            {
                fault = $"{fitting.Part.FullName} is a {Kind(fitting.Part.Family, [fitting.Part.Technology])}; the position takes a {Kind(registry.Family(place.Family), place.Technologies)}. Choose another.";
            }

            if (fault is not null)
            {
                faults.Add($"{position}: {fault}");
            }
            else if (fitting is not null)
            {
                design = design.Fit(position, fitting);
            }
        }

        return new DesignReading(design, faults.ToImmutable());
    }

    /// <summary>Positions by name; none while the requirement has faults.</summary>
    private static Dictionary<string, PositionSpec> Places(Registry registry, Requirement requirement)
    {
        var values = RequirementReader.Read(registry, requirement);
        return values.Ok
            ? SupplyModel.Build(registry, values).Positions.ToDictionary(p => p.Id, StringComparer.Ordinal)
            : [];
    }

    /// <summary>"connector", or "connector (terminal)" where the technology tells kinds of use apart.</summary>
    private static string Kind(FamilySpec family, ImmutableArray<string> technologies) =>
        family.Technologies.Length > 1 && !technologies.IsEmpty && technologies[0].Length > 0 ? $"{family.Name} ({string.Join(" or ", technologies)})" : family.Name;
}
