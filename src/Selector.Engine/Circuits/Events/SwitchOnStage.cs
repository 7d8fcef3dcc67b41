using System.Collections.Immutable;
using Selector.Engine.Circuits.Output;
using Selector.Engine.Supplies;

namespace Selector.Engine.Circuits.Events;

/// <summary>Switch-on with an empty reservoir: solved only where it may be worst.</summary>
public sealed class SwitchOnStage : IStage
{
    public string Id => "switch-on";

    public string Name => "switch-on";

    public ImmutableArray<FieldSpec> Fields => [];

    public ImmutableArray<FieldCheck> Checks => [];

    public bool Applies(RequirementValues requirement) => requirement.Is(CommonFields.Source, OutputStage.SourceMains);

    public StageModel Build(RequirementValues requirement, ImmutableArray<StageModel> before) => new SwitchOnModel(requirement);
}
