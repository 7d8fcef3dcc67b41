namespace Selector.Engine.Quantities;

/// <summary>With which prefix the house writes a quantity.</summary>
/// <param name="Exponent">The power of ten that the prefix stands for.</param>
/// <param name="Prefix">The sign before the unit; may be empty.</param>
/// <param name="Symbol">The unit as written behind that prefix.</param>
internal readonly record struct HouseScale(int Exponent, string Prefix, string Symbol)
{
    /// <summary>The scale for a rounded number, or null where a power of ten has to be written out.</summary>
    internal static HouseScale? For(Unit unit, RoundedDecimal number)
    {
        int exponent = number.Exponent;
        if (unit.Scale != UnitScale.Prefixed || unit == Units.Hour)
        {
            // Lives are compared in hours: 20 000 h, never 20 kh.
            return exponent is >= -4 and <= 8 ? new HouseScale(0, "", unit.Symbol) : null;
        }

        if (unit == Units.PerKelvin)
        {
            return exponent is >= -10 and <= -1 ? new HouseScale(-6, "ppm", "/K")
                : exponent is >= 0 and <= 8 ? new HouseScale(0, "", unit.Symbol)
                : null;
        }

        if (exponent is < SiPrefix.Least or >= SiPrefix.Greatest + 3)
        {
            return null;
        }

        int step = unit == Units.Farad ? Capacitance(number)
            : unit == Units.Ohm && exponent == -1 ? 0 // 0.25 Ω, as on the part, rather than 250 mΩ
            : unit == Units.Second && exponent >= 0 ? 0
            : Engineering(exponent);
        return new HouseScale(step, SiPrefix.Of(step).Symbol, unit.Symbol);
    }

    /// <summary>pF, nF, then µF up to 100 000 µF, then F: capacitors are never sold in mF.</summary>
    private static int Capacitance(RoundedDecimal number) => number.Exponent switch
    {
        < -9 => -12,
        < -6 => -9,
        < -1 => -6,
        -1 when number.IsPowerOfTen => -6,
        < 3 => 0,
        _ => Engineering(number.Exponent),
    };

    /// <summary>The multiple of three at or below.</summary>
    private static int Engineering(int exponent) => (int)Math.Floor(exponent / 3.0) * 3;
}
