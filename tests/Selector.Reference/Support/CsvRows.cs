using System.Globalization;

namespace Selector.Reference.Support;

/// <summary>One row of a reference table by column name.</summary>
internal sealed class CsvRow(IReadOnlyList<string> names, string[] cells)
{
    public string Id => this["id"];

    public string this[string name]
    {
        get
        {
            for (var i = 0; i < names.Count; i++)
            {
                if (names[i] == name)
                {
                    return cells[i];
                }
            }

            throw new KeyNotFoundException(name);
        }
    }

    public bool Has(string name) => names.Contains(name);

    /// <summary>The cell as a number; an empty cell is not applicable and reads as zero.</summary>
    public double Number(string name) =>
        this[name].Length == 0 ? 0 : double.Parse(this[name], NumberStyles.Float, CultureInfo.InvariantCulture);

    /// <summary>
    /// The largest value of the row with the unit of a column: the last part of its name. What a difference is small against.
    /// </summary>
    public double LargestOfUnit(string name)
    {
        var unit = Unit(name);
        var largest = 0.0;
        for (var i = 0; i < names.Count; i++)
        {
            if (Unit(names[i]) == unit && !names[i].StartsWith("info_", StringComparison.Ordinal) && cells[i].Length > 0
                && double.TryParse(cells[i], NumberStyles.Float, CultureInfo.InvariantCulture, out var value))
            {
                largest = Math.Max(largest, Math.Abs(value));
            }
        }

        return largest;
    }

    private static string Unit(string name) => name[(name.LastIndexOf('_') + 1)..];
}

/// <summary>Reads the reference tables that lie beside the tests.</summary>
internal static class CsvRows
{
    public static IReadOnlyList<CsvRow> Of(string file)
    {
        var lines = File.ReadAllLines(Path.Combine(Folder(), file));
        var names = lines[0].Split(',');
        return [.. lines.Skip(1).Where(line => line.Length > 0).Select(line => new CsvRow(names, line.Split(',')))];
    }

    /// <summary>Deviation by the agreement rule: |difference| over max(|reference|, a thousandth of the unit's largest).</summary>
    public static double Deviation(double value, double reference, double largestOfUnit)
    {
        var scale = Math.Max(Math.Abs(reference), largestOfUnit / 1000);
        return value == reference ? 0 : Math.Abs(value - reference) / scale;
    }

    private static string Folder()
    {
        for (var at = new DirectoryInfo(AppContext.BaseDirectory); at is not null; at = at.Parent)
        {
            var tables = Path.Combine(at.FullName, "Tables");
            if (Directory.Exists(tables))
            {
                return tables;
            }
        }

        throw new DirectoryNotFoundException("Tables");
    }
}
