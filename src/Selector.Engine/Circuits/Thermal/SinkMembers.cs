using System.Collections.Immutable;
using Selector.Engine.Parts.Families;
using Selector.Engine.Supplies;

namespace Selector.Engine.Circuits.Thermal;

/// <summary>Which parts share the heat sink, and the positions that this brings.</summary>
internal static class SinkMembers
{
    /// <summary>Metal that may be touched for a moment only, °C: the usual limit for a surface that is not held; confirm with the safety standard of the product. From memory.</summary>
    public const double HotToTouch = 85;

    public static bool Has(RequirementValues r, string position) =>
        r.Is(ThermalStage.Sink, ThermalStage.SinkAll)
        || (position == "U1" && !r.Is(ThermalStage.Sink, ThermalStage.NoSink))
        || (position == "D5" && r.Is(ThermalStage.Sink, "U1 D5"))
        || (position is "BR1" && r.Is(ThermalStage.Sink, "U1 BR"));

    public static ImmutableArray<PositionSpec> Positions(ImmutableHashSet<string> onSink, bool insulated)
    {
        if (onSink.IsEmpty)
        {
            return [];
        }

        var words = string.Join(", ", onSink.Order(StringComparer.Ordinal));
        var sink = new PositionSpec("HS1", $"heat sink of {words}", HeatSinkFamily.Id, 1, ImmutableDictionary<string, double>.Empty
            .Add(HeatSinkFamily.Cooling, 5).Add(HeatSinkFamily.Rise, 50)) { StandInReason = "5 K/W at 50 K" };
        return insulated
            ? [sink, new("IN1", $"insulators of {words}", InterfaceFamily.Id, onSink.Count, ImmutableDictionary<string, double>.Empty
                .Add(InterfaceFamily.Cooling, 1)) { StandInReason = "1 K/W" }]
            : [sink];
    }
}
