using System.Collections.Immutable;
using Selector.Engine.Circuits;
using Selector.Engine.Quantities;
using Selector.Engine.Supplies;

namespace Selector.Web.Tests.Support;

/// <summary>A stage that the pages have never heard of: one field that is always shown and one that follows it.</summary>
internal sealed class ToyStage : IStage
{
    public const string Gain = "toy.gain";
    public const string Kind = "toy.kind";
    public const string Hidden = "toy.hidden";

    public string Id => "toy";

    public string Name => "toy";

    public ImmutableArray<FieldSpec> Fields { get; } =
    [
        new(Gain, "Toy gain", Units.Ohm, new(0, 1000), "47 Ω", "How much of the toy there is.") { Group = "Toy" },
        new(Kind, "Toy kind", Units.One, default, "red", "Which toy.") { Group = "Toy", Choices = [new("red", "red one"), new("blue", "blue one")] },
        new(Hidden, "Toy depth", Units.Volt, new(0, 10), "1 V", "Only of a blue one.") { Group = "Toy", Shown = r => r.Is(Kind, "blue") },
    ];

    public ImmutableArray<FieldCheck> Checks => [];

    public bool Applies(RequirementValues requirement) => false;

    public StageModel Build(RequirementValues requirement, ImmutableArray<StageModel> before) => throw new InvalidOperationException("It applies to nothing.");
}
