using System.Collections.Immutable;
using Selector.Engine.Supplies;

namespace Selector.Engine.Circuits.Series;

/// <summary>Linear regulator in series, with its output capacitor.</summary>
public sealed class SeriesStage : IStage
{
    public string Id => "series";

    public string Name => "series regulator";

    public ImmutableArray<FieldSpec> Fields => [];

    public ImmutableArray<FieldCheck> Checks => [];

    public bool Applies(RequirementValues requirement) => requirement.Is(CommonFields.Regulation, CommonFields.Linear);

    public StageModel Build(RequirementValues requirement, ImmutableArray<StageModel> before) => new SeriesModel(requirement);
}
