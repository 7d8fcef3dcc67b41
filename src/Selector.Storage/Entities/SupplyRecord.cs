namespace Selector.Storage.Entities;

/// <summary>A supply. What it is stands in its texts; how it came to be stands in its log.</summary>
public sealed class SupplyRecord : IVersioned
{
    public int Number { get; set; }

    public required string Name { get; set; }

    public DateTime CreatedUtc { get; set; }

    public DateTime EditedUtc { get; set; }

    /// <summary>Sequence of the last entry of the log.</summary>
    public int LastSequence { get; set; }

    /// <summary>Sequence of the edit that an undo would take back; 0 for none. The edits below it are linked by <see cref="SupplyEdit.Below"/>.</summary>
    public int UndoTop { get; set; }

    /// <summary>Sequence of the undo that a redo would take back; 0 for none.</summary>
    public int RedoTop { get; set; }

    public long Version { get; set; }
}
