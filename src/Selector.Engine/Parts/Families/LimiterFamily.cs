using Selector.Engine.Quantities;

namespace Selector.Engine.Parts.Families;

/// <summary>Thermistors that limit the current at switch-on.</summary>
public static class LimiterFamily
{
    public const string Id = "ntc-limiter";
    public const string Cold = "cold_resistance";
    public const string Tolerance = "tolerance";
    public const string Current = "current_max";
    public const string Hot = "hot_resistance";
    public const string Beta = "beta";
    public const string Dissipation = "dissipation";
    public const string TimeConstant = "time_constant";
    public const string Capacitance = "capacitance_max";
    public const string CapacitanceVoltage = "capacitance_voltage";
    public const string Energy = "energy";
    public const string Knee = "current_knee";
    public const string TemperatureMax = "temperature_max";

    public static FamilySpec Spec { get; } = new(Id, "NTC inrush limiter", "NTC inrush limiters",
    [
        new(Cold, "cold resistance", Units.Ohm, new(0.1, 1000), "At 25 °C without current.") { Required = true, InDescription = true },
        new(Tolerance, "tolerance", Units.Percent, Range.Fraction, "Of the cold resistance, symmetric; blank counts as 20 %."),
        new(Current, "greatest current", Units.Ampere, Range.Amperes, "Steady rms, full up to the temperature beside it.") { Required = true, InDescription = true, Fall = new(Knee, TemperatureMax) },
        new(Hot, "hot resistance", Units.Ohm, new(1e-3, 100), "At the greatest current.") { Required = true },
        new(Beta, "B value", Units.Kelvin, new(1000, 8000), "How steeply the resistance falls; blank counts as 3000 K."),
        new(Dissipation, "dissipation", Units.WattPerKelvin, new(1e-4, 1), "Heat that it gives off for each kelvin."),
        new(TimeConstant, "cooling time", Units.Second, new(1, 1000), "Thermal time constant."),
        new(Energy, "energy", Units.Joule, new(0.01, 1000), "That it takes in one switch-on."),
        new(Capacitance, "greatest capacitance", Units.Farad, new(1e-7, 1), "That it may charge to the voltage beside it."),
        new(CapacitanceVoltage, "capacitance at", Units.Volt, Range.Volts, "Peak voltage for the greatest capacitance."),
        new(Knee, "current full to", Units.Celsius, Range.Degrees, "Ambient up to which the current is full."),
        new(TemperatureMax, "upper temperature", Units.Celsius, Range.Degrees, "Ambient at which no current is left."),
    ])
    {
        Technologies = ["disc"],
    };
}
