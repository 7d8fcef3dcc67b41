using System.Collections.Immutable;
using Selector.Engine.Circuits;
using Selector.Engine.Corners;
using Selector.Engine.Parts.Families;
using Selector.Engine.Quantities;
using Selector.Engine.Supplies;

namespace Selector.Application.Tests.Support;

/// <summary>A stage with two fields of its own and one resistor across the voltage: small, but solved for real.</summary>
internal sealed class ToyStage : IStage
{
    public const string Volts = "toy.volts";
    public const string Note = "toy.trim";
    public const string Position = "R1";

    public string Id => "toy";

    public string Name => "toy";

    /// <summary>Called on every solve, for tests that want to hold a solver up.</summary>
    public Action<CancellationToken>? OnSolve { get; set; }

    public ImmutableArray<FieldSpec> Fields { get; } =
    [
        new(Volts, "Volts", Units.Volt, new(1, 100), "10 V", "Across the resistor.") { Group = "Toy" },
        new(Note, "Trim", Units.Percent, new(0, 1), "0 %", "Not used.") { Group = "Toy" },
        new(CommonFields.Units, "Units", Units.One, new(1, 1000), "1", "To build.") { Group = "Build", Whole = true },
        new(CommonFields.Spares, "Spares", Units.Percent, new(0, 1), "0 %", "Spares.") { Group = "Build" },
        new(CommonFields.LeastMargin, "Least margin", Units.Percent, new(0, 1), "0 %", "Margin.") { Group = "Build" },
    ];

    public ImmutableArray<FieldCheck> Checks => [];

    public bool Applies(RequirementValues requirement) => true;

    public StageModel Build(RequirementValues requirement, ImmutableArray<StageModel> before) => new Model(this, requirement[Volts]);

    private sealed class Model : StageModel
    {
        private readonly ToyStage _stage;
        private readonly double _volts;

        public Model(ToyStage stage, double volts)
        {
            _stage = stage;
            _volts = volts;
            Axes = [new AxisSpec(CommonFields.AmbientAxis, new Interval(25, 25), 25, _ => "25 °C")];
            Positions =
            [
                new PositionSpec(
                    Position, "across the volts", ResistorFamily.Id, 1,
                    ImmutableDictionary<string, double>.Empty.Add(ResistorFamily.Resistance, 1000)),
            ];
            var resistance = InputId.Column(Position, ResistorFamily.Resistance);
            Read(resistance);
            Stress(new StressSpec(Position, "power", "power", Units.Watt, Side.Ceiling, new Bound.Rating(ResistorFamily.Power), "P = V²/R"));
        }

        public override SolveStatus Solve(ReadOnlySpan<double> inputs, Span<double> links, Span<double> stresses, in Budget budget)
        {
            _stage.OnSolve?.Invoke(budget.Cancel);
            if (!stresses.IsEmpty)
            {
                stresses[0] = _volts * _volts / inputs[0];
            }

            return budget.Cancel.IsCancellationRequested ? SolveStatus.Cancelled : SolveStatus.Solved;
        }
    }
}
