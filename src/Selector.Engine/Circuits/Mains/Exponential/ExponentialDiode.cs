namespace Selector.Engine.Circuits.Mains.Exponential;

/// <summary>A junction diode by the exponential law with a series resistance: v = n V_t ln(1 + i / I_s) + R_s i.</summary>
/// <param name="SaturationCurrent">I_s at the temperature, A; 1e-30 to 1.</param>
/// <param name="Emission">n; 0.3 to 20.</param>
/// <param name="SeriesResistance">R_s, ohm; 0 to 1e6.</param>
/// <param name="Temperature">°C; above -200, at most 400.</param>
public readonly record struct ExponentialDiode(double SaturationCurrent, double Emission, double SeriesResistance, double Temperature)
{
    /// <summary>Boltzmann's constant over the charge of an electron, V/K (CODATA 2018).</summary>
    private const double VoltPerKelvin = 8.617333262e-5;
    private const double Kelvin = 273.15;

    /// <summary>Bandgap of silicon, V, and the exponent of temperature in the law of the saturation current: the usual defaults of SPICE, from memory.</summary>
    private const double BandGap = 1.11;
    private const double SaturationExponent = 3;

    /// <summary>n V_t, V.</summary>
    public double ThermalVoltage => Emission * VoltPerKelvin * (Temperature + Kelvin);

    internal bool IsInRange => SaturationCurrent is >= 1e-30 and <= 1 && Emission is >= 0.3 and <= 20
        && SeriesResistance is >= 0 and <= 1e6 && Temperature is > -200 and <= 400;

    /// <summary>Forward voltage at a current above -I_s, V.</summary>
    public double Voltage(double current) => ThermalVoltage * Math.Log(1 + current / SaturationCurrent) + SeriesResistance * current;

    /// <summary>The same diode at another temperature: I_s = I_s0 (T/T_0)^(X/n) exp(E_g (1/V_t0 - 1/V_t) / n).</summary>
    public ExponentialDiode At(double temperature)
    {
        var (then, now) = (Temperature + Kelvin, temperature + Kelvin);
        var saturation = SaturationCurrent * Math.Pow(now / then, SaturationExponent / Emission)
            * Math.Exp(BandGap / Emission / VoltPerKelvin * (1 / then - 1 / now));
        return this with { SaturationCurrent = saturation, Temperature = temperature };
    }

    /// <summary>The diode through two points of a data sheet, with a series resistance that is known or left out.</summary>
    /// <returns>Null where no such diode passes: the voltages or currents do not rise, or the resistance alone takes more than the difference.</returns>
    public static ExponentialDiode? Through(
        (double Voltage, double Current) low, (double Voltage, double Current) high, double seriesResistance, double temperature)
    {
        var (vl, vh) = (low.Voltage - seriesResistance * low.Current, high.Voltage - seriesResistance * high.Current);
        if (!(low.Current > 0 && high.Current > low.Current && vl > 0 && vh > vl))
        {
            return null;
        }

        // Where the current is far above I_s the law is a straight line over its logarithm.
        var thermal = (vh - vl) / Math.Log(high.Current / low.Current);
        var emission = thermal / (VoltPerKelvin * (temperature + Kelvin));
        var diode = new ExponentialDiode(low.Current * Math.Exp(-vl / thermal), emission, seriesResistance, temperature);
        return diode.IsInRange && diode.SaturationCurrent < low.Current / 100 ? diode : null;
    }
}
