namespace Selector.Engine.Circuits.Thermal;

/// <summary>Thin air cools less.</summary>
public static class Altitude
{
    /// <summary>Pressure over that at sea level, at a height in metres up to 11 000: ISO 2533 standard atmosphere, from memory.</summary>
    public static double Pressure(double height) => Math.Pow(1 - 2.25577e-5 * height, 5.25588);
}
