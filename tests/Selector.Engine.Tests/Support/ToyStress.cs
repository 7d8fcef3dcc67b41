using System.Collections.Immutable;
using Selector.Engine.Circuits;
using Selector.Engine.Corners;
using Selector.Engine.Derating;
using Selector.Engine.Parts;
using Selector.Engine.Quantities;
using Selector.Engine.Supplies;

namespace Selector.Engine.Tests.Support;

/// <summary>A stage of one position with one stress of a given value, to test what is done with it.</summary>
internal sealed record ToyStress(string Family, string Kind, string RatingKey, double Value, double Ambient) : IStage
{
    public Side Side { get; init; } = Side.Ceiling;

    public string Id => "toy";

    public string Name => "toy";

    public ImmutableArray<FieldSpec> Fields => [];

    public ImmutableArray<FieldCheck> Checks => [];

    public static Ledger Assess(ToyStress stress, Part part, Policy policy)
    {
        var registry = new Registry([stress], [part.Family]);
        return Assessor.Assess(registry, Design.Empty.Fit("X1", new Fitting(part)), policy, Budget.Standard);
    }

    public bool Applies(RequirementValues requirement) => true;

    public StageModel Build(RequirementValues requirement, ImmutableArray<StageModel> before) => new Model(this);

    private sealed class Model : StageModel
    {
        private readonly double _value;

        public Model(ToyStress toy)
        {
            _value = toy.Value;
            Axes = [new AxisSpec(CommonFields.AmbientAxis, new Interval(toy.Ambient, toy.Ambient), toy.Ambient, _ => "")];
            Positions = [new PositionSpec("X1", "toy", toy.Family, 1, ImmutableDictionary<string, double>.Empty)];
            Stress(new StressSpec("X1", toy.Kind, toy.Kind, Units.One, toy.Side, new Bound.Rating(toy.RatingKey), "given"));
        }

        public override SolveStatus Solve(ReadOnlySpan<double> inputs, Span<double> links, Span<double> stresses, in Budget budget)
        {
            if (!stresses.IsEmpty)
            {
                stresses[0] = _value;
            }

            return SolveStatus.Solved;
        }
    }
}
