using nietras.SeparatedValues;

namespace Selector.Cli.Compute;

/// <summary>Reads a table row by row, solves each and writes it: given and carried columns first, then the computed ones, then the error.</summary>
internal static class CaseTable
{
    private const string Error = "error";

    /// <summary>Solves a file into another.</summary>
    /// <exception cref="CaseFault">The table has no header.</exception>
    public static (int Rows, int Faults) Solve(ICaseKind kind, string cases, string results, CancellationToken cancel)
    {
        using var reader = Sep.New(',').Reader(o => o with { Unescape = true, DisableColCountCheck = true }).FromFile(cases);
        if (reader.Header.IsEmpty)
        {
            throw new CaseFault($"{cases} is empty: the first row must name the columns.");
        }

        // Written beside the result and moved over it, so that a broken run leaves no half table.
        var part = results + ".part";
        var count = Write(kind, reader, part, cancel);
        File.Move(part, results, true);
        return count;
    }

    private static (int Rows, int Faults) Write(ICaseKind kind, SepReader reader, string part, CancellationToken cancel)
    {
        var header = reader.Header.ColNames;
        var carried = header.Where(h => !kind.Computed.Contains(h) && h != Error).ToArray();
        using var writer = Sep.New(',').Writer(o => o with { Escape = true }).ToFile(part);
        var (rows, faults) = (0, 0);
        foreach (var row in reader)
        {
            cancel.ThrowIfCancellationRequested();
            var cells = new Dictionary<string, string>(StringComparer.Ordinal);
            for (var i = 0; i < header.Count; i++)
            {
                cells[header[i]] = i < row.ColCount ? row[i].ToString() : "";
            }

            var (computed, fault) = SolveRow(kind, new CaseRow(cells), cancel);
            using var written = writer.NewRow();
            foreach (var column in carried)
            {
                written[column].Set(cells[column]);
            }

            foreach (var (column, value) in kind.Computed.Zip(computed))
            {
                written[column].Set(value);
            }

            written[Error].Set(fault);
            rows++;
            faults += fault.Length > 0 ? 1 : 0;
        }

        return (rows, faults);
    }

    private static (IEnumerable<string> Computed, string Fault) SolveRow(ICaseKind kind, CaseRow row, CancellationToken cancel)
    {
        try
        {
            return (kind.Solve(row, cancel), "");
        }
        catch (CaseFault fault)
        {
            return (kind.Computed.Select(_ => ""), fault.Message);
        }
    }
}
