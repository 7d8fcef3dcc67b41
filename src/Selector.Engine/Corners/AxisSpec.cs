using Selector.Engine.Quantities;

namespace Selector.Engine.Corners;

/// <summary>One worst-case axis: a condition that is not in the designer's hands.</summary>
/// <param name="Id">Lower case, hyphens: "mains".</param>
/// <param name="Range">From the least to the greatest value that the supply must live with.</param>
/// <param name="Nominal">The everyday value.</param>
/// <param name="Words">The value as the sheet says it: "mains +10 %".</param>
public sealed record AxisSpec(string Id, Interval Range, double Nominal, Func<double, string> Words)
{
    /// <summary>Only the two ends exist, such as output shorted or not.</summary>
    public bool EndsOnly { get; init; }

    /// <summary>Points between the ends that a search looks at before it closes in; more where maxima inside are common.</summary>
    public int Probes { get; init; } = 1;

    /// <summary>The requirement leaves no room on this axis.</summary>
    public bool IsFixed => Range.Width == 0;
}
