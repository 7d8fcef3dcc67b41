using Selector.Engine.Quantities;

namespace Selector.Engine.Parts.Families;

/// <summary>Mains switches.</summary>
public static class SwitchFamily
{
    public const string Id = "switch";
    public const string Current = "current";
    public const string Voltage = "voltage_ac";
    public const string Inrush = "inrush_current";
    public const string Knee = "current_knee";
    public const string TemperatureMax = "temperature_max";

    public static FamilySpec Spec { get; } = new(Id, "mains switch", "mains switches",
    [
        new(Current, "current", Units.Ampere, Range.Amperes, "Continuous rms, resistive load.") { Required = true, InDescription = true, Fall = new(Knee, TemperatureMax) },
        new(Voltage, "voltage", Units.Volt, Range.Volts, "Nominal system voltage.") { Required = true, InDescription = true },
        new(Inrush, "inrush current", Units.Ampere, Range.Amperes, "Peak that the contacts may make, capacitive load."),
        new(Knee, "current full to", Units.Celsius, Range.Degrees, "Ambient up to which the current is full."),
        new(TemperatureMax, "upper temperature", Units.Celsius, Range.Degrees, "Ambient at which no current is left."),
    ])
    {
        Technologies = ["rocker", "toggle"],
        SafetyCritical = true,
    };
}
