using System.Collections.Immutable;
using Selector.Application.Catalogue;
using Selector.Engine.Derating;

namespace Selector.Application.Policies;

/// <summary>A policy file as read: the clauses, and what is wrong by row and column.</summary>
public sealed record PolicyReading(ImmutableArray<Clause> Clauses, ImmutableArray<RowFault> Faults);

/// <summary>Reads the clauses of a policy from CSV.</summary>
public static class PolicyCsv
{
    private static readonly ImmutableArray<string> Columns =
        ["family", "technology", "stress", "operator", "basis", "document", "place", "certainty", "note"];

    public static PolicyReading Read(string text)
    {
        var table = CsvTable.Read(text, Columns, Columns);
        var faults = table.Faults.ToBuilder();
        var clauses = ImmutableArray.CreateBuilder<Clause>();
        var seen = new HashSet<(string, string, string)>();
        foreach (var row in table.Rows)
        {
            var before = faults.Count;
            foreach (var column in (string[])["family", "stress", "document"])
            {
                if (row[column].Trim().Length == 0)
                {
                    faults.Add(new(row.Number, column, "The cell is empty.", "Fill it in."));
                }
            }

            var operation = Try("operator", PolicyReader.Operator);
            var basis = Try("basis", PolicyReader.Basis);
            var certainty = Try("certainty", PolicyReader.Certainty);
            if (!seen.Add((row["family"].Trim(), row["technology"].Trim(), row["stress"].Trim())))
            {
                faults.Add(new(row.Number, "stress", "There is already a clause for this family, technology and stress.", "Keep one of them."));
            }

            if (faults.Count == before)
            {
                clauses.Add(new Clause(
                    row["family"].Trim(), row["technology"].Trim(), row["stress"].Trim(), operation!, basis,
                    row["document"], row["place"], certainty, row["note"]));
            }

            T? Try<T>(string column, Func<string, T> read)
            {
                try
                {
                    return read(row[column]);
                }
                catch (FormatException e)
                {
                    faults.Add(new(row.Number, column, e.Message, "Correct the cell."));
                    return default;
                }
            }
        }

        return new PolicyReading(clauses.ToImmutable(), faults.ToImmutable());
    }
}
