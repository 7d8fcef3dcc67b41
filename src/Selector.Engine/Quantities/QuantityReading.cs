namespace Selector.Engine.Quantities;

/// <summary>What a typed quantity was understood as, or why it was not.</summary>
/// <param name="Value">The value in the base unit (V, Ω, F, ...; per cent as a fraction). Always finite; 0 when there is a fault.</param>
/// <param name="Fault">A sentence for the person who typed, saying what to do; null when the text was understood.</param>
public readonly record struct QuantityReading(double Value, string? Fault)
{
    /// <summary>True when the text was understood and <see cref="Value"/> may be used.</summary>
    public bool Ok => Fault is null;

    internal static QuantityReading Refused(string fault) => new(0, fault);
}
