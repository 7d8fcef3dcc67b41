using Selector.Engine.Quantities;

namespace Selector.Engine.Parts.Families;

/// <summary>Ratings that single diodes and bridges share.</summary>
public static class RectifierRatings
{
    public const string Reverse = "reverse_voltage";
    public const string Average = "average_current";
    public const string Knee = "current_knee";
    public const string JunctionMax = "junction_max";
    public const string Peak = "repetitive_peak";
    public const string Surge = "surge_current";
    public const string MeltingIntegral = "surge_integral";
    public const string Threshold = "threshold";
    public const string Slope = "slope_resistance";
    public const string ThresholdDrift = "threshold_drift";
    public const string Cooling = "junction_to_air";

    public const string CaseCooling = "junction_to_case";
    public const string Leakage = "reverse_current_hot";
    public const string LeakageAt = "reverse_hot_temperature";
    public const string RecoveryCharge = "recovery_charge";

    public const string LowVoltage = "v_low";
    public const string LowCurrent = "i_low";
    public const string HighVoltage = "v_high";
    public const string HighCurrent = "i_high";
    public const string CapacitiveFactor = "capacitive_factor";

    internal static RatingSpec[] All { get; } =
    [
        new(Reverse, "reverse voltage", Units.Volt, Range.Volts, "Repetitive peak reverse voltage of one diode.") { Required = true, InDescription = true },
        new(Average, "average current", Units.Ampere, Range.Amperes, "Average forward current, full up to the temperature beside it.") { Required = true, InDescription = true, Fall = new(Knee, JunctionMax) },
        new(Knee, "average current full to", Units.Celsius, Range.Degrees, "Ambient temperature up to which the average current is full; above it falls to nothing at the greatest junction temperature."),
        new(JunctionMax, "junction limit", Units.Celsius, new(50, 250), "Greatest junction temperature."),
        new(Peak, "repetitive peak current", Units.Ampere, Range.Amperes, "Peak current that may recur every cycle."),
        new(Surge, "surge current", Units.Ampere, Range.Amperes, "One half sine of 10 ms or 8.3 ms, not recurring."),
        new(MeltingIntegral, "surge integral", Units.AmpereSquaredSecond, new(1e-6, 1e6), "I²t for pulses under 10 ms."),
        new(Threshold, "threshold voltage", Units.Volt, Range.Drop, "Where the straight line through the forward curve meets zero current, at 25 °C."),
        new(Slope, "slope resistance", Units.Ohm, new(0, 100), "Slope of that line, of one diode."),
        new(ThresholdDrift, "threshold drift", Units.VoltPerKelvin, new(-0.01, 0.01), "Change of the threshold with junction temperature; blank counts as none."),
        new(LowVoltage, "forward voltage, low point", Units.Volt, Range.Drop, "At the current beside it, 25 °C."),
        new(LowCurrent, "low point at", Units.Ampere, Range.Amperes, "Current of the low point."),
        new(HighVoltage, "forward voltage, high point", Units.Volt, Range.Drop, "At the current beside it, 25 °C."),
        new(HighCurrent, "high point at", Units.Ampere, Range.Amperes, "Current of the high point."),
        new(CapacitiveFactor, "on a capacitor", Units.Percent, new(0.1, 1), "Share of the average current that is left with a reservoir behind it; blank counts as all."),
        new(CaseCooling, "junction to case", Units.KelvinPerWatt, Range.Cooling, "Thermal resistance to the case of a part that can be bolted to a sink; of all its diodes together."),
        new(Leakage, "hot reverse current", Units.Ampere, new(1e-9, 10), "Greatest reverse current at rated reverse voltage and the temperature beside it."),
        new(LeakageAt, "hot reverse current at", Units.Celsius, Range.Degrees, "Junction temperature at which it holds."),
        new(RecoveryCharge, "recovery charge", Units.Coulomb, new(1e-12, 1e-3), "Reverse recovery charge, or the charge of the junction capacitance of a Schottky, at rated current."),
        new(Cooling, "junction to air", Units.KelvinPerWatt, Range.Cooling, "Thermal resistance of the whole part in still open air, as mounted."),
    ];
}
