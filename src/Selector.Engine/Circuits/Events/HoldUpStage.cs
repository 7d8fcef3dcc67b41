using System.Collections.Immutable;
using Selector.Engine.Circuits.Output;
using Selector.Engine.Quantities;
using Selector.Engine.Supplies;

namespace Selector.Engine.Circuits.Events;

/// <summary>The mains failing for half a cycle: solved only where it may be worst.</summary>
public sealed class HoldUpStage : IStage
{
    public const string HoldUp = "hold-up";

    private static readonly Func<RequirementValues, bool> Shown = r => r.Is(CommonFields.Source, OutputStage.SourceMains);

    public string Id => "hold-up";

    public string Name => "hold-up";

    public ImmutableArray<FieldSpec> Fields { get; } =
    [
        new(HoldUp, "Hold-up", Units.One, default, "none", "Whether the output must ride through a missed half-cycle of the mains.")
            { Group = "Source", Shown = Shown, Choices = [new("none", "not asked"), new("half", "a missed half-cycle")] },
    ];

    public ImmutableArray<FieldCheck> Checks => [];

    public bool Applies(RequirementValues requirement) => Shown(requirement) && requirement.Is(HoldUp, "half");

    public StageModel Build(RequirementValues requirement, ImmutableArray<StageModel> before) => new HoldUpModel(requirement);
}
