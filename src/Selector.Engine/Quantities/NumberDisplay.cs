namespace Selector.Engine.Quantities;

/// <summary>
/// The signs with which numbers are shown. It is the reader's choice and never the host's culture.
/// </summary>
/// <remarks>
/// Groups of three are set apart by a narrow space in every display and not by a comma or a point (ISO 80000-1, from memory):
/// a printed number can then be typed or pasted back without a doubt about which sign is the decimal one.
/// </remarks>
public sealed record NumberDisplay
{
    private const string NarrowSpace = "\u202f";
    private const string TrueMinus = "\u2212";

    private NumberDisplay(char decimalSign, string groupSign, string minusSign)
    {
        DecimalSign = decimalSign;
        GroupSign = groupSign;
        MinusSign = minusSign;
    }

    /// <summary>For files and messages: decimal point, no groups, hyphen as minus.</summary>
    public static NumberDisplay Invariant { get; } = new('.', "", "-");

    /// <summary>Decimal point.</summary>
    public static NumberDisplay English { get; } = new('.', NarrowSpace, TrueMinus);

    /// <summary>Decimal comma.</summary>
    public static NumberDisplay German { get; } = new(',', NarrowSpace, TrueMinus);

    /// <summary>Decimal comma.</summary>
    public static NumberDisplay French { get; } = new(',', NarrowSpace, TrueMinus);

    /// <summary>Decimal comma.</summary>
    public static NumberDisplay Turkish { get; } = new(',', NarrowSpace, TrueMinus);

    /// <summary>A point or a comma.</summary>
    public char DecimalSign { get; }

    /// <summary>What stands between groups of three in numbers of five and more digits; empty for nothing.</summary>
    public string GroupSign { get; }

    /// <summary>What stands before a negative number.</summary>
    public string MinusSign { get; }
}
