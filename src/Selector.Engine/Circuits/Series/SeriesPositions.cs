using System.Collections.Immutable;
using Selector.Engine.Parts.Families;
using Selector.Engine.Supplies;

namespace Selector.Engine.Circuits.Series;

/// <summary>Positions of the series regulator with their hand-book starting values.</summary>
internal static class SeriesPositions
{
    public static ImmutableArray<PositionSpec> List(RequirementValues r) =>
    [
        new("U1", "series regulator", LinearRegulatorFamily.Id, 1, ImmutableDictionary<string, double>.Empty
            .Add(LinearRegulatorFamily.LimitMin, 1.2 * r[CommonFields.LoadFull])
            .Add(LinearRegulatorFamily.LimitMax, 1.5 * r[CommonFields.LoadFull])
            .Add(LinearRegulatorFamily.Drop, 2)
            .Add(LinearRegulatorFamily.Rejection, 1000)
            .Add(LinearRegulatorFamily.CaseCooling, 4)
            .Add(LinearRegulatorFamily.Cooling, 60))
        {
            StandInReason = "drop-out of 2 V, limit at one and a half times the full load",
        },
        new("C2", "output capacitor", CapacitorFamily.Id, 1, ImmutableDictionary<string, double>.Empty
            .Add(CapacitorFamily.Capacitance, 47e-6).Add(CapacitorFamily.EsrHigh, 0.5)) { StandInReason = "47 µF" },
    ];
}
