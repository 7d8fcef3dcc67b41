using System.Collections.Immutable;
using Selector.Engine.Quantities;
using Selector.Engine.Supplies;

namespace Selector.Engine.Circuits.Protection;

/// <summary>The diode D8 that keeps what is charged behind the output from flowing back through the regulator.</summary>
public sealed class ProtectionStage : IStage
{
    public string Id => "protection";

    public string Name => "output protection";

    public ImmutableArray<FieldSpec> Fields { get; } =
    [
        new(ProtectionFields.Field, "Output protection", Units.One, default, "none", "Diode D8 against current that comes back from the load or from the output capacitor.")
        {
            Group = "Output",
            Choices = [new("none", "none"), new(ProtectionFields.ToInput, "diode from output to input"), new(ProtectionFields.Across, "diode across the output")],
        },
    ];

    public ImmutableArray<FieldCheck> Checks => [];

    public bool Applies(RequirementValues requirement) => !requirement.Is(ProtectionFields.Field, "none");

    public StageModel Build(RequirementValues requirement, ImmutableArray<StageModel> before) => new ProtectionModel(requirement);
}
