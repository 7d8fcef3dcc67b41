namespace Selector.Engine.Circuits.Reservoir;

/// <summary>How the series resistance of an electrolytic grows in the cold.</summary>
public static class ColdEsr
{
    /// <summary>Factor at -10 °C where the maker does not say. Common practice, no source.</summary>
    public const double Usual = 3;

    private const double Warm = 20;
    private const double Stated = -10;

    /// <summary>Factor on the ESR at 20 °C: 1 in the warm, the stated one at -10 °C, a straight line of its logarithm between and beyond.</summary>
    /// <param name="cold">Factor at -10 °C, at least 1.</param>
    /// <param name="temperature">°C.</param>
    public static double Factor(double cold, double temperature) =>
        temperature >= Warm ? 1 : Math.Pow(cold, (Warm - temperature) / (Warm - Stated));
}
