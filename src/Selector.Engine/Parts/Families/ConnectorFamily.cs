using Selector.Engine.Quantities;

namespace Selector.Engine.Parts.Families;

/// <summary>Mains inlets and terminals.</summary>
public static class ConnectorFamily
{
    public const string Id = "connector";
    public const string Inlet = "mains inlet";
    public const string Terminal = "terminal";
    public const string Current = "current";
    public const string Voltage = "voltage";
    public const string Contacts = "contacts";
    public const string Resistance = "contact_resistance";
    public const string Knee = "current_knee";
    public const string TemperatureMax = "temperature_max";

    public static FamilySpec Spec { get; } = new(Id, "connector", "connectors",
    [
        new(Current, "current", Units.Ampere, Range.Amperes, "Continuous, each contact.") { Required = true, InDescription = true, Fall = new(Knee, TemperatureMax) },
        new(Voltage, "voltage", Units.Volt, Range.Volts, "Nominal system voltage, or working voltage between contacts.") { Required = true, InDescription = true },
        new(Contacts, "contacts", Units.One, new(1, 100), "How many.") { Required = true },
        new(Resistance, "contact resistance", Units.Ohm, new(0, 1), "Greatest, each contact."),
        new(Knee, "current full to", Units.Celsius, Range.Degrees, "Ambient up to which the current is full."),
        new(TemperatureMax, "upper temperature", Units.Celsius, Range.Degrees, "Ambient at which no current is left."),
    ])
    {
        Technologies = [Inlet, Terminal],
    };
}
