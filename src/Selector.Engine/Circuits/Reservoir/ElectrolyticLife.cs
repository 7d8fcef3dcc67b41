namespace Selector.Engine.Circuits.Reservoir;

/// <summary>
/// Life of an aluminium electrolytic by the ten-degree rule, with the heat of the ripple: twice as long for every ten kelvins below
/// the rated core. Full ten-degree credit; the ripple rating is then taken without any temperature multiplier.
/// </summary>
public static class ElectrolyticLife
{
    /// <summary>Longest life that may be claimed, whatever the sum says: seals age. 15 years, common practice, no source.</summary>
    public const double Longest = 131_400;

    private const double Doubling = 10;

    /// <summary>Life in hours, at most <see cref="Longest"/>.</summary>
    /// <param name="rated">h at the upper temperature with rated ripple.</param>
    /// <param name="upper">Upper category temperature, °C.</param>
    /// <param name="rise">Rise of the core at rated ripple, K.</param>
    /// <param name="air">Air at its place, °C.</param>
    /// <param name="ripple">Weighted ripple over the rated one.</param>
    public static double Hours(double rated, double upper, double rise, double air, double ripple) =>
        Math.Min(Longest, rated * Math.Pow(2, (upper - air) / Doubling) * Math.Pow(2, rise * (1 - ripple * ripple) / Doubling));
}
