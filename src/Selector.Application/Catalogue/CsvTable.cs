using System.Collections.Immutable;
using CsvHelper;

namespace Selector.Application.Catalogue;

/// <summary>One row of a file.</summary>
public sealed class CsvLine(int number, IReadOnlyDictionary<string, int> columns, string[] cells)
{
    /// <summary>As a spreadsheet counts: the heading is row 1.</summary>
    public int Number => number;

    /// <summary>A cell by heading; empty when the file has no such column.</summary>
    public string this[string column] => columns.TryGetValue(column, out var at) ? cells[at] : "";
}

/// <summary>
/// A file of comma-separated values (RFC 4180) with a heading, taken apart but not yet understood. Whatever is wrong with its shape
/// becomes a fault in words; no text makes it throw.
/// </summary>
public sealed record CsvTable(ImmutableArray<CsvLine> Rows, ImmutableArray<RowFault> Faults)
{
    private const int MostRows = 200_000;
    private const int MostFaults = 1000;

    private static readonly CsvReaderOptions Rfc4180 = new()
    {
        Separator = ',',
        HasHeader = false,
        SkipEmptyLines = false,
        TrimWhitespace = false,
        MalformedData = CsvMalformedDataHandling.Throw,
    };

    /// <param name="text">The whole file.</param>
    /// <param name="known">Headings that mean something; another one is a fault, since a misspelt heading would lose its column.</param>
    /// <param name="needed">Headings that must be there.</param>
    public static CsvTable Read(string text, IReadOnlyCollection<string> known, IReadOnlyCollection<string> needed)
    {
        ArgumentNullException.ThrowIfNull(text);
        var rows = ImmutableArray.CreateBuilder<CsvLine>();
        var faults = ImmutableArray.CreateBuilder<RowFault>();
        using var reader = CsvReader.FromText(text.TrimStart('\uFEFF'), Rfc4180);
        try
        {
            if (!reader.Read())
            {
                return new([], [new(1, "", "The file is empty.", "Give a heading and rows.")]);
            }

            string[] heading = [.. Cells(reader).Select(h => h.Trim())];
            faults.AddRange(Heading(heading, known, needed));
            if (faults.Count > 0)
            {
                return new([], faults.ToImmutable());
            }

            var columns = heading.Select((h, i) => (h, i)).ToDictionary(x => x.h, x => x.i, StringComparer.Ordinal);
            for (var number = 2; reader.Read() && faults.Count < MostFaults; number++)
            {
                var cells = Cells(reader);
                if (cells.Length == 1 && cells[0].Length == 0)
                {
                    continue;
                }

                if (Shape(number, cells, heading, rows.Count) is { } fault)
                {
                    faults.Add(fault);
                }
                else
                {
                    rows.Add(new CsvLine(number, columns, cells));
                }
            }
        }
        catch (CsvFormatException e)
        {
            var row = (int)Math.Clamp(e.RecordNumber, 1, int.MaxValue);
            faults.Add(new(row, "", "The row cannot be read as comma-separated values.", "Check its quotation marks."));
        }

        return new(rows.ToImmutable(), faults.ToImmutable());
    }

    private static string[] Cells(CsvReader reader)
    {
        var cells = new string[reader.FieldCount];
        for (var i = 0; i < cells.Length; i++)
        {
            cells[i] = reader.GetString(i);
        }

        return cells;
    }

    private static RowFault? Shape(int number, string[] cells, string[] heading, int rows) =>
        cells.Length != heading.Length
            ? new(number, "", $"The row has {cells.Length} cells, the heading {heading.Length}.", "Put cells with a comma in quotation marks.")
        : Array.FindIndex(cells, c => !PlainText.IsKept(c)) is >= 0 and var bad
            ? new(number, heading[bad], "The cell has characters that cannot be stored.", "Save the file as UTF-8 and try again.")
        : rows == MostRows
            ? new(number, "", $"The file has more than {MostRows} rows.", "Split it.")
        : null;

    private static IEnumerable<RowFault> Heading(string[] heading, IReadOnlyCollection<string> known, IReadOnlyCollection<string> needed)
    {
        if (heading.Length == 1 && heading[0].IndexOfAny([';', '\t']) >= 0)
        {
            return [new(1, "", "The cells are not separated by commas.", "Save the file with commas between the cells.")];
        }

        var unknown = heading.Where(h => !known.Contains(h)).Select(h =>
            new RowFault(1, PlainText.Short(h), "There is no such column.", $"Known are {string.Join(", ", known)}."));
        var twice = heading.GroupBy(h => h, StringComparer.Ordinal).Where(g => g.Count() > 1).Select(g =>
            new RowFault(1, PlainText.Short(g.Key), "The column is there twice.", "Keep one of them."));
        var missing = needed.Where(n => !heading.Contains(n)).Select(n => new RowFault(1, n, "The column is missing.", "Add it."));
        return unknown.Concat(twice).Concat(missing);
    }
}
