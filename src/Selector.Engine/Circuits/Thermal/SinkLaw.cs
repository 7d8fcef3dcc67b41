namespace Selector.Engine.Circuits.Thermal;

/// <summary>A heat sink in still air.</summary>
public static class SinkLaw
{
    /// <summary>
    /// Rise over its air, K. Natural convection carries away with the 1.25th power of the rise, so that a sink is better when hotter
    /// than where the maker stated it, and worse when cooler.
    /// </summary>
    /// <param name="power">W, at least 0.</param>
    /// <param name="resistance">K/W as the maker states it.</param>
    /// <param name="statedRise">At which rise, K.</param>
    /// <param name="pressure">Air pressure over that at sea level.</param>
    public static double Rise(double power, double resistance, double statedRise, double pressure) =>
        power <= 0 ? 0 : Math.Pow(power * resistance * Math.Pow(statedRise, 0.25) / Math.Sqrt(pressure), 0.8);
}
