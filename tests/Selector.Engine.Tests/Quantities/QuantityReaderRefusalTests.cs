using Selector.Engine.Quantities;

namespace Selector.Engine.Tests.Quantities;

/// <summary>What is refused, and that the sentence says what to do.</summary>
public class QuantityReaderRefusalTests
{
    [Theory]
    [InlineData("5 A", "v", "expects V, not A")]
    [InlineData("5 mA", "v", "expects V, not A")]
    [InlineData("5 VA", "v", "expects V, not VA")]
    [InlineData("5 Hz", "henry", "expects H, not Hz")]
    [InlineData("10 uh", "henry", "expects H, not h")]
    [InlineData("20 kH", "h", "expects h, not H")]
    [InlineData("20 K", "degc", "expects \u00b0C, not K")]
    [InlineData("20 K", "v", "expects V, not K")]
    [InlineData("10 %", "v", "expects V, not %")]
    [InlineData("5 mm", "s", "expects s, not mm")]
    [InlineData("5 V", "frac", "expects %, not V")]
    [InlineData("5 V", "n", "without a unit, not V")]
    [InlineData("45 mC", "degc", "\u00b0C is written without a prefix")]
    [InlineData("4 k", "frac", "% is written without a prefix")]
    [InlineData("4 k", "n", "without a prefix")]
    [InlineData("4 kA\u00b2s", "a2s", "without a prefix")]
    [InlineData("4.7 f", "farad", "could be a prefix or the unit farad. Write F for farad, or fF")]
    [InlineData("5 S", "s", "\u201cS\u201d is not understood. Write the value in s")]
    [InlineData("5 bananas", "v", "\u201cbananas\u201d is not understood. Write the value in V")]
    [InlineData("5 \u202e", "v", "The text at the number is not understood")]
    [InlineData("", "v", "Write a number, for example 4.7 V")]
    [InlineData(" \t\u00a0", "v", "Nothing is written")]
    [InlineData("-", "v", "No number was found")]
    [InlineData("volts", "v", "No number was found")]
    [InlineData("--5", "v", "No number was found")]
    [InlineData("\u0664", "v", "No number was found")]
    [InlineData("NaN", "v", "finite")]
    [InlineData("Infinity", "v", "finite")]
    [InlineData("-inf", "v", "finite")]
    [InlineData("\u221e", "v", "finite")]
    [InlineData("\u00b15", "v", "\u00b1 is not accepted")]
    [InlineData("5 \u00b1 1", "v", "is not understood")]
    [InlineData("1e400", "v", "too large")]
    [InlineData("1e308k", "v", "too large")]
    [InlineData("1e99999999999999999999", "v", "too large")]
    [InlineData("1e-400", "v", "too small")]
    [InlineData("1e", "v", "is not understood")]
    public void SaysWhatToDo(string text, string unit, string words) =>
        Assert.Contains(words, Reading.Refused(text, Reading.Unit(unit)), StringComparison.Ordinal);

    [Fact]
    public void TheLongestTextIsReadAndOneMoreIsNot()
    {
        string longest = new string('0', QuantityReader.LongestText - 2) + "5V";
        Reading.Is(5, longest, Units.Volt);
        Assert.Contains("longer than 64", Reading.Refused("0" + longest, Units.Volt), StringComparison.Ordinal);
    }

    [Fact]
    public void TenMegabytesAreRefusedAtOnce() =>
        Assert.Contains("longer than 64", Reading.Refused(new string('9', 10_000_000), Units.Volt), StringComparison.Ordinal);

    [Fact]
    public void NullIsAsGoodAsEmpty() => Assert.Contains("Nothing is written", Reading.Refused(null!, Units.Volt), StringComparison.Ordinal);

    [Fact]
    public void MinusNothingIsNothing()
    {
        Reading.Is(0, "-0", Units.Volt);
        Reading.Is(0, "0e99999 V", Units.Volt);
    }
}
