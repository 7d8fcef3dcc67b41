using System.Collections.Immutable;

namespace Selector.Documents.Model;

/// <summary>A piece of a section. The list is closed: each renderer must know every kind.</summary>
public abstract record Block
{
    private protected Block()
    {
    }
}

/// <summary>Running text.</summary>
/// <param name="Text">Whole sentences.</param>
public sealed record Paragraph(string Text) : Block
{
    /// <summary>Set in weight: nobody may miss it.</summary>
    public bool Strong { get; init; }
}

/// <summary>Warnings, set apart from everything else so that nobody reads past them.</summary>
/// <param name="Heading">What it is about, in a few words.</param>
/// <param name="Points">One danger each, with what to do.</param>
public sealed record Caution(string Heading, ImmutableArray<CautionPoint> Points) : Block;

/// <summary>One danger.</summary>
/// <param name="Word">Its name: "Stored energy".</param>
/// <param name="Text">What to do about it.</param>
public sealed record CautionPoint(string Word, string Text);

/// <summary>Labelled values side by side, as in a title block.</summary>
/// <param name="Name">What they are, for files.</param>
/// <param name="Facts">In reading order.</param>
public sealed record FactGrid(string Name, ImmutableArray<Fact> Facts) : Block;

/// <summary>Counts in one strip: what a reader must know before any detail.</summary>
/// <param name="Items">Left to right.</param>
/// <param name="Summary">The same in a sentence.</param>
public sealed record CountStrip(ImmutableArray<CountItem> Items, string Summary) : Block;

/// <summary>One count.</summary>
/// <param name="Value">The number as printed.</param>
/// <param name="Words">What is counted.</param>
/// <param name="Mark">Shape before it.</param>
/// <param name="Tone">Colour that confirms it; plain while the count is zero.</param>
public sealed record CountItem(string Value, string Words, Mark Mark = Mark.None, Tone Tone = Tone.Plain);
