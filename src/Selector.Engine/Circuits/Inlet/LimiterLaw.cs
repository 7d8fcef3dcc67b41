namespace Selector.Engine.Circuits.Inlet;

/// <summary>Resistance of an NTC inrush limiter.</summary>
public static class LimiterLaw
{
    private const double Reference = 25;
    private const double Kelvin = 273.15;

    /// <summary>Cold, at an ambient: R = R_25 exp(B (1/T - 1/T_25)), ohm.</summary>
    public static double Cold(double at25, double beta, double temperature) =>
        at25 * Math.Exp(beta * (1 / (temperature + Kelvin) - 1 / (Reference + Kelvin)));

    /// <summary>
    /// Warmed by a steady current: the voltage across it hardly changes with the current, so that the resistance goes with its inverse;
    /// never above the cold one. Common practice, no source.
    /// </summary>
    public static double Steady(double hot, double currentMax, double cold, double current) =>
        current <= hot * currentMax / cold ? cold : hot * currentMax / current;
}
