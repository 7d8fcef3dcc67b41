using System.Collections.Immutable;
using System.Globalization;
using CsvHelper;
using Selector.Engine.Parts;

namespace Selector.Application.Catalogue;

/// <summary>A catalogue file as understood.</summary>
/// <param name="Parts">The rows that are good; their number in the store is not known yet.</param>
/// <param name="Faults">What is wrong with the others, in the order of the file.</param>
public sealed record PartCsvReading(ImmutableArray<Part> Parts, ImmutableArray<RowFault> Faults);

/// <summary>The parts of one family as CSV, in and out. Columns come from the family; a new rating needs nothing here.</summary>
public static class PartCsv
{
    private static readonly CsvWriterOptions Rfc4180 = new() { Separator = ',', NewLine = "\n", HasHeader = false };

    /// <summary>Reads a file. Never throws on its content.</summary>
    public static PartCsvReading Read(FamilySpec family, string text)
    {
        ArgumentNullException.ThrowIfNull(family);
        var table = CsvTable.Read(text, PartColumns.Of(family), PartColumns.Needed(family));
        var parts = ImmutableArray.CreateBuilder<Part>();
        var faults = table.Faults.ToBuilder();
        var seen = new Dictionary<(string, string), int>();
        foreach (var row in table.Rows)
        {
            var reader = new PartRow(family, row);
            var part = reader.Read();
            faults.AddRange(reader.Faults);
            if (part is null)
            {
                continue;
            }

            if (seen.TryAdd((part.Maker, part.OrderingCode), row.Number))
            {
                parts.Add(part);
            }
            else
            {
                var first = seen[(part.Maker, part.OrderingCode)];
                faults.Add(new(row.Number, PartColumns.OrderingCode, $"{part.FullName} is already in row {first}.", "Keep one of them."));
            }
        }

        return new(parts.ToImmutable(), [.. faults.OrderBy(f => f.Row)]);
    }

    /// <summary>Writes a file; what <see cref="Read"/> makes of it are the same parts.</summary>
    public static string Write(FamilySpec family, IEnumerable<Part> parts)
    {
        ArgumentNullException.ThrowIfNull(family);
        using var text = new StringWriter(CultureInfo.InvariantCulture);
        using (var csv = CsvWriter.Create(text, Rfc4180, leaveOpen: true))
        {
            csv.WriteRecord([.. PartColumns.Of(family)]);
            foreach (var part in parts)
            {
                csv.WriteRecord([.. Cells(part)]);
            }
        }

        return text.ToString();
    }

    private static IEnumerable<string> Cells(Part part)
    {
        string[] common =
        [
            SafeCell.Out(part.Maker),
            SafeCell.Out(part.OrderingCode),
            SafeCell.Out(part.ShopNumber),
            SafeCell.Out(part.Technology),
            SafeCell.Out(part.Package),
            LifecycleWords.Of(part.Lifecycle),
            part.Stock.ToString(CultureInfo.InvariantCulture),
            part.LeastOrder.ToString(CultureInfo.InvariantCulture),
            part.Multiple.ToString(CultureInfo.InvariantCulture),
            SafeCell.Out(part.Prices.Currency),
            part.Prices.Date,
            PriceBreaks.Format(part.Prices.Breaks),
            SafeCell.Out(part.Source),
        ];
        return common.Concat(part.Family.Ratings.Zip(part.Ratings, RatingCell.Write));
    }
}
