namespace Selector.Documents.Model;

/// <summary>What stands in a table at one place. The list is closed: each renderer must know every kind.</summary>
public abstract record Cell
{
    private protected Cell()
    {
    }

    /// <summary>As plain text, for files and for reading back; empty where there is nothing to say.</summary>
    public abstract string Text { get; }

    /// <summary>Small print beneath it.</summary>
    public string Note { get; init; } = "";

    public static Cell Empty { get; } = new TextCell("");
}

/// <summary>Words.</summary>
/// <param name="Words">Line feeds part the lines of a list.</param>
/// <param name="Tone">Colour that confirms them.</param>
public sealed record TextCell(string Words, Tone Tone = Tone.Plain) : Cell
{
    /// <summary>Set in weight: the name by which the row is found.</summary>
    public bool Strong { get; init; }

    public override string Text => Words;
}

/// <summary>A number with its unit, written once by the quantity writer and never reformatted.</summary>
/// <param name="Written">Number and unit.</param>
public sealed record NumberCell(string Written) : Cell
{
    public override string Text => Written;
}

/// <summary>A finding: shape, words, colour, in this order of weight.</summary>
/// <param name="Mark">Shape.</param>
/// <param name="Words">The verdict; carries it alone.</param>
/// <param name="Tone">Colour.</param>
public sealed record VerdictCell(Mark Mark, string Words, Tone Tone) : Cell
{
    public override string Text => Words;
}

/// <summary>The pointer scale. It only shows what the columns beside it say, so it has no text of its own.</summary>
/// <param name="Scale">Its geometry; null where there is nothing to draw.</param>
public sealed record ScaleCell(PointerScale? Scale) : Cell
{
    public override string Text => "";
}
