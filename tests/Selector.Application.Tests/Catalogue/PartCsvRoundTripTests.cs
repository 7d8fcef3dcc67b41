using System.Collections.Immutable;
using FsCheck;
using FsCheck.Fluent;
using FsCheck.Xunit;
using Selector.Application.Catalogue;
using Selector.Application.Tests.Support;
using Selector.Engine;
using Selector.Engine.Parts;

namespace Selector.Application.Tests.Catalogue;

public sealed class PartCsvRoundTripTests
{
    /// <summary>Bits, so that not even the last one may change; NaN for what is not given.</summary>
    private static IEnumerable<long> Bits(Part part) => part.Ratings.Select(BitConverter.DoubleToInt64Bits);

    private static Part Back(Part part)
    {
        var reading = PartCsv.Read(part.Family, PartCsv.Write(part.Family, [part]));
        Assert.True(reading.Faults.IsEmpty, string.Join(" ", reading.Faults.Select(f => f.Words)));
        return Assert.Single(reading.Parts);
    }

    [Property(MaxTest = 3000, Arbitrary = [typeof(Cells)])]
    public void Any_text_that_can_be_stored_comes_back_to_the_letter(Cell package, Cell source, Cell number)
    {
        var back = Back(Resistors.Part() with { Package = package.Text, Source = source.Text, ShopNumber = number.Text });
        Assert.Equal((package.Text, source.Text, number.Text), (back.Package, back.Source, back.ShopNumber));
    }

    [Property(MaxTest = 3000, Arbitrary = [typeof(Cells)])]
    public void No_text_leaves_as_a_formula(Cell text)
    {
        var file = PartCsv.Write(Resistors.Family, [Resistors.Part() with { Source = text.Text }]);
        var cell = CsvTable.Read(file, PartColumns.Of(Resistors.Family), []).Rows[0][PartColumns.Source];
        Assert.True(cell.Length == 0 || !"=+-@\t\r\n".Contains(cell[0], StringComparison.Ordinal), cell);
    }

    [Property(MaxTest = 2000)]
    public void Any_rating_in_its_range_comes_back_to_the_bit(int seed)
    {
        var random = new System.Random(seed);
        var family = Standard.Registry.Families[random.Next(Standard.Registry.Families.Length)];
        var part = new Part
        {
            Family = family,
            Maker = "Acme",
            OrderingCode = "X",
            Technology = family.Technologies[0],
            Ratings = [.. family.Ratings.Select(r => Value(r, random))],
        };
        if (PartCheck.Cross(part).Any())
        {
            return;
        }

        Assert.Equal(Bits(part), Bits(Back(part)));
    }

    [Property(MaxTest = 2000)]
    public void Any_price_comes_back_to_the_ten_thousandth(PositiveInt step, PositiveInt[] money)
    {
        var breaks = money.Select((m, i) => new PriceBreak(1 + i * (1 + step.Get % 1000), m.Get)).ToImmutableArray();
        Assert.Equal<PriceBreak>(breaks, PriceBreaks.Parse(PriceBreaks.Format(breaks)));
    }

    [Fact]
    public void A_negative_number_stays_a_number()
    {
        var file = PartCsv.Write(Resistors.Family, [Resistors.Part() with { Ratings = [1000, 0.01, 0.5, -0.002, .. Resistors.Family.Ratings.Skip(4).Select(_ => double.NaN)] }]);
        Assert.Contains(",-0.002,", file, StringComparison.Ordinal);
    }

    private static double Value(RatingSpec spec, System.Random random)
    {
        if (!spec.Required && random.Next(3) == 0)
        {
            return double.NaN;
        }

        if (spec.IsChoice)
        {
            return random.Next(spec.Choices.Length);
        }

        // Over the logarithm, so that small values are met as often as large ones; and at the ends themselves.
        var (low, high) = (spec.Range.Low, spec.Range.High);
        return random.Next(20) switch
        {
            0 => low,
            1 => high,
            _ => low > 0 ? Math.Clamp(low * Math.Pow(high / low, random.NextDouble()), low, high) : spec.Range.At(random.NextDouble()),
        };
    }

    public sealed record Cell(string Text);

    /// <summary>Cells rich in what breaks readers of CSV.</summary>
    public static class Cells
    {
        public static Arbitrary<Cell> Cell() => Gen.Elements(
                "=", "+", "-", "@", "\t", "\r", "\n", "\r\n", "'", "\"", "\"\"", ",", ";", " ", "a", "7", "-0.002", "µ", "Ω", "\U0001F50C", "\uFEFF", "|", "\\")
            .ListOf()
            .Select(p => new Cell(string.Concat(p.Take(30))))
            .ToArbitrary();
    }
}
