using System.Collections.Immutable;
using Selector.Engine.Circuits.Output;
using Selector.Engine.Quantities;
using Selector.Engine.Supplies;

namespace Selector.Engine.Circuits.SecondaryFuse;

/// <summary>A second fuse behind the transformer: in the secondary, or on the bus between reservoir and regulator.</summary>
public sealed class SecondaryFuseStage : IStage
{
    public const string Field = "fuse.second";
    public const string InSecondary = "secondary";
    public const string OnBus = "bus";

    private static readonly Func<RequirementValues, bool> Shown = r => r.Is(CommonFields.Source, OutputStage.SourceMains);

    public string Id => "secondary-fuse";

    public string Name => "second fuse";

    public ImmutableArray<FieldSpec> Fields { get; } =
    [
        new(Field, "Second fuse", Units.One, default, "none", "Whether a fuse F2 stands behind the transformer; on the bus it must break DC.")
            { Group = "Source", Shown = Shown, Choices = [new("none", "none"), new(InSecondary, "in the secondary"), new(OnBus, "on the bus")] },
    ];

    public ImmutableArray<FieldCheck> Checks => [];

    public bool Applies(RequirementValues requirement) => Shown(requirement) && !requirement.Is(Field, "none");

    public StageModel Build(RequirementValues requirement, ImmutableArray<StageModel> before) => new SecondaryFuseModel(requirement);
}
