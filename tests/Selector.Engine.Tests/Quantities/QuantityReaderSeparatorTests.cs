using Selector.Engine.Quantities;

namespace Selector.Engine.Tests.Quantities;

/// <summary>Decimal signs and groups: the rule stated at the reader, each side of each border.</summary>
public class QuantityReaderSeparatorTests
{
    [Theory]
    [InlineData("4,7", 4.7)]
    [InlineData("1,23", 1.23)]
    [InlineData("1,2345", 1.2345)]
    [InlineData("0,123", 0.123)]
    [InlineData("-0,123", -0.123)]
    [InlineData("012,345", 12.345)]
    [InlineData("1234,567", 1234.567)]
    [InlineData("1.234", 1.234)]
    [InlineData(".5", 0.5)]
    [InlineData(",5", 0.5)]
    [InlineData(",500", 0.5)]
    [InlineData("5.", 5)]
    [InlineData("1 500", 1500)]
    [InlineData("1\u202f500", 1500)]
    [InlineData("1\u00a0500", 1500)]
    [InlineData("1\u2009500", 1500)]
    [InlineData("12 345 678,25 V", 12345678.25)]
    [InlineData("1 234,567", 1234.567)]
    [InlineData("1 500 mV", 1.5)]
    public void Understood(string text, double expected) => Reading.Is(expected, text, Units.Volt);

    [Theory]
    [InlineData("1,234")]
    [InlineData("12,345")]
    [InlineData("-123,456 V")]
    [InlineData("1,234k")]
    [InlineData("1,234e3")]
    public void Ambiguous(string text) => Assert.Contains("ambiguous", Reading.Refused(text, Units.Volt), StringComparison.Ordinal);

    [Fact]
    public void AmbiguousTextIsAnsweredWithBothWays() => Assert.Equal(
        "1,234 is ambiguous: the sign could be the decimal sign or mark the thousands. Write 1.234 or 1234.",
        Reading.Refused("1,234", Units.Volt));

    [Theory]
    [InlineData("1.234,5")]
    [InlineData("1,234.5")]
    [InlineData("1.234.567")]
    [InlineData("1,234,567")]
    [InlineData("1'500")]
    [InlineData("1 234.567.8")]
    public void GroupSigns(string text) => Assert.Contains("group separators", Reading.Refused(text, Units.Volt), StringComparison.Ordinal);

    [Theory]
    [InlineData("1 5")]
    [InlineData("15 00")]
    [InlineData("0 500")]
    [InlineData("1500 000")]
    [InlineData("1 5000")]
    [InlineData("3.141 592")]
    [InlineData("1  500")]
    public void SeveralNumbers(string text) => Assert.Contains("several numbers", Reading.Refused(text, Units.Volt), StringComparison.Ordinal);

    [Fact]
    public void AKnownDisplaySettlesItsOwnSignAndDoubtsTheOther()
    {
        Reading.Is(1.234, "1,234", Units.Volt, NumberDisplay.German);
        Reading.Is(1.234, "1.234", Units.Volt, NumberDisplay.English);
        Reading.Is(4.7, "4.7", Units.Volt, NumberDisplay.German);
        Assert.Contains("Write 1,234 or 1234", Reading.Refused("1.234", Units.Volt, NumberDisplay.German), StringComparison.Ordinal);
        Assert.Contains("ambiguous", Reading.Refused("1,234", Units.Volt, NumberDisplay.English), StringComparison.Ordinal);
    }
}
