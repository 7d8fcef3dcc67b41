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

    public const string Rated = "rated_voltage";
    public const string Regulation = "regulation";
    public const string Tolerance = "voltage_tolerance";
    public const string ShortCircuit = "short_circuit_voltage";
    public const string PrimaryResistance = "primary_resistance";
    public const string Magnetising = "magnetising_current";
    public const string WindingRise = "winding_rise";
    public const string FluxMax = "flux_max";
    public const string FuseMax = "fuse_max";
    public const string DirectMax = "direct_current_max";

    public static FamilySpec Spec { get; } = new(Id, "mains transformer", "mains transformers",
    [
        new(Primary, "primary voltage", Units.Volt, new(10, 1000), "Nominal rms voltage of the primary.") { Required = true },
        new(Halves, "secondary halves", Units.One, new(1, 2), "1 for a single winding, 2 for two halves with a centre tap: 12-0-12 and 24 CT are both two halves of 12 V.") { Required = true },
        new(Rated, "rated voltage", Units.Volt, new(0.5, 2000), "Rms voltage of one half at rated load and nominal primary voltage.") { InDescription = true },
        new(Power, "rated power", Units.VoltAmpere, new(0.1, 1e5), "Apparent power of all halves together.") { InDescription = true },
        new(Regulation, "regulation", Units.Percent, new(0, 2), "No-load voltage over rated voltage, less one."),
        new(NoLoad, "no-load voltage", Units.Volt, new(0.5, 2000), "Secondary rms voltage of one half without load, at nominal primary voltage; blank is worked out from rated voltage and regulation."),
        new(Resistance, "winding resistance", Units.Ohm, new(1e-4, 1e5), "Of one half, with the primary's carried over; blank is worked out from rated voltage, power and regulation."),
        new(ResistanceAt, "resistance measured at", Units.Celsius, new(-20, 200), "Winding temperature at which resistance or regulation holds.") { Required = true },
        new(Leakage, "leakage inductance", Units.Henry, new(0, 1), "Of one half, carried over to the secondary; blank is worked out from the short-circuit voltage, or counts as none for peaks and as usual for the valley."),
        new(ShortCircuit, "short-circuit voltage", Units.Percent, new(0, 1), "Share of the nominal voltage that drives the rated current into a short."),
        new(Tolerance, "voltage tolerance", Units.Percent, new(0, 0.2), "Of the no-load voltage, either way; blank counts as none."),
        new(PrimaryResistance, "primary resistance", Units.Ohm, new(1e-3, 1e6), "Of the primary alone, cold."),
        new(Magnetising, "no-load current", Units.Ampere, new(0, 100), "Rms current of the primary without load, at nominal voltage."),
        new(Current, "secondary current", Units.Ampere, Range.Amperes, "Rated rms current of one half."),
        new(WindingMax, "winding limit", Units.Celsius, new(50, 250), "Greatest winding temperature of the insulation system in normal use."),
        new(WindingRise, "winding rise", Units.Kelvin, new(5, 200), "Rise of the winding over the air at rated load; blank is taken from its limit less 40 °C."),
        new(FrequencyMin, "lowest frequency", Units.Hertz, new(10, 1000), "Lowest mains frequency at the nominal primary voltage."),
        new(FluxMax, "greatest flux", Units.Percent, new(1, 2), "Greatest voltage over frequency that the core is built for, as a share of that at nominal voltage and lowest frequency."),
        new(FuseMax, "largest fuse", Units.Ampere, Range.Amperes, "Largest fuse in the primary that the maker allows."),
        new(DirectMax, "direct current", Units.Ampere, Range.Amperes, "Greatest mean current in the secondary that the core bears."),
    ])
    {
        SafetyCritical = true,
        Checks =
        [
            new([Resistance, Current, NoLoad], v => v[0] * v[1] < 0.7 * v[2], "The drop at rated current is more than 70 % of the no-load voltage: check resistance and current."),
            new([NoLoad, Rated], v => v[0] >= v[1], "The no-load voltage is below the rated voltage: check both."),
            new([NoLoad, Resistance, Rated, Regulation, Power, Current],
                v => (Given(v[0]) && Given(v[1])) || (Given(v[2]) && (Given(v[3]) || Given(v[0])) && (Given(v[4]) || Given(v[5]))),
                "The data do not say how stiff it is. Give no-load voltage and winding resistance, or rated voltage, rated power and regulation.")
                { EvenIfMissing = true },
        ],
    };

    private static bool Given(double value) => !double.IsNaN(value);
}
