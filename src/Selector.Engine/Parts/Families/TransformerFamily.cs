using Selector.Engine.Quantities;

namespace Selector.Engine.Parts.Families;

/// <summary>Mains transformers with one secondary, whole or in two halves with a centre tap.</summary>
public static class TransformerFamily
{
    public const string Id = "transformer";
    public const string Primary = "primary_voltage";
    public const string Halves = "halves";
    public const string NoLoad = "no_load_voltage";
    public const string Resistance = "resistance";
    public const string ResistanceAt = "resistance_temperature";
    public const string Leakage = "leakage";
    public const string Current = "secondary_current";
    public const string Power = "power";
    public const string WindingMax = "winding_max";
    public const string FrequencyMin = "frequency_min";

    public static FamilySpec Spec { get; } = new(Id, "mains transformer", "mains transformers",
    [
        new(Primary, "primary voltage", Units.Volt, new(10, 1000), "Nominal rms voltage of the primary.") { Required = true },
        new(Halves, "secondary halves", Units.One, new(1, 2), "1 for a single winding, 2 for two halves with a centre tap.") { Required = true },
        new(NoLoad, "no-load voltage", Units.Volt, new(0.5, 2000), "Secondary rms voltage of one half without load, at nominal primary voltage.") { Required = true, InDescription = true },
        new(Resistance, "winding resistance", Units.Ohm, new(1e-4, 1e5), "Of one half, with the primary's carried over, at the temperature stated beside it."),
        new(ResistanceAt, "resistance measured at", Units.Celsius, new(-20, 200), "Winding temperature at which the resistance holds."),
        new(Leakage, "leakage inductance", Units.Henry, new(0, 1), "Of one half, carried over to the secondary; blank counts as none, which deepens no valley."),
        new(Current, "secondary current", Units.Ampere, Range.Amperes, "Rated rms current of one half."),
        new(Power, "rated power", Units.VoltAmpere, new(0.1, 1e5), "Apparent power at the secondary.") { InDescription = true },
        new(WindingMax, "winding limit", Units.Celsius, new(50, 250), "Greatest winding temperature of the insulation system in normal use."),
        new(FrequencyMin, "lowest frequency", Units.Hertz, new(10, 1000), "Lowest mains frequency at the nominal primary voltage."),
    ])
    {
        SafetyCritical = true,
        Checks =
        [
            new([Resistance, Current, NoLoad], v => v[0] * v[1] < 0.7 * v[2], "The drop at rated current is more than 70 % of the no-load voltage: check resistance and current."),
        ],
    };
}
