using Selector.Engine.Supplies;

namespace Selector.Documents.Sheets;

/// <summary>How many supplies are built, and with what share of spares.</summary>
/// <param name="Units">At least 1.</param>
/// <param name="Spares">0.04 for 4 %.</param>
/// <param name="Assumed">Why the figures are not the requirement's own; empty when they are.</param>
public sealed record BuildSize(int Units, double Spares, string Assumed)
{
    private const double MostUnits = 1_000_000;

    /// <summary>From the requirement. Without a usable figure one supply and no spares are counted, and the paper says so.</summary>
    public static BuildSize Of(RequirementValues requirement)
    {
        var units = Usable(requirement.Find(CommonFields.Units), 1, MostUnits);
        var spares = Usable(requirement.Find(CommonFields.Spares), 0, 10);
        return new BuildSize(
            units is { } u ? (int)Math.Floor(u) : 1,
            spares ?? 0,
            units is null ? "The requirement gives no usable number of supplies: one is counted." : "");
    }

    private static double? Usable(FieldValue? field, double least, double most) =>
        field is { Fault: null, Value: var v } && v >= least && v <= most ? v : null;
}
