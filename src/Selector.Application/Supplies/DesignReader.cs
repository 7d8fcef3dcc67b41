using System.Collections.Immutable;
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
        var families = Families(registry, state.Requirement);
        var faults = ImmutableArray.CreateBuilder<string>();
        foreach (var (field, text) in state.Texts.Where(t => SupplyFields.IsFit(t.Key)))
        {
            var position = SupplyFields.PositionOf(field);
            var (fitting, fault) = FittingText.Parse(text, catalogue, registry);
            if (fault is null && fitting is not null && families.TryGetValue(position, out var family) && fitting.Part.Family.Id != family)
            {
                fault = $"{fitting.Part.FullName} is a {fitting.Part.Family.Name}; the position takes a {registry.Family(family).Name}. Choose another.";
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

    /// <summary>Family by position; empty while the requirement has faults, since then there are no positions.</summary>
    private static Dictionary<string, string> Families(Registry registry, Requirement requirement)
    {
        var values = RequirementReader.Read(registry, requirement);
        return values.Ok
            ? SupplyModel.Build(registry, values).Positions.ToDictionary(p => p.Id, p => p.Family, StringComparer.Ordinal)
            : [];
    }
}
