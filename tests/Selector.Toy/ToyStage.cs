using System.Collections.Immutable;
using Selector.Engine.Circuits;
using Selector.Engine.Quantities;
using Selector.Engine.Supplies;
using static Selector.Engine.Circuits.Dependences;

namespace Selector.Toy;

/// <summary>A stage that the product has never heard of: a lamp on the bus, with a share of the bus set by a field.</summary>
internal sealed class ToyStage : IStage
{
    public const string Share = "toy.share";
    public const string Position = "DS1";

    public string Id => "toy";

    public string Name => "toy lamp";

    public ImmutableArray<FieldSpec> Fields { get; } =
    [
        new(Share, "Lamp share", Units.Percent, new(0.01, 1), "50 %", "Share of the bus across the lamp.") { Group = "Toy" },
    ];

    public ImmutableArray<FieldCheck> Checks => [];

    public bool Applies(RequirementValues requirement) => true;

    public StageModel Build(RequirementValues requirement, ImmutableArray<StageModel> before) => new Model(requirement[Share]);

    private sealed class Model : StageModel
    {
        private static readonly InputId Bus = InputId.Link(LinkNames.BusMax);

        private readonly double _share;
        private readonly int _bus;
        private readonly int _filament;
        private readonly int _power;

        public Model(double share)
        {
            _share = share;
            _bus = Read(Bus);
            _filament = Read(InputId.Column(Position, "filament"));
            _power = Stress(new StressSpec(Position, "lamp-power", "power of the lamp", Units.Watt, Side.Ceiling, new Bound.Rating("brightness"), "P = (k V)² / R")
            {
                On = [.. Rises("the square of the bus", Bus), .. Falls("more resistance, less power", InputId.Column(Position, "filament"))],
            });
            Positions =
            [
                new(Position, "lamp on the bus", ToyFamily.Id, 1, ImmutableDictionary<string, double>.Empty.Add("filament", 1000)),
            ];
        }

        public override SolveStatus Solve(ReadOnlySpan<double> inputs, Span<double> links, Span<double> stresses, in Budget budget)
        {
            if (!stresses.IsEmpty)
            {
                var volts = _share * inputs[_bus];
                stresses[_power] = volts * volts / inputs[_filament];
            }

            return SolveStatus.Solved;
        }
    }
}
