namespace Selector.Engine.Quantities;
public readonly record struct QuantityReading(double Value, string? Fault);
public static class QuantityReader { public static QuantityReading Read(string t, Unit u) => new(0, null); }
public static class QuantityWriter { public static string Write(double v, Unit u, int d = 3, bool trim = false) => ""; }
