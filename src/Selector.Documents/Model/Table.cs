using System.Collections.Immutable;

namespace Selector.Documents.Model;

/// <summary>A ruled table. Its head is repeated on every sheet that it runs over, and no row is ever split.</summary>
/// <param name="Name">Lower case, hyphens; names the file.</param>
/// <param name="Caption">Printed above it; empty for none.</param>
/// <param name="Columns">Left to right.</param>
/// <param name="Rows">One cell per column each.</param>
public sealed record Table(string Name, string Caption, ImmutableArray<Column> Columns, ImmutableArray<Row> Rows) : Block
{
    /// <summary>Printed instead of rows when there are none: an empty table must say that it is meant.</summary>
    public string WhenEmpty { get; init; } = "None.";

    /// <summary>Printed under the last row, so that a lost sheet is noticed: "End of list: 35 rows."</summary>
    public string Closing { get; init; } = "";
}

/// <summary>Which side a column's text is set against.</summary>
public enum Align
{
    Left,
    Right,
}

/// <summary>A column.</summary>
/// <param name="Key">Lower case, hyphens; heading in files.</param>
/// <param name="Head">As printed.</param>
/// <param name="Width">Share of the width, relative to the other columns.</param>
/// <param name="Align">Numbers stand right.</param>
/// <param name="NoteKey">Heading in files for the small print of its cells; empty when they have none.</param>
public sealed record Column(string Key, string Head, double Width, Align Align = Align.Left, string NoteKey = "")
{
    /// <summary>Holds drawings of what the columns beside it say; files leave it out.</summary>
    public bool IsDrawn { get; init; }
}

/// <summary>A row.</summary>
/// <param name="Cells">One per column.</param>
/// <param name="StartsGroup">Begins a new position: ruled off from what is above.</param>
public sealed record Row(ImmutableArray<Cell> Cells, bool StartsGroup = false)
{
    /// <summary>Cells printed instead where the row is the first on a sheet, so that a position which runs over is named again; empty for the same.</summary>
    public ImmutableArray<Cell> AtTop { get; init; } = [];

    /// <summary>A sum: its numbers are set in weight.</summary>
    public bool IsTotal { get; init; }
}
