using Selector.Engine.Quantities;

namespace Selector.Engine.Tests.Quantities;

/// <summary>The house style; "_" stands for U+202F in the expected texts.</summary>
public class QuantityWriterTests
{
    [Theory]
    [InlineData(1.28, "a", "1.28_A")]
    [InlineData(1.5, "a", "1.50_A")]
    [InlineData(0.99996, "a", "1.00_A")]
    [InlineData(0.0125, "a", "12.5_mA")]
    [InlineData(-12, "v", "-12.0_V")]
    [InlineData(4.7e-3, "farad", "4700_\u00b5F")]
    [InlineData(22e-3, "farad", "22000_\u00b5F")]
    [InlineData(0.1, "farad", "100000_\u00b5F")]
    [InlineData(0.0999999, "farad", "100000_\u00b5F")]
    [InlineData(0.101, "farad", "0.101_F")]
    [InlineData(1.5, "farad", "1.50_F")]
    [InlineData(4.7e-6, "farad", "4.70_\u00b5F")]
    [InlineData(0.47e-6, "farad", "470_nF")]
    [InlineData(33e-12, "farad", "33.0_pF")]
    [InlineData(0.25, "ohm", "0.250_\u03a9")]
    [InlineData(0.012, "ohm", "12.0_m\u03a9")]
    [InlineData(4700, "ohm", "4.70_k\u03a9")]
    [InlineData(0.12, "frac", "12.0_%")]
    [InlineData(1.0, "frac", "100_%")]
    [InlineData(45, "degc", "45_\u00b0C")]
    [InlineData(45.25, "degc", "45.3_\u00b0C")]
    [InlineData(1.26, "degc", "1.3_\u00b0C")]
    [InlineData(-0.02, "degc", "0_\u00b0C")]
    [InlineData(125.4, "degc", "125_\u00b0C")]
    [InlineData(20000, "h", "20000_h")]
    [InlineData(1200, "s", "1200_s")]
    [InlineData(0.01, "s", "10.0_ms")]
    [InlineData(50e-6, "per_k", "50.0_ppm/K")]
    [InlineData(-0.002, "v_per_k", "-2.00_mV/K")]
    [InlineData(0.0335, "k_per_w", "0.0335_K/W")]
    [InlineData(7, "n", "7.00")]
    [InlineData(0, "v", "0_V")]
    [InlineData(1e20, "v", "1.00e20_V")]
    [InlineData(1e-20, "k_per_w", "1.00e-20_K/W")]
    public void Invariant(double value, string unit, string expected) =>
        Assert.Equal(expected.Replace('_', '\u202f'), QuantityWriter.Write(value, Reading.Unit(unit)));

    [Theory]
    [InlineData(4.7e-6, "farad", "4.7_\u00b5F")]
    [InlineData(100, "ohm", "100_\u03a9")]
    [InlineData(1000, "ohm", "1_k\u03a9")]
    [InlineData(0.25, "ohm", "0.25_\u03a9")]
    [InlineData(0.1, "frac", "10_%")]
    [InlineData(7, "n", "7")]
    public void NominalValuesAreTrimmed(double value, string unit, string expected) =>
        Assert.Equal(expected.Replace('_', '\u202f'), QuantityWriter.Write(value, Reading.Unit(unit), trim: true));

    [Fact]
    public void DisplaysDifferInTheirSigns()
    {
        Assert.Equal("20\u202f000\u202fh", QuantityWriter.Write(20000, Units.Hour, display: NumberDisplay.English));
        Assert.Equal("\u22121.50\u202fV", QuantityWriter.Write(-1.5, Units.Volt, display: NumberDisplay.English));
        Assert.Equal("\u22121,50\u202fV", QuantityWriter.Write(-1.5, Units.Volt, display: NumberDisplay.German));
        Assert.Equal("1,50\u202fV", QuantityWriter.Write(1.5, Units.Volt, display: NumberDisplay.French));
        Assert.Equal("100\u202f000\u202f\u00b5F", QuantityWriter.Write(0.1, Units.Farad, display: NumberDisplay.Turkish));
        Assert.Equal("4700\u202f\u00b5F", QuantityWriter.Write(4.7e-3, Units.Farad, display: NumberDisplay.German));
    }

    [Fact]
    public void PerCentTakesTheDigitsAskedFor() => Assert.Equal("12\u202f%", QuantityWriter.Write(0.12, Units.Percent, 2));

    [Theory]
    [InlineData(double.NaN)]
    [InlineData(double.PositiveInfinity)]
    [InlineData(double.NegativeInfinity)]
    public void NothingInfiniteLeaves(double value) =>
        Assert.Throws<ArgumentOutOfRangeException>(() => QuantityWriter.Write(value, Units.Volt));

    [Theory]
    [InlineData(0)]
    [InlineData(18)]
    public void DigitsHaveARange(int digits) =>
        Assert.Throws<ArgumentOutOfRangeException>(() => QuantityWriter.Write(1, Units.Volt, digits));
}
