using System.Collections.Immutable;
using Selector.Engine.Quantities;
using Selector.Engine.Supplies;

namespace Selector.Engine.Circuits.Preload;

/// <summary>A resistor across the output, so that the regulator always has its least load.</summary>
public sealed class PreloadStage : IStage
{
    public const string Field = "preload";

    public string Id => "preload";

    public string Name => "preload";

    public ImmutableArray<FieldSpec> Fields { get; } =
    [
        new(Field, "Preload", Units.One, default, "none", "Whether a resistor across the output gives the regulator its least load.")
            { Group = "Output", Choices = [new("none", "none"), new("resistor", "resistor R10")] },
    ];

    public ImmutableArray<FieldCheck> Checks => [];

    public bool Applies(RequirementValues requirement) => true;

    public StageModel Build(RequirementValues requirement, ImmutableArray<StageModel> before) =>
        requirement.Is(Field, "resistor") ? new PreloadModel(requirement) : new NoPreload();

    private sealed class NoPreload : StageModel
    {
        private readonly int _current;

        public NoPreload() => _current = Write(new LinkSpec(LinkNames.PreloadCurrent, Units.Ampere, 0) { Others = Push.None });

        public override SolveStatus Solve(ReadOnlySpan<double> inputs, Span<double> links, Span<double> stresses, in Budget budget)
        {
            links[_current] = 0;
            return SolveStatus.Solved;
        }
    }
}
