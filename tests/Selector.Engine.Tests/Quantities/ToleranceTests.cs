using Selector.Engine.Quantities;

namespace Selector.Engine.Tests.Quantities;

/// <summary>Limits worked out by hand.</summary>
public class ToleranceTests
{
    [Fact]
    public void BothSidesOfAnElectrolytic()
    {
        var tolerance = new Tolerance(0.2, 0.5);
        Assert.Equal(80, tolerance.Low(100), 12);
        Assert.Equal(150, tolerance.High(100), 12);
        Assert.Equal(new Interval(tolerance.Low(100), tolerance.High(100)), tolerance.Around(100));
    }

    [Fact]
    public void ANegativeValueKeepsItsOrder()
    {
        Tolerance tolerance = Tolerance.Symmetric(0.05);
        Assert.Equal(-12.6, tolerance.Low(-12), 12);
        Assert.Equal(-11.4, tolerance.High(-12), 12);
    }

    [Fact]
    public void TheDefaultIsExact() => Assert.Equal(new Interval(3, 3), default(Tolerance).Around(3));

    [Theory]
    [InlineData(-0.1, 0)]
    [InlineData(1.1, 0)]
    [InlineData(0, -0.1)]
    [InlineData(double.NaN, 0)]
    [InlineData(0, double.PositiveInfinity)]
    public void SidesAreChecked(double minus, double plus) => Assert.Throws<ArgumentOutOfRangeException>(() => new Tolerance(minus, plus));
}
