using System.Collections.Immutable;
using Selector.Engine.Circuits;
using Selector.Engine.Quantities;
using Selector.Engine.Supplies;

namespace Selector.Documents.Tests.Support;

/// <summary>A requirement of the size of a real one, without the stages: their fields are stated here by hand.</summary>
internal static class SampleRequirement
{
    private static readonly Interval Any = new(-1e9, 1e9);

    private static readonly (string Key, string Label, Unit Unit, string Text)[] Typed =
    [
        ("mains.voltage", "Mains voltage", Units.Volt, "230"),
        ("mains.low", "Mains low by", Units.Percent, "10 %"),
        ("mains.high", "Mains high by", Units.Percent, "10 %"),
        ("mains.frequency", "Mains frequency", Units.Hertz, "50"),
        (CommonFields.OutputVoltage, "Output voltage", Units.Volt, "9 V"),
        ("output.accuracy", "Output accuracy", Units.Percent, "2%"),
        (CommonFields.OutputRipple, "Output ripple", Units.Volt, "150mV"),
        (CommonFields.LoadLeast, "Least load", Units.Ampere, "0"),
        (CommonFields.LoadFull, "Full load", Units.Ampere, "1A5"),
        ("limit.low", "Limit from", Units.Ampere, "0.1"),
        ("limit.high", "Limit to", Units.Ampere, "1.5 A"),
        ("feedback.top", "Upper feedback resistor", Units.Ohm, "4k7"),
        (CommonFields.AmbientLow, "Ambient from", Units.Celsius, "0"),
        (CommonFields.AmbientHigh, "Ambient to", Units.Celsius, "45 °C"),
        ("life", "Life", Units.Hour, "20 kh"),
        (CommonFields.Units, "Supplies to build", Units.One, "25"),
        (CommonFields.Spares, "Spares", Units.Percent, "4 %"),
        (CommonFields.LeastMargin, "Least margin beyond the policy", Units.Percent, "0 %"),
    ];

    public static RequirementValues Values { get; } = Read(Typed);

    public static RequirementValues None { get; } = Read([]);

    /// <summary>The same with one text changed.</summary>
    public static RequirementValues With(string key, string text) =>
        Read([.. Typed.Select(t => t.Key == key ? t with { Text = text } : t)]);

    private static RequirementValues Read((string Key, string Label, Unit Unit, string Text)[] typed)
    {
        var fields = typed.Select(t => new FieldSpec(t.Key, t.Label, t.Unit, Any, t.Text, "Help.") { Group = "Supply" });
        return RequirementReader.Read(new Registry([new FieldsOnly([.. fields])], []), Requirement.Empty);
    }

    private sealed class FieldsOnly(ImmutableArray<FieldSpec> fields) : IStage
    {
        public string Id => "fields";

        public string Name => "Fields";

        public ImmutableArray<FieldSpec> Fields => fields;

        public ImmutableArray<FieldCheck> Checks => [];

        public bool Applies(RequirementValues requirement) => false;

        public StageModel Build(RequirementValues requirement, ImmutableArray<StageModel> before) =>
            throw new NotSupportedException("Only its fields are read.");
    }
}
