using System.Collections.Immutable;
using Selector.Engine.Supplies;

namespace Selector.Engine.Circuits.Thermal;

/// <summary>Junctions of all parts that give off heat, each to open air by itself.</summary>
public sealed class ThermalStage : IStage
{
    public string Id => "thermal";

    public string Name => "heat";

    public ImmutableArray<FieldSpec> Fields => [];

    public ImmutableArray<FieldCheck> Checks => [];

    public bool Applies(RequirementValues requirement) => true;

    public StageModel Build(RequirementValues requirement, ImmutableArray<StageModel> before) =>
        new ThermalModel([.. before.SelectMany(s => s.Heats)]);
}
