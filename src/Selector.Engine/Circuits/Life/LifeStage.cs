using System.Collections.Immutable;
using Selector.Engine.Quantities;
using Selector.Engine.Supplies;

namespace Selector.Engine.Circuits.Life;

/// <summary>How long the supply shall last and how it is used: read by whatever wears.</summary>
public sealed class LifeStage : IStage
{
    public string Id => "life";

    public string Name => "life";

    public ImmutableArray<FieldSpec> Fields { get; } =
    [
        new(LifeFields.Hours, "Service life", Units.Hour, new(1, 200_000), "20000 h", "Hours in operation that the supply shall last.") { Group = "Life" },
        new(LifeFields.FullShare, "Time at full load", Units.Percent, new(0, 1), "50 %", "Share of those hours at full load.") { Group = "Life" },
        new(LifeFields.PartLoad, "Load otherwise", Units.Percent, new(0, 1), "30 %", "Share of full load for the rest of the time.") { Group = "Life" },
        new(LifeFields.Ambient, "Ambient, usual", Units.Celsius, new(-40, 100), "30 °C", "Air around the parts, or around the case, over those hours.") { Group = "Life" },
        new(LifeFields.Switchings, "Switchings", Units.One, new(1, 1e6), "10000", "How often it is switched on over its life.") { Group = "Life" },
    ];

    public ImmutableArray<FieldCheck> Checks => [];

    public bool Applies(RequirementValues requirement) => false;

    public StageModel Build(RequirementValues requirement, ImmutableArray<StageModel> before) =>
        throw new InvalidOperationException("Only fields: other stages read them.");
}
