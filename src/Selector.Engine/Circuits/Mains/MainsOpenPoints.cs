using System.Collections.Immutable;

namespace Selector.Engine.Circuits.Mains;

/// <summary>What this version does not compute for the front end; listed on page and paper.</summary>
internal static class MainsOpenPoints
{
    public static ImmutableArray<NotAssessed> List(string rectifier) =>
    [
        new("J1", "mains inlet, continuous current and voltage"),
        new("S1", "mains switch, continuous and switch-on current"),
        new("F1", "fuse: rated current, melting integral, fault current that must open it"),
        new("RT1", "inrush limiter, if any: peak, energy, hot restart"),
        new("RV1", "varistor, if any: voltage and energy"),
        new("T1", "core inrush"),
        new(rectifier, "first surge and its integral at switch-on"),
        new("C1", "hold-up of a missed half-cycle"),
        new("R1", "bleeder: power and time to a safe voltage"),
    ];
}
