namespace Selector.Engine.Quantities;

/// <summary>What the text behind a number, or the letter within a code, means for an expected unit.</summary>
/// <param name="Exponent">The power of ten to apply.</param>
/// <param name="HasPrefix">True when a prefix was typed.</param>
/// <param name="Fault">Why it is refused; null when it is understood.</param>
internal readonly record struct UnitText(int Exponent, bool HasPrefix, string? Fault)
{
    private static UnitText Refused(string fault) => new(0, false, fault);

    /// <summary>
    /// Reads prefix and unit. The strict reading comes first, then the strict reading in any other unit (refused, naming both),
    /// and only then case is forgiven: so "10 uh" for an inductance is hours and refused, while "4.7 uf" is a capacitance.
    /// </summary>
    /// <param name="tail">The text, without white space.</param>
    /// <param name="unit">The expected unit.</param>
    internal static UnitText Resolve(string tail, Unit unit)
    {
        if (tail.Length == 0 || UnitSpelling.Strict(unit, tail))
        {
            return default;
        }

        bool prefixed = unit.Scale == UnitScale.Prefixed;
        if (prefixed && Split(tail, unit, UnitSpelling.Strict) is { } strict)
        {
            return tail.Length == 1 && UnitSpelling.Loose(unit, tail)
                ? Refused(QuantityFaults.PrefixOrUnit(tail, unit))
                : new UnitText(strict, true, null);
        }

        if (Foreign(tail, unit) is { } other)
        {
            return Refused(QuantityFaults.Expects(unit, other));
        }

        if (UnitSpelling.Loose(unit, tail))
        {
            return default;
        }

        if (Split(tail, unit, UnitSpelling.Loose) is { } loose)
        {
            return prefixed ? new UnitText(loose, true, null) : Refused(QuantityFaults.NoPrefix(unit));
        }

        return Refused(QuantityFaults.Unknown(tail, unit));
    }

    /// <summary>Reads the letter that stands for the decimal sign (IEC 60062): a prefix, R for ohm, or the capital sign of the unit.</summary>
    /// <param name="letter">The letter.</param>
    /// <param name="leads">True when no digit stands before it.</param>
    /// <param name="unit">The expected unit.</param>
    internal static UnitText Letter(char letter, bool leads, Unit unit)
    {
        string text = letter.ToString();
        if (unit.Scale == UnitScale.Prefixed && SiPrefix.ExponentOf(letter) is { } exponent)
        {
            return new UnitText(exponent, true, null);
        }

        if (!UnitSpelling.Strict(unit, text) && Foreign(text, unit) is { } other)
        {
            return Refused(QuantityFaults.Expects(unit, other));
        }

        // A capital only: 1h30 is an hour and a half to most people, not 1.3 h.
        bool own = unit.Scale == UnitScale.Prefixed && UnitSpelling.IsCapital(unit, letter) && (!leads || unit == Units.Ohm);
        return own ? default : Refused(QuantityFaults.LetterAsSign(letter, unit));
    }

    private static int? Split(string tail, Unit unit, Func<Unit, string, bool> matches)
    {
        if (unit == Units.PerKelvin && Ratio(tail) is { } ratio && matches(unit, tail[ratio.Length..]))
        {
            return ratio.Exponent;
        }

        if (SiPrefix.AtStart(tail) is not { } prefix)
        {
            return null;
        }

        string rest = tail[prefix.Length..];
        if (rest.Length == 0)
        {
            // A capital K alone is kelvin, except where it has always been written for kilo.
            return tail == "K" && unit != Units.Ohm && unit != Units.Hertz ? null : prefix.Exponent;
        }

        return matches(unit, rest) ? prefix.Exponent : null;
    }

    /// <summary>Temperature coefficients are given in ppm/K or %/K and hardly ever in 1/K.</summary>
    private static (int Exponent, int Length)? Ratio(string tail) =>
        tail.StartsWith("ppm", StringComparison.Ordinal) ? (-6, 3) : tail.StartsWith('%') ? (-2, 1) : null;

    private static Unit? Foreign(string tail, Unit unit)
    {
        foreach (Unit other in Units.All)
        {
            if (other != unit && UnitSpelling.Strict(other, tail))
            {
                return other;
            }
        }

        if (SiPrefix.AtStart(tail) is { } prefix && prefix.Length < tail.Length)
        {
            string rest = tail[prefix.Length..];
            foreach (Unit other in Units.All)
            {
                if (other != unit && other.Scale == UnitScale.Prefixed && UnitSpelling.Strict(other, rest))
                {
                    return other;
                }
            }
        }

        return null;
    }
}
