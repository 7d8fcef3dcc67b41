using System.Collections.Immutable;
using Selector.Engine.Circuits.Output;
using Selector.Engine.Quantities;
using Selector.Engine.Supplies;

namespace Selector.Engine.Circuits.Inlet;

/// <summary>From the mains to the transformer: inlet, switch, fuse with its holder, inrush limiter and varistor if asked.</summary>
public sealed class InletStage : IStage
{
    private static readonly Func<RequirementValues, bool> Shown = r => r.Is(CommonFields.Source, OutputStage.SourceMains);

    public string Id => "inlet";

    public string Name => "inlet, switch and fuse";

    public ImmutableArray<FieldSpec> Fields { get; } =
    [
        new(InletFields.Limiter, "Inrush limiter", Units.One, default, "none", "Whether a thermistor in the primary limits the current at switch-on.")
            { Group = "Source", Shown = Shown, Choices = [new("none", "none"), new("ntc", "NTC RT1")] },
        new(InletFields.Varistor, "Varistor", Units.One, default, "none", "Whether a varistor behind the fuse limits surges from the mains.")
            { Group = "Source", Shown = Shown, Choices = [new("none", "none"), new("yes", "varistor RV1")] },
    ];

    public ImmutableArray<FieldCheck> Checks => [];

    public bool Applies(RequirementValues requirement) => Shown(requirement);

    public StageModel Build(RequirementValues requirement, ImmutableArray<StageModel> before) => new InletModel(requirement);
}
