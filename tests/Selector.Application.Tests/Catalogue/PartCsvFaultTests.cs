using Selector.Application.Catalogue;
using Selector.Application.Tests.Support;

namespace Selector.Application.Tests.Catalogue;

public sealed class PartCsvFaultTests
{
    private static RowFault Only(params string[] rows)
    {
        var reading = PartCsv.Read(Resistors.Family, Resistors.File(rows));
        return Assert.Single(reading.Faults);
    }

    [Theory]
    [InlineData("Acme,A,film,0,EUR,,1:1,1e12,0.5", "resistance_ohm", "outside")]
    [InlineData("Acme,A,film,0,EUR,,1:1,-5,0.5", "resistance_ohm", "outside")]
    [InlineData("Acme,A,film,0,EUR,,1:1,,0.5", "resistance_ohm", "missing")]
    [InlineData("Acme,A,film,0,EUR,,1:1,abc,0.5", "resistance_ohm", "")]
    [InlineData("Acme,A,film,0,EUR,,1:1,1k,NaN", "power_w", "")]
    [InlineData("Acme,A,film,0,EUR,,1:1,1k,5 V", "power_w", "")]
    [InlineData("Acme,A,film,0,EUR,,1:1,\"1,234\",0.5", "resistance_ohm", "ambiguous")]
    [InlineData("Acme,A,tin,0,EUR,,1:1,1k,0.5", "technology", "no technology")]
    [InlineData(",A,film,0,EUR,,1:1,1k,0.5", "maker", "empty")]
    [InlineData("Acme, ,film,0,EUR,,1:1,1k,0.5", "ordering_code", "empty")]
    [InlineData("Acme,A,film,-1,EUR,,1:1,1k,0.5", "stock", "pieces")]
    [InlineData("Acme,A,film,99999999999,EUR,,1:1,1k,0.5", "stock", "pieces")]
    [InlineData("Acme,A,film,0,,,1:1,1k,0.5", "currency", "currency")]
    [InlineData("Acme,A,film,0,euro,,1:1,1k,0.5", "currency", "currency")]
    [InlineData("Acme,A,film,0,EUR,31.3.2026,1:1,1k,0.5", "price_date", "no day")]
    [InlineData("Acme,A,film,0,EUR,2026-02-30,1:1,1k,0.5", "price_date", "no day")]
    [InlineData("Acme,A,film,0,EUR,,1:0.12345,1k,0.5", "price_breaks", "four decimals")]
    [InlineData("Acme,A,film,0,EUR,,1:-1,1k,0.5", "price_breaks", "no price")]
    [InlineData("Acme,A,film,0,EUR,,10:1 5:2,1k,0.5", "price_breaks", "rise")]
    [InlineData("Acme,A,film,0,EUR,,0:1,1k,0.5", "price_breaks", "quantity")]
    [InlineData("Acme,A,film,0,EUR,,1:99999999999999999999,1k,0.5", "price_breaks", "too high")]
    [InlineData("Acme,A,film,0,EUR,,cheap,1k,0.5", "price_breaks", "quantity")]
    public void A_wrong_cell_is_named_by_row_and_column_with_what_to_do(string row, string column, string reason)
    {
        var fault = Only(Resistors.Row("good"), row);
        Assert.Equal((3, column), (fault.Row, fault.Column));
        Assert.Contains(reason, fault.Reason, StringComparison.Ordinal);
        Assert.NotEmpty(fault.Remedy);
        Assert.StartsWith($"Row 3, column {column}: ", fault.Words, StringComparison.Ordinal);
    }

    [Fact]
    public void Every_wrong_cell_of_a_row_is_named_not_only_the_first()
    {
        var reading = PartCsv.Read(Resistors.Family, Resistors.File("Acme,,tin,x,EUR,,1:1,abc,"));
        Assert.Equal(["ordering_code", "power_w", "resistance_ohm", "stock", "technology"], reading.Faults.Select(f => f.Column).Order());
    }

    [Fact]
    public void Ratings_that_contradict_each_other_are_refused_with_the_familys_own_words()
    {
        var reading = PartCsv.Read(Resistors.Family, "maker,ordering_code,resistance_ohm,power_w,power_knee_degc,power_zero_degc\nAcme,A,1k,1,155,70\n");
        var fault = Assert.Single(reading.Faults);
        Assert.Equal((2, "power_knee_degc", Resistors.Family.Checks[0].Message), (fault.Row, fault.Column, fault.Reason));
    }

    [Fact]
    public void The_same_part_twice_is_refused_at_the_second_row()
    {
        var fault = Only(Resistors.Row("A"), Resistors.Row("B"), Resistors.Row("A"));
        Assert.Equal((4, "ordering_code"), (fault.Row, fault.Column));
        Assert.Contains("row 2", fault.Reason, StringComparison.Ordinal);
    }

    [Theory]
    [InlineData("", 1, "")]
    [InlineData("maker;ordering_code\nA;B", 1, "")]
    [InlineData("maker,ordering_code,resistance_ohm\nA,B,1", 1, "power_w")]
    [InlineData("maker,ordering_code,resistance_ohm,power_w,colour\nA,B,1,1,red", 1, "colour")]
    [InlineData("maker,maker,ordering_code,resistance_ohm,power_w\nA,A,B,1,1", 1, "maker")]
    [InlineData("maker,ordering_code,resistance_ohm,power_w\nA,B,1,1\n\nA,C,1\n", 4, "")]
    [InlineData("maker,ordering_code,resistance_ohm,power_w\nA,B,1,1\nA,\"C,1,1\n", 3, "")]
    [InlineData("maker,ordering_code,resistance_ohm,power_w\nA,\"B\"x,1,1\n", 2, "")]
    [InlineData("maker,ordering_code,resistance_ohm,power_w\nA,B\0,1,1\n", 2, "ordering_code")]
    public void A_file_of_the_wrong_shape_is_refused_where_it_is_wrong(string text, int row, string column)
    {
        var fault = Assert.Single(PartCsv.Read(Resistors.Family, text).Faults);
        Assert.Equal((row, column), (fault.Row, fault.Column));
    }

    [Fact]
    public void A_share_may_be_written_as_fraction_or_per_cent_but_not_as_a_bare_percentage()
    {
        static PartCsvReading Read(string tolerance) => PartCsv.Read(
            Resistors.Family, $"maker,ordering_code,resistance_ohm,power_w,tolerance_frac\nA,B,4k7,250m,{tolerance}\n");
        Assert.Equal(0.05, Read("0.05").Parts[0]["tolerance"]);
        Assert.Equal(0.05, Read("5 %").Parts[0]["tolerance"]);
        Assert.Equal("tolerance_frac", Assert.Single(Read("5").Faults).Column);
        Assert.Equal((4700, 0.25), (Read("").Parts[0]["resistance"], Read("").Parts[0]["power"]));
        Assert.False(Read("").Parts[0].Has("tolerance"));
    }

    [Fact]
    public void No_text_makes_the_reader_throw()
    {
        var random = new Random(7);
        const string Signs = "maker,ordering_code\n\r\"';=\t0123456789kµ:. \ud800\u0000";
        for (var i = 0; i < 3000; i++)
        {
            var body = new string([.. Enumerable.Range(0, random.Next(200)).Select(_ => Signs[random.Next(Signs.Length)])]);
            var reading = PartCsv.Read(Resistors.Family, i % 2 == 0 ? body : Resistors.Heading + "\n" + body);
            Assert.All(reading.Faults, f => Assert.True(f.Row >= 1 && f.Reason.Length > 0 && f.Remedy.Length > 0));
        }
    }
}
