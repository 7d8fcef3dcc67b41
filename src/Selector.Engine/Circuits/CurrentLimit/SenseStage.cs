using System.Collections.Immutable;
using Selector.Engine.Quantities;
using Selector.Engine.Supplies;

namespace Selector.Engine.Circuits.CurrentLimit;

/// <summary>Current sensing in the output line: a bank of equal resistors, or none.</summary>
public sealed class SenseStage : IStage
{
    public const string Sensing = "sense";
    public const string Resistance = "sense.resistance";
    public const string Accuracy = "sense.accuracy";

    private static readonly Func<RequirementValues, bool> Shown = r => r.Is(Sensing, "bank");

    public string Id => "sense";

    public string Name => "current sensing";

    public ImmutableArray<FieldSpec> Fields { get; } =
    [
        new(Sensing, "Current sensing", Units.One, default, "none", "Whether a resistor bank measures the output current.")
            { Group = "Output", Choices = [new("none", "none"), new("bank", "resistor bank")] },
        new(Resistance, "Sense resistance", Units.Ohm, new(1e-4, 100), "100 mΩ", "Of the whole bank.") { Group = "Output", Shown = Shown },
        new(Accuracy, "Sense accuracy", Units.Percent, new(1e-5, 0.5), "5 %", "Greatest error of the whole bank, tolerance and temperature included.") { Group = "Output", Shown = Shown },
    ];

    public ImmutableArray<FieldCheck> Checks { get; } =
    [
        new([Resistance, CommonFields.LoadFull, CommonFields.OutputVoltage], v => v[0] * v[1] < v[2],
            "at full load loses as much as the output voltage. Make it smaller."),
    ];

    public bool Applies(RequirementValues requirement) => true;

    public StageModel Build(RequirementValues requirement, ImmutableArray<StageModel> before) =>
        Shown(requirement) ? new SenseModel(requirement) : new NoSenseModel();
}
