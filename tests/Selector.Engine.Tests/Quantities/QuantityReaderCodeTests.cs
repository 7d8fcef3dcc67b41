namespace Selector.Engine.Tests.Quantities;

/// <summary>Letter codes: IEC 60062, from memory; with V and A in the same place, as circuit diagrams have them.</summary>
public class QuantityReaderCodeTests
{
    [Theory]
    [InlineData("4k7", "ohm", 4.7e3)]
    [InlineData("4K7", "ohm", 4.7e3)]
    [InlineData("4k7 ohm", "ohm", 4.7e3)]
    [InlineData("4k7\u03a9", "ohm", 4.7e3)]
    [InlineData("59K04", "ohm", 59.04e3)]
    [InlineData("R10", "ohm", 0.1)]
    [InlineData("R22", "ohm", 0.22)]
    [InlineData("0R25", "ohm", 0.25)]
    [InlineData("4R7", "ohm", 4.7)]
    [InlineData("4r7", "ohm", 4.7)]
    [InlineData("1M0", "ohm", 1e6)]
    [InlineData("1m0", "ohm", 1e-3)]
    [InlineData("K33", "ohm", 330)]
    [InlineData("4u7", "farad", 4.7e-6)]
    [InlineData("4\u00b57", "farad", 4.7e-6)]
    [InlineData("4\u03bc7 F", "farad", 4.7e-6)]
    [InlineData("n33", "farad", 0.33e-9)]
    [InlineData("3n3", "farad", 3.3e-9)]
    [InlineData("4p7", "farad", 4.7e-12)]
    [InlineData("2u2", "farad", 2.2e-6)]
    [InlineData("1m0", "farad", 1e-3)]
    [InlineData("1A5", "a", 1.5)]
    [InlineData("3V3", "v", 3.3)]
    [InlineData("3v3", "v", 3.3)]
    [InlineData("-3V3", "v", -3.3)]
    public void Understood(string text, string unit, double expected) => Reading.Is(expected, text, Reading.Unit(unit));

    [Theory]
    [InlineData("4k7k", "ohm")]
    [InlineData("4.7k2", "ohm")]
    [InlineData("4 k7", "ohm")]
    [InlineData("4k 7", "ohm")]
    [InlineData("4k7.5", "ohm")]
    [InlineData("V33", "v")]
    [InlineData("E5", "v")]
    [InlineData("1h30", "h")]
    [InlineData("1s5", "s")]
    [InlineData("4k7", "degc")]
    [InlineData("4U7", "farad")]
    public void Refused(string text, string unit) => Reading.Refused(text, Reading.Unit(unit));

    [Theory]
    [InlineData("4R7", "v", "expects V, not \u03a9")]
    [InlineData("1A5", "v", "expects V, not A")]
    [InlineData("3V3", "a", "expects A, not V")]
    [InlineData("3V3", "n", "without a unit, not V")]
    public void AnotherUnitIsNamed(string text, string unit, string words) =>
        Assert.Contains(words, Reading.Refused(text, Reading.Unit(unit)), StringComparison.Ordinal);
}
