namespace Selector.Engine.Quantities;

/// <summary>Compares typed text with the sign and the spellings of a unit.</summary>
internal static class UnitSpelling
{
    /// <summary>As spelled; case is only ignored for spellings in small letters of more than one letter.</summary>
    internal static bool Strict(Unit unit, string text)
    {
        if (Same(unit.Symbol, text))
        {
            return true;
        }

        foreach (string spelling in unit.Spellings)
        {
            if (Same(spelling, text))
            {
                return true;
            }
        }

        return false;
    }

    /// <summary>
    /// Any case; yet of single letters only a small one for a capital (5 v), never the other way round, since S is not second.
    /// </summary>
    internal static bool Loose(Unit unit, string text)
    {
        if (Alike(unit.Symbol, text))
        {
            return true;
        }

        foreach (string spelling in unit.Spellings)
        {
            if (Alike(spelling, text))
            {
                return true;
            }
        }

        return false;
    }

    /// <summary>True when the letter, in either case, is a sign of the unit that is one capital Latin letter: V, A, F, H, W, or R for ohm.</summary>
    internal static bool IsCapital(Unit unit, char letter)
    {
        char capital = char.IsAsciiLetterLower(letter) ? (char)(letter - ('a' - 'A')) : letter;
        return char.IsAsciiLetterUpper(capital) && Strict(unit, capital.ToString()) && !Strict(unit, char.ToLowerInvariant(capital).ToString());
    }

    private static bool Same(string spelling, string text)
    {
        string packed = Packed(spelling);
        return packed.Length > 0
            && (packed == text || (packed.Length > 1 && !HasCapital(packed) && packed.Equals(text, StringComparison.OrdinalIgnoreCase)));
    }

    private static bool Alike(string spelling, string text)
    {
        string packed = Packed(spelling);
        return packed.Length > 0
            && packed.Equals(text, StringComparison.OrdinalIgnoreCase)
            && (packed.Length > 1 || packed == text || HasCapital(packed));
    }

    /// <summary>Typed text comes without white space, so "deg C" is compared as "degC".</summary>
    private static string Packed(string spelling) =>
        spelling.Contains(' ', StringComparison.Ordinal) ? spelling.Replace(" ", "", StringComparison.Ordinal) : spelling;

    private static bool HasCapital(string text)
    {
        foreach (char c in text)
        {
            if (char.IsUpper(c))
            {
                return true;
            }
        }

        return false;
    }
}
