using System.Globalization;
using FsCheck.Xunit;
using Selector.Engine.Quantities;

namespace Selector.Engine.Tests.Quantities;

/// <summary>E series: IEC 60063 as printed in public articles; the values stand in e_series.csv beside this file.</summary>
public class PreferredNumbersTests
{
    private static readonly PreferredSeries[] All = Enum.GetValues<PreferredSeries>();

    [Fact]
    public void EveryPrintedValueAndNoOther()
    {
        using Stream stream = typeof(PreferredNumbersTests).Assembly.GetManifestResourceStream("e_series.csv")!;
        using var reader = new StreamReader(stream);
        string[] lines = reader.ReadToEnd().Split('\n', StringSplitOptions.RemoveEmptyEntries);
        var printed = lines.Skip(1).Select(l => l.Split(',')).ToLookup(
            c => Enum.Parse<PreferredSeries>(c[0]), c => double.Parse(c[2], CultureInfo.InvariantCulture));
        Assert.Equal(381, lines.Length - 1);
        foreach (PreferredSeries series in All)
        {
            Assert.Equal(printed[series], PreferredNumbers.Values(series));
            Assert.Equal((int)series, PreferredNumbers.Values(series).Length);
        }
    }

    [Theory]
    [InlineData(4.7e-6, 4.7e-6, 4.7e-6)]
    [InlineData(5e-6, 4.7e-6, 5.6e-6)]
    [InlineData(9, 8.2, 10)]
    [InlineData(1000, 1000, 1000)]
    [InlineData(0.001, 0.001, 0.001)]
    [InlineData(999.9999999999999, 820, 1000)]
    public void BothSides(double value, double below, double above)
    {
        Assert.Equal(below, PreferredNumbers.NearestAtMost(value, PreferredSeries.E12));
        Assert.Equal(above, PreferredNumbers.NearestAtLeast(value, PreferredSeries.E12));
    }

    [Theory]
    [InlineData(3.21, 2.2)] // the geometric middle of 2.2 and 4.7 is 3.2156, the arithmetic one 3.45
    [InlineData(3.22, 4.7)]
    [InlineData(6.85, 4.7)] // the middle of 4.7 and 10 is 6.856
    [InlineData(6.87, 10)]
    public void NearestByRatio(double value, double expected) => Assert.Equal(expected, PreferredNumbers.Nearest(value, PreferredSeries.E3));

    [Property(MaxTest = 10_000)]
    public void PreferredValuesAreTheirOwnNeighbours(byte which, byte index, sbyte decade)
    {
        PreferredSeries series = All[which % All.Length];
        double mantissa = PreferredNumbers.Values(series)[index % (int)series];
        double value = double.Parse(FormattableString.Invariant($"{mantissa}E{decade}"), CultureInfo.InvariantCulture);
        Assert.Equal(value, PreferredNumbers.NearestAtLeast(value, series));
        Assert.Equal(value, PreferredNumbers.NearestAtMost(value, series));
        Assert.Equal(value, PreferredNumbers.Nearest(value, series));
    }

    [Property(MaxTest = 10_000)]
    public void NeighboursEnclose(byte which, ushort mantissa, sbyte decade)
    {
        PreferredSeries series = All[which % All.Length];
        double value = (1 + mantissa) * Math.Pow(10, decade);
        double below = PreferredNumbers.NearestAtMost(value, series);
        double above = PreferredNumbers.NearestAtLeast(value, series);
        Assert.InRange(value, below, above);
        Assert.True(below == above || PreferredNumbers.NearestAtLeast(below * 1.0001, series) == above);
        Assert.Contains(PreferredNumbers.Nearest(value, series), new[] { below, above });
    }

    [Theory]
    [InlineData(0)]
    [InlineData(-1)]
    [InlineData(double.NaN)]
    [InlineData(double.PositiveInfinity)]
    [InlineData(1e-301)]
    public void OutOfRange(double value)
    {
        Assert.Throws<ArgumentOutOfRangeException>(() => PreferredNumbers.Nearest(value, PreferredSeries.E12));
        Assert.Throws<ArgumentOutOfRangeException>(() => PreferredNumbers.Values((PreferredSeries)7));
    }

    [Fact]
    public void TheEndsOfTheRangeAreAnswered()
    {
        Assert.Equal(1e300, PreferredNumbers.Nearest(PreferredNumbers.Greatest, PreferredSeries.E192));
        Assert.Equal(1e-300, PreferredNumbers.Nearest(PreferredNumbers.Least, PreferredSeries.E192));
    }
}
