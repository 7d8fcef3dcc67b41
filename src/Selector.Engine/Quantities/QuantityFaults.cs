namespace Selector.Engine.Quantities;

/// <summary>The sentences with which a typed quantity is refused. Each says what to do.</summary>
internal static class QuantityFaults
{
    private const int LongestQuote = 16;

    internal static string Empty(Unit unit) => $"Nothing is written here. Write a number, {Example(unit)}.";

    internal static string TooLong(int limit) => $"The text is longer than {limit} characters. Write one number and its unit.";

    internal static string NoNumber(Unit unit) => $"No number was found. Write a number first, {Example(unit)}.";

    internal static string NotFinite(Unit unit) => $"The value has to be a finite number. Write one, {Example(unit)}.";

    internal static string TooLarge => "The number is too large to be calculated with. Check the exponent and the prefix.";

    internal static string TooSmall => "The number is too small to be told from zero. Check the exponent and the prefix, or write 0.";

    internal static string PlusMinus => "The sign ± is not accepted here. Write one value without it.";

    internal static string Groups => "Write the number without group separators and with one decimal sign, for example 1234.5.";

    internal static string SeveralNumbers => "There seem to be several numbers. Write one number, without spaces between its digits.";

    internal static string Ambiguous(string whole, char sign, string fraction, char decimalSign) =>
        $"{whole}{sign}{fraction} is ambiguous: the sign could be the decimal sign or mark the thousands. "
        + $"Write {whole}{decimalSign}{fraction} or {whole}{fraction}.";

    internal static string Expects(Unit unit, Unit typed) => unit.Symbol.Length == 0
        ? $"This field expects a number without a unit, not {typed.Symbol}. Write the number alone, {Example(unit)}."
        : $"This field expects {unit.Symbol}, not {typed.Symbol}. Write the value in {unit.Symbol}, {Example(unit)}.";

    internal static string NoPrefix(Unit unit) => unit.Symbol.Length == 0
        ? $"A pure number is written without a prefix. Write it in full, {Example(unit)}."
        : $"{unit.Symbol} is written without a prefix. Write the number in full, {Example(unit)}.";

    internal static string Unknown(string typed, Unit unit) => unit.Symbol.Length == 0
        ? $"{Quote(typed)} is not understood. Write a number without a unit, {Example(unit)}."
        : $"{Quote(typed)} is not understood. Write the value in {unit.Symbol}, {Example(unit)}.";

    internal static string PrefixOrUnit(string typed, Unit unit) =>
        $"{Quote(typed)} could be a prefix or the unit {unit.Name}. Write {unit.Symbol} for {unit.Name}, or {typed}{unit.Symbol} with the prefix.";

    internal static string LetterAsSign(char letter, Unit unit) =>
        $"{Quote(letter.ToString())} cannot stand for the decimal sign here. Write a decimal sign, {Example(unit)}.";

    private static string Example(Unit unit) => unit.Scale switch
    {
        UnitScale.Percent => "for example 10 %",
        UnitScale.Plain when unit.Symbol.Length == 0 => "for example 3",
        UnitScale.Plain => $"for example 45 {unit.Symbol}",
        _ => $"for example 4.7 {unit.Symbol}",
    };

    /// <summary>Repeats what was typed only when it is short and printable: no control, direction or half characters go back to a page.</summary>
    private static string Quote(string typed)
    {
        bool printable = typed.Length <= LongestQuote;
        foreach (char c in typed)
        {
            printable &= char.IsLetterOrDigit(c) || char.IsPunctuation(c) || char.IsSymbol(c);
        }

        return printable ? $"\u201c{typed}\u201d" : "The text at the number";
    }
}
