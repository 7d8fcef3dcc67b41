using System.Collections.Immutable;
using Selector.Engine.Quantities;
using Selector.Engine.Supplies;

namespace Selector.Engine.Circuits.Direct;

/// <summary>A DC source with its resistance, and the reservoir that keeps the converter's ripple from it.</summary>
public sealed class DirectStage : IStage
{
    public const string Low = "dc.low";
    public const string Nominal = "dc.nominal";
    public const string High = "dc.high";
    public const string Resistance = "dc.resistance";
    public const string Axis = "dc";
    public const string Diode = "protect.input";

    private static readonly Func<RequirementValues, bool> Shown = r => r.Is(CommonFields.Source, Output.OutputStage.SourceDirect);

    public string Id => "direct";

    public string Name => "DC source";

    public ImmutableArray<FieldSpec> Fields { get; } =
    [
        new(Low, "DC, least", Units.Volt, new(1, 1000), "20 V", "Lowest source voltage, without load.") { Group = "Source", Shown = Shown },
        new(Nominal, "DC, nominal", Units.Volt, new(1, 1000), "24 V", "Everyday source voltage.") { Group = "Source", Shown = Shown },
        new(High, "DC, greatest", Units.Volt, new(1, 1000), "28 V", "Highest source voltage, transients included.") { Group = "Source", Shown = Shown },
        new(Resistance, "Source resistance", Units.Ohm, new(0, 1000), "50 mΩ", "Of source and leads together.") { Group = "Source", Shown = Shown },
        new(Diode, "Reversed source", Units.One, default, "none", "What keeps a reversed source from the reservoir.")
            { Group = "Source", Shown = Shown, Choices = [new("none", "nothing"), new("series", "diode D7 in series")] },
    ];

    public ImmutableArray<FieldCheck> Checks { get; } =
    [
        new([Low, Nominal], v => v[0] <= v[1], "is above the nominal voltage. Make it at most that."),
        new([High, Nominal], v => v[0] >= v[1], "is below the nominal voltage. Make it at least that."),
    ];

    public bool Applies(RequirementValues requirement) => Shown(requirement);

    public StageModel Build(RequirementValues requirement, ImmutableArray<StageModel> before) => new DirectModel(requirement);

    /// <summary>Whether the requirement has a diode in the DC line.</summary>
    public static bool HasDiode(RequirementValues r) => r.Is(Diode, "series");
}
