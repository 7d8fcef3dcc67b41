using System.Text;
using Selector.Documents.Model;

namespace Selector.Documents.Csv;

/// <summary>
/// Tables of a paper as comma-separated files (RFC 4180). Purchasing opens them in a spreadsheet, and part numbers come from
/// people: a cell that a spreadsheet would take for a formula is made harmless.
/// </summary>
public static class CsvTables
{
    private const string LineEnd = "\r\n";

    /// <summary>Every table of a report, by the name of its file.</summary>
    public static IReadOnlyList<(string Name, string Text)> Of(Report report) =>
        [.. report.Sections.SelectMany(s => s.Blocks).Select(Of).Where(f => f.Name.Length > 0)];

    /// <summary>One table: a heading line of keys, then its rows. The pointer scale is left out, its numbers stand beside it.</summary>
    public static string Of(Table table)
    {
        var text = new StringBuilder();
        Line(text, table.Columns.SelectMany(c => Two(c.IsDrawn, c.Key, c.NoteKey.Length > 0 ? c.NoteKey : null)));
        foreach (var row in table.Rows)
        {
            Line(text, row.Cells.SelectMany((cell, i) => Two(
                table.Columns[i].IsDrawn,
                cell is NumberCell ? cell.Text : Harmless(cell.Text),
                table.Columns[i].NoteKey.Length > 0 ? Harmless(cell.Note) : null)));
        }

        return text.ToString();
    }

    /// <summary>Labelled values as three columns and their fault.</summary>
    public static string Of(FactGrid grid)
    {
        var text = new StringBuilder();
        Line(text, ["label", "value", "understood", "fault"]);
        foreach (var fact in grid.Facts)
        {
            Line(text, new[] { fact.Label, fact.Value, fact.Note, fact.Fault }.Select(Harmless));
        }

        return text.ToString();
    }

    private static (string Name, string Text) Of(Block block) => block switch
    {
        Table table => (table.Name, Of(table)),
        FactGrid grid => (grid.Name, Of(grid)),
        _ => ("", ""),
    };

    private static IEnumerable<string> Two(bool drawn, string first, string? second)
    {
        if (drawn)
        {
            yield break;
        }

        yield return first;
        if (second is not null)
        {
            yield return second;
        }
    }

    /// <summary>An apostrophe before what a spreadsheet would reckon, also behind spaces and in full-width signs.</summary>
    private static string Harmless(string cell)
    {
        var start = cell.AsSpan().TrimStart();
        return (start.Length > 0 && "=+-@\uff1d\uff0b\uff0d\uff20".Contains(start[0], StringComparison.Ordinal)) || cell.StartsWith('\t') || cell.StartsWith('\r')
            ? "'" + cell
            : cell;
    }

    private static void Line(StringBuilder text, IEnumerable<string> cells) =>
        text.AppendJoin(',', cells.Select(Quoted)).Append(LineEnd);

    private static string Quoted(string cell) =>
        cell.AsSpan().IndexOfAny("\",\r\n") >= 0 || cell.StartsWith(' ') || cell.EndsWith(' ')
            ? $"\"{cell.Replace("\"", "\"\"", StringComparison.Ordinal)}\""
            : cell;
}
