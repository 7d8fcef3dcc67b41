namespace Selector.Storage.Entities;

/// <summary>One entry of a supply's log. Entries are only ever added; an undo is the inverse edit, added like any other.</summary>
public sealed class SupplyEdit
{
    public int Supply { get; set; }

    /// <summary>1, 2, 3, ... within the supply.</summary>
    public int Sequence { get; set; }

    public required string Field { get; set; }

    /// <summary>Text before; for a field that was never written, the text that stood in its place.</summary>
    public required string Old { get; set; }

    public required string New { get; set; }

    /// <summary>Who.</summary>
    public required string By { get; set; }

    public DateTime AtUtc { get; set; }

    /// <summary>The entry that this one takes back; null for an edit of its own.</summary>
    public int? Undoes { get; set; }

    /// <summary>The entry under this one on the stack of undos or redos; 0 for the bottom.</summary>
    public int Below { get; set; }
}
