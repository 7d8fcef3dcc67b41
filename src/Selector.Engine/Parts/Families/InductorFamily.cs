using Selector.Engine.Quantities;

namespace Selector.Engine.Parts.Families;

/// <summary>Power inductors for converters.</summary>
public static class InductorFamily
{
    public const string Id = "inductor";
    public const string Inductance = "inductance";
    public const string Tolerance = "tolerance";
    public const string Resistance = "resistance";
    public const string Saturation = "saturation_current";
    public const string Rms = "rms_current";
    public const string Rise = "temperature_rise";
    public const string TemperatureMax = "temperature_max";

    public const string CoreLoss = "core_loss";
    public const string CoreFrequency = "core_frequency_exponent";
    public const string CoreRipple = "core_ripple_exponent";
    public const string SaturationHot = "saturation_hot";

    public static FamilySpec Spec { get; } = new(Id, "inductor", "inductors",
    [
        new(Inductance, "inductance", Units.Henry, new(1e-9, 10), "Nominal, without bias.") { Required = true, InDescription = true },
        new(Tolerance, "tolerance", Units.Percent, Range.Fraction, "Symmetric; blank counts as 20 %."),
        new(Resistance, "winding resistance", Units.Ohm, new(1e-5, 1e4), "Greatest, at 20 °C."),
        new(Saturation, "saturation current", Units.Ampere, Range.Amperes, "Where the inductance has fallen by the share that the maker states.") { InDescription = true },
        new(Rms, "rms current", Units.Ampere, Range.Amperes, "That warms the part by the rise beside it."),
        new(Rise, "temperature rise", Units.Kelvin, new(1, 150), "At the rms current."),
        new(SaturationHot, "saturation current left hot", Units.Percent, new(0.2, 1.2), "Share of the saturation current that is left at 100 °C; blank counts as all."),
        new(CoreLoss, "core loss", Units.Watt, new(1e-6, 1e3), "At 100 kHz and 1 A of ripple, peak to peak."),
        new(CoreFrequency, "core loss, frequency exponent", Units.One, new(0.5, 3), "How the core loss grows with frequency; blank counts as 1.5."),
        new(CoreRipple, "core loss, ripple exponent", Units.One, new(1, 4), "How it grows with the ripple; blank counts as 2.3."),
        new(TemperatureMax, "upper temperature", Units.Celsius, new(40, 250), "Greatest temperature of the part, own rise included."),
    ])
    {
        Technologies = ["ferrite", "iron powder"],
    };
}
