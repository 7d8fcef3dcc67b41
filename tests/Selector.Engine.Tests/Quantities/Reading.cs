using Selector.Engine.Quantities;

namespace Selector.Engine.Tests.Quantities;

/// <summary>Short names for the assertions on readings.</summary>
internal static class Reading
{
    internal static void Is(double expected, string text, Unit unit, NumberDisplay? display = null)
    {
        QuantityReading reading = QuantityReader.Read(text, unit, display);
        Assert.True(reading.Ok, $"{text}: {reading.Fault}");
        Assert.Equal(BitConverter.DoubleToInt64Bits(expected), BitConverter.DoubleToInt64Bits(reading.Value));
    }

    internal static string Refused(string text, Unit unit, NumberDisplay? display = null)
    {
        QuantityReading reading = QuantityReader.Read(text, unit, display);
        Assert.False(reading.Ok, $"{text} was read as {reading.Value:R}");
        Assert.Equal(0, reading.Value);
        return reading.Fault!;
    }

    /// <summary>Units by name, so that test cases can be constants.</summary>
    internal static Unit Unit(string key) => Units.All.Single(u => u.Key == key);
}
