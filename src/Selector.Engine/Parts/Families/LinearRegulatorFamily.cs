using Selector.Engine.Quantities;

namespace Selector.Engine.Parts.Families;

/// <summary>Series regulators with the pass transistor inside.</summary>
public static class LinearRegulatorFamily
{
    public const string Id = "linear-regulator";
    public const string InputMax = "input_max";
    public const string DifferentialMax = "differential_max";
    public const string OutputMin = "output_min";
    public const string OutputMax = "output_max";
    public const string Accuracy = "accuracy";
    public const string OutputCurrent = "output_current";
    public const string LimitMin = "limit_min";
    public const string LimitMax = "limit_max";
    public const string FoldBack = "foldback_differential";
    public const string FoldBackCurrent = "foldback_current";
    public const string Drop = "dropout_voltage";
    public const string DropResistance = "dropout_resistance";
    public const string LoadMin = "load_min";
    public const string Quiescent = "quiescent";
    public const string Rejection = "ripple_rejection";
    public const string JunctionMax = "junction_max";
    public const string CaseCooling = "junction_to_case";
    public const string Cooling = "junction_to_air";
    public const string ReverseDiode = "needs_reverse_diode";

    public static FamilySpec Spec { get; } = new(Id, "linear regulator", "linear regulators",
    [
        new(InputMax, "greatest input", Units.Volt, new(2, 1000), "Absolute maximum from input to ground; for a floating part the greatest difference from input to output.") { Required = true, InDescription = true },
        new(DifferentialMax, "greatest differential", Units.Volt, new(2, 1000), "Absolute maximum from input to output; blank counts as the greatest input."),
        new(OutputMin, "least output", Units.Volt, new(0.3, 500), "Lowest output that it regulates; equal to the greatest for a fixed one.") { Required = true },
        new(OutputMax, "greatest output", Units.Volt, new(0.3, 500), "Highest output that it regulates.") { Required = true, InDescription = true },
        new(Accuracy, "accuracy", Units.Percent, Range.Fraction, "Of the output, over line, load and temperature."),
        new(OutputCurrent, "output current", Units.Ampere, Range.Amperes, "Rated continuous output current.") { Required = true, InDescription = true },
        new(LimitMin, "least current limit", Units.Ampere, Range.Amperes, "Guaranteed lowest."),
        new(LimitMax, "greatest current limit", Units.Ampere, Range.Amperes, "Guaranteed highest, at a small differential."),
        new(FoldBack, "fold-back from", Units.Volt, new(0, 1000), "Differential from which the limit falls; blank counts as no fold-back."),
        new(FoldBackCurrent, "fold-back to", Units.Ampere, new(0, 1000), "Limit that is left at the greatest differential."),
        new(Drop, "drop-out, fixed part", Units.Volt, Range.Drop, "Drop-out at no current.") { Required = true },
        new(DropResistance, "drop-out, slope", Units.Ohm, new(0, 100), "How it grows with current; blank counts as none, the fixed part being that at full current."),
        new(LoadMin, "least load", Units.Ampere, new(0, 10), "Below it the output may rise; 0 when none is needed."),
        new(Quiescent, "quiescent current", Units.Ampere, new(0, 1), "Own consumption to ground."),
        new(Rejection, "ripple rejection", Units.One, new(1, 1e6), "Ripple at the input over that at the output, at 100 Hz."),
        new(JunctionMax, "junction limit", Units.Celsius, new(50, 250), "Greatest junction temperature."),
        new(CaseCooling, "junction to case", Units.KelvinPerWatt, Range.Cooling, "Thermal resistance to the tab."),
        new(Cooling, "junction to air", Units.KelvinPerWatt, Range.Cooling, "Thermal resistance to still open air, without a sink."),
        new(ReverseDiode, "needs reverse protection", Units.One, new(0, 1), "Whether the maker asks for a diode from output to input.") { Choices = ["no", "yes"] },
    ])
    {
        Technologies = ["bipolar", "mos"],
        Checks =
        [
            new([OutputMin, OutputMax], v => v[0] <= v[1], "The least output is above the greatest: check both."),
            new([LimitMin, LimitMax], v => v[0] <= v[1], "The least current limit is above the greatest: check both."),
            new([OutputCurrent, LimitMin], v => v[0] <= v[1], "The rated current is above the least limit: check both."),
        ],
    };
}
