using System.Globalization;

namespace Selector.Application.Catalogue;

/// <summary>What is wrong with one cell of a file.</summary>
/// <param name="Row">As a spreadsheet counts: the heading is row 1.</param>
/// <param name="Column">Heading of the column; empty when the whole row or file is meant.</param>
/// <param name="Reason">What is wrong.</param>
/// <param name="Remedy">What to do.</param>
public sealed record RowFault(int Row, string Column, string Reason, string Remedy)
{
    /// <summary>In one line.</summary>
    public string Words => Column.Length == 0
        ? string.Create(CultureInfo.InvariantCulture, $"Row {Row}: {Reason} {Remedy}")
        : string.Create(CultureInfo.InvariantCulture, $"Row {Row}, column {Column}: {Reason} {Remedy}");
}
