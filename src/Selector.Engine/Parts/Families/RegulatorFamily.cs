using Selector.Engine.Quantities;

namespace Selector.Engine.Parts.Families;

/// <summary>Step-down regulators with the switch inside.</summary>
public static class RegulatorFamily
{
    public const string Id = "switching-regulator";
    public const string InputMin = "input_min";
    public const string InputMax = "input_max";
    public const string OutputMin = "output_min";
    public const string OutputMax = "output_max";
    public const string OutputCurrent = "output_current";
    public const string LimitMin = "limit_min";
    public const string LimitMax = "limit_max";
    public const string Frequency = "frequency";
    public const string DutyMax = "duty_max";
    public const string OnTimeMin = "on_time_min";
    public const string Drop = "switch_drop";
    public const string Resistance = "switch_resistance";
    public const string ResistanceDrift = "switch_resistance_drift";
    public const string Transition = "transition_time";
    public const string Quiescent = "quiescent_current";
    public const string ShortFrequency = "short_frequency";
    public const string Skips = "skips_pulses";
    public const string JunctionMax = "junction_max";
    public const string Cooling = "junction_to_air";

    public const string Start = "start_voltage";
    public const string LoadMin = "load_min";
    public const string CaseCooling = "junction_to_case";
    public const string InductanceMin = "inductance_min";
    public const string InductanceMax = "inductance_max";
    public const string CapacitanceMin = "capacitance_min";
    public const string CapacitanceMax = "capacitance_max";
    public const string EsrMin = "esr_min";
    public const string EsrMax = "esr_max";

    public static FamilySpec Spec { get; } = new(Id, "switching regulator", "switching regulators",
    [
        new(InputMin, "least input", Units.Volt, new(1, 500), "Below it the part locks out.") { Required = true },
        new(InputMax, "greatest input", Units.Volt, new(2, 1000), "Absolute maximum at the input.") { Required = true, InDescription = true },
        new(OutputMin, "least output", Units.Volt, new(0.3, 500), "Lowest output that it regulates; equal to the greatest for a fixed one.") { Required = true },
        new(OutputMax, "greatest output", Units.Volt, new(0.3, 500), "Highest output that it regulates.") { Required = true },
        new(OutputCurrent, "output current", Units.Ampere, Range.Amperes, "Rated continuous output current.") { InDescription = true },
        new(LimitMin, "least current limit", Units.Ampere, Range.Amperes, "Guaranteed lowest peak at which the switch turns off."),
        new(LimitMax, "greatest current limit", Units.Ampere, Range.Amperes, "Guaranteed highest peak at which the switch turns off."),
        new(Frequency, "switching frequency", Units.Hertz, new(1e3, 1e7), "Typical.") { Required = true, InDescription = true },
        new(DutyMax, "greatest duty", Units.Percent, Range.Fraction, "Greatest share of the period that the switch is on."),
        new(OnTimeMin, "least on-time", Units.Second, new(1e-9, 1e-4), "Shortest time that the switch is on."),
        new(Drop, "switch drop", Units.Volt, Range.Drop, "Part of the drop of the closed switch that does not grow with current; 0 for a transistor that is a resistance."),
        new(Resistance, "switch resistance", Units.Ohm, new(0, 100), "Slope of the drop of the closed switch, at 25 °C."),
        new(ResistanceDrift, "switch resistance drift", Units.PerKelvin, new(-0.02, 0.02), "Relative change of that resistance with junction temperature; blank counts as none."),
        new(Transition, "transition time", Units.Second, new(1e-10, 1e-4), "Rise and fall of the switch together."),
        new(Quiescent, "quiescent current", Units.Ampere, new(0, 1), "Own consumption while switching."),
        new(ShortFrequency, "frequency when shorted", Units.Hertz, new(10, 1e7), "Where the part lowers its frequency when the output is shorted; blank counts as no lowering."),
        new(Skips, "skips pulses when shorted", Units.One, new(0, 1), "Whether it leaves out pulses to hold its limit at the least on-time; blank counts as no.") { Choices = ["no", "yes"] },
        new(Start, "start voltage", Units.Volt, new(1, 500), "Greatest input at which it starts, rising."),
        new(LoadMin, "least load", Units.Ampere, new(0, 100), "Least output current without skipping, as far as the maker states it; 0 when none is needed."),
        new(InductanceMin, "least inductance", Units.Henry, new(1e-9, 10), "Smallest coil with which the maker calls it stable."),
        new(InductanceMax, "greatest inductance", Units.Henry, new(1e-9, 10), "Largest coil with which the maker calls it stable."),
        new(CapacitanceMin, "least output capacitance", Units.Farad, new(1e-9, 10), "Smallest output capacitor with which the maker calls it stable."),
        new(CapacitanceMax, "greatest output capacitance", Units.Farad, new(1e-9, 10), "Largest output capacitor with which the maker calls it stable."),
        new(EsrMin, "least ESR", Units.Ohm, new(0, 100), "Least series resistance of that capacitor, at the crossover."),
        new(EsrMax, "greatest ESR", Units.Ohm, new(1e-4, 100), "Greatest series resistance of that capacitor."),
        new(CaseCooling, "junction to case", Units.KelvinPerWatt, Range.Cooling, "Thermal resistance to the tab of a part that can be bolted to a sink."),
        new(JunctionMax, "junction limit", Units.Celsius, new(50, 250), "Greatest junction temperature."),
        new(Cooling, "junction to air", Units.KelvinPerWatt, Range.Cooling, "Thermal resistance to still open air, as mounted."),
    ])
    {
        Technologies = ["bipolar", "mos"],
        Checks =
        [
            new([InputMin, InputMax], v => v[0] < v[1], "The least input is not below the greatest: check both."),
            new([OutputMin, OutputMax], v => v[0] <= v[1], "The least output is above the greatest: check both."),
            new([LimitMin, LimitMax], v => v[0] <= v[1], "The least current limit is above the greatest: check both."),
        ],
    };
}
