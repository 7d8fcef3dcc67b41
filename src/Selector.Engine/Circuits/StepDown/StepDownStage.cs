using System.Collections.Immutable;
using Selector.Engine.Supplies;

namespace Selector.Engine.Circuits.StepDown;

/// <summary>Step-down converter: regulator with its switch, catch diode, coil and output capacitor.</summary>
public sealed class StepDownStage : IStage
{
    public const string InductanceAxis = "L1.inductance";

    public string Id => "step-down";

    public string Name => "step-down converter";

    public ImmutableArray<FieldSpec> Fields => [];

    public ImmutableArray<FieldCheck> Checks => [];

    public bool Applies(RequirementValues requirement) => requirement.Is(CommonFields.Regulation, CommonFields.StepDown);

    public StageModel Build(RequirementValues requirement, ImmutableArray<StageModel> before) => new StepDownModel(requirement);
}
