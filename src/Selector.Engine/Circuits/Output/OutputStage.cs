using System.Collections.Immutable;
using Selector.Engine.Corners;
using Selector.Engine.Quantities;
using Selector.Engine.Supplies;

namespace Selector.Engine.Circuits.Output;

/// <summary>What the supply must deliver, where it stands and how many are built: the part of the requirement that every stage reads.</summary>
public sealed class OutputStage : IStage
{
    public const string SourceMains = "mains";
    public const string SourceDirect = "dc";
    public const string ShortHeld = "short.held";

    public const string Fixed = "fixed";
    public const string Adjustable = "adjustable";

    private static readonly Func<RequirementValues, bool> IsAdjustable = r => r.Is(CommonFields.OutputAdjust, Adjustable);

    public string Id => "output";

    public string Name => "output and place";

    public ImmutableArray<FieldSpec> Fields { get; } =
    [
        new(CommonFields.Source, "Source", Units.One, default, SourceDirect, "What feeds the supply.")
            { Group = "Source", Choices = [new(SourceMains, "mains"), new(SourceDirect, "DC")] },
        new(CommonFields.Regulation, "Regulation", Units.One, default, CommonFields.StepDown, "How the output is regulated.")
            { Group = "Output", Choices = [new(CommonFields.StepDown, "step-down converter"), new(CommonFields.Linear, "linear, in series")] },
        new(CommonFields.OutputAdjust, "Output is", Units.One, default, Fixed, "One voltage, or a range that the user sets.")
            { Group = "Output", Choices = [new(Fixed, "fixed"), new(Adjustable, "adjustable")] },
        new(CommonFields.OutputVoltage, "Output", Units.Volt, new(0.5, 400), "5 V", "Voltage at the output terminals; of an adjustable supply the greatest.") { Group = "Output" },
        new(CommonFields.OutputLeast, "Output, least", Units.Volt, new(0.3, 400), "1.5 V", "Lowest voltage that can be set.") { Group = "Output", Shown = IsAdjustable },
        new(CommonFields.OutputRipple, "Output ripple", Units.Volt, new(1e-4, 50), "50 mV", "Greatest peak-to-peak ripple allowed at the output.") { Group = "Output" },
        new(CommonFields.LoadLeast, "Least load", Units.Ampere, new(0, 1000), "0 A", "Least current that is always drawn; 0 when the output may be open.") { Group = "Output" },
        new(CommonFields.LoadFull, "Full load", Units.Ampere, new(1e-3, 1000), "1 A", "Greatest continuous output current.") { Group = "Output" },
        new(ShortHeld, "Short", Units.One, default, "held", "Whether the output may stay shorted for ever.")
            { Group = "Output", Choices = [new("held", "held for ever"), new("none", "not asked")] },
        new(CommonFields.AmbientLow, "Ambient, least", Units.Celsius, new(-55, 100), "0 °C", "Lowest air temperature around the parts.") { Group = "Place" },
        new(CommonFields.AmbientHigh, "Ambient, greatest", Units.Celsius, new(-40, 125), "40 °C", "Highest air temperature around the parts, inside the case if there is one.") { Group = "Place" },
        new(CommonFields.Units, "Build", Units.One, new(1, 100_000), "10", "How many supplies are built.") { Group = "Build", Whole = true },
        new(CommonFields.Spares, "Spares", Units.Percent, new(0, 1), "5 %", "Share of parts ordered on top.") { Group = "Build" },
        new(CommonFields.LeastMargin, "Least margin", Units.Percent, new(-0.5, 0.9), "0 %", "Margin that a part must keep beyond what the policy already takes away.") { Group = "Build" },
    ];

    public ImmutableArray<FieldCheck> Checks { get; } =
    [
        new([CommonFields.LoadLeast, CommonFields.LoadFull], v => v[0] <= v[1], "is above the full load. Make it at most the full load."),
        new([CommonFields.AmbientLow, CommonFields.AmbientHigh], v => v[0] <= v[1], "is above the greatest ambient. Make it at most that."),
        new([CommonFields.OutputLeast, CommonFields.OutputVoltage], v => v[0] <= v[1], "is above the greatest output. Make it at most that."),
        new([CommonFields.OutputRipple, CommonFields.OutputVoltage], v => v[0] < v[1], "is not below the output voltage. Type a smaller one."),
    ];

    public bool Applies(RequirementValues requirement) => true;

    public StageModel Build(RequirementValues requirement, ImmutableArray<StageModel> before) => new OutputModel(requirement);

    private sealed class OutputModel : StageModel
    {
        public OutputModel(RequirementValues r)
        {
            var (least, full) = (r[CommonFields.LoadLeast], r[CommonFields.LoadFull]);
            Axes =
            [
                new(CommonFields.LoadAxis, new(least, full), full, v => v == 0 ? "no load" : QuantityWriter.Write(v, Units.Ampere)) { Probes = 3 },
                new(CommonFields.OutputAxis, LeastOutput(r), r[CommonFields.OutputVoltage], v => $"{QuantityWriter.Write(v, Units.Volt)} out") { Probes = 3 },
                new(CommonFields.ShortAxis, new(0, r.Is(ShortHeld, "held") ? 1 : 0), 0, v => v > 0.5 ? "output shorted" : "") { EndsOnly = true },
                new(
                    CommonFields.AmbientAxis,
                    new(r[CommonFields.AmbientLow], r[CommonFields.AmbientHigh]),
                    Math.Clamp(25, r[CommonFields.AmbientLow], r[CommonFields.AmbientHigh]),
                    v => QuantityWriter.Write(v, Units.Celsius)) { Probes = 2 },
            ];
        }

        private static Interval LeastOutput(RequirementValues r) =>
            new(IsAdjustable(r) ? r[CommonFields.OutputLeast] : r[CommonFields.OutputVoltage], r[CommonFields.OutputVoltage]);

        public override SolveStatus Solve(ReadOnlySpan<double> inputs, Span<double> links, Span<double> stresses, in Budget budget) => SolveStatus.Solved;
    }
}
