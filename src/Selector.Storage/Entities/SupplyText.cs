namespace Selector.Storage.Entities;

/// <summary>
/// The text of one field as it stands now, with the entry of the log that wrote it. It could be read out of the log; it is kept
/// so that an edit costs the same after ten thousand others.
/// </summary>
public sealed class SupplyText
{
    public int Supply { get; set; }

    public required string Field { get; set; }

    public required string Text { get; set; }

    /// <summary>Sequence of the edit that wrote it.</summary>
    public int Sequence { get; set; }
}
