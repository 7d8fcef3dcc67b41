using System.Collections.Immutable;
using Selector.Engine.Parts.Families;
using Selector.Engine.Quantities;
using Selector.Engine.Supplies;
using static Selector.Engine.Circuits.Dependences;

namespace Selector.Engine.Circuits.Terminals;

/// <summary>Output terminals J2: the load's current, and that of a short held for ever.</summary>
public sealed class TerminalStage : IStage
{
    public string Id => "terminals";

    public string Name => "output terminals";

    public ImmutableArray<FieldSpec> Fields => [];

    public ImmutableArray<FieldCheck> Checks => [];

    public bool Applies(RequirementValues requirement) => true;

    public StageModel Build(RequirementValues requirement, ImmutableArray<StageModel> before) => new TerminalModel(requirement);

    private sealed class TerminalModel : StageModel
    {
        private const string J2 = "J2";

        private readonly double _greatest;
        private readonly int _currentIn, _current, _voltage;

        public TerminalModel(RequirementValues r)
        {
            var current = InputId.Link(LinkNames.OutputCurrent);
            _greatest = r[CommonFields.OutputVoltage];
            _currentIn = Read(current);
            _current = Stress(new(J2, "current", "current, load or short", Units.Ampere, Side.Ceiling, new Bound.Rating(ConnectorFamily.Current), "I = load, or what a short draws")
                { On = [.. Rises("it is that current", current)], Others = Push.None });
            _voltage = Stress(new(J2, "voltage", "voltage between contacts", Units.Volt, Side.Ceiling, new Bound.Limit(ConnectorFamily.Voltage), "V = greatest output") { Others = Push.None, IsMatch = true });
            Positions = [new(J2, "output terminals", ConnectorFamily.Id, 1, ImmutableDictionary<string, double>.Empty) { Technologies = [ConnectorFamily.Terminal] }];
        }

        public override SolveStatus Solve(ReadOnlySpan<double> inputs, Span<double> links, Span<double> stresses, in Budget budget)
        {
            if (!stresses.IsEmpty)
            {
                (stresses[_current], stresses[_voltage]) = (inputs[_currentIn], _greatest);
            }

            return SolveStatus.Solved;
        }
    }
}
