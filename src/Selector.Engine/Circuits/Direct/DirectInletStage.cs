using System.Collections.Immutable;
using Selector.Engine.Circuits.Output;
using Selector.Engine.Supplies;

namespace Selector.Engine.Circuits.Direct;

/// <summary>From a DC source to the reservoir: connector, fuse with DC breaking, and the diode against reversal where asked.</summary>
public sealed class DirectInletStage : IStage
{
    public string Id => "direct-inlet";

    public string Name => "DC inlet and fuse";

    public ImmutableArray<FieldSpec> Fields => [];

    public ImmutableArray<FieldCheck> Checks => [];

    public bool Applies(RequirementValues requirement) => requirement.Is(CommonFields.Source, OutputStage.SourceDirect);

    public StageModel Build(RequirementValues requirement, ImmutableArray<StageModel> before) => new DirectInletModel(requirement);
}
