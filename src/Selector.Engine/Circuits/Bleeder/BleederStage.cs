using System.Collections.Immutable;
using Selector.Engine.Quantities;
using Selector.Engine.Supplies;

namespace Selector.Engine.Circuits.Bleeder;

/// <summary>The resistor that empties the reservoir once the supply is off.</summary>
public sealed class BleederStage : IStage
{
    public const string Field = "bleeder";
    public const string Safe = "bleeder.safe";
    public const string Time = "bleeder.time";

    private static readonly Func<RequirementValues, bool> Shown = r => r.Is(Field, "resistor");

    public string Id => "bleeder";

    public string Name => "bleeder";

    public ImmutableArray<FieldSpec> Fields { get; } =
    [
        new(Field, "Bleeder", Units.One, default, "none", "Whether a resistor across the reservoir empties it once the supply is off.")
            { Group = "Source", Choices = [new("none", "none"), new("resistor", "resistor R1")] },
        new(Safe, "Safe voltage", Units.Volt, new(0.1, 120), "2 V", "Voltage at which the reservoir counts as empty: below what can hurt or burn a tool; local rules decide.") { Group = "Source", Shown = Shown },
        new(Time, "Empty within", Units.Second, new(0.1, 3600), "60 s", "Time that the bleeder may take to get there.") { Group = "Source", Shown = Shown },
    ];

    public ImmutableArray<FieldCheck> Checks => [];

    public bool Applies(RequirementValues requirement) => true;

    public StageModel Build(RequirementValues requirement, ImmutableArray<StageModel> before) =>
        Shown(requirement) ? new BleederModel(requirement) : new NoBleeder();

    private sealed class NoBleeder : StageModel
    {
        private readonly int _current, _power;

        public NoBleeder()
        {
            _current = Write(new LinkSpec(LinkNames.BleederCurrent, Units.Ampere, 0) { Others = Push.None });
            _power = Write(new LinkSpec(LinkNames.Loss("R1"), Units.Watt, 0) { Others = Push.None });
        }

        public override SolveStatus Solve(ReadOnlySpan<double> inputs, Span<double> links, Span<double> stresses, in Budget budget)
        {
            (links[_current], links[_power]) = (0, 0);
            return SolveStatus.Solved;
        }
    }
}
