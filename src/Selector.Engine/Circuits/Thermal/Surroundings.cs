using Selector.Engine.Supplies;

namespace Selector.Engine.Circuits.Thermal;

/// <summary>Where the parts of a supply stand: what any stage asks for the temperature around its parts.</summary>
public static class Surroundings
{
    public const string Case = "case";
    public const string Open = "open";
    public const string Closed = "closed";
    public const string Given = "given";

    /// <summary>Written by the thermal stage when the case is not open: mean temperature of the air in it, °C.</summary>
    public const string AirLink = "air.inside";

    /// <summary>Temperature of the air around the parts: that of the room, or in a case that of the air in it.</summary>
    public static InputId Air(RequirementValues r) =>
        r.Is(Case, Closed) || r.Is(Case, Given) ? InputId.Link(AirLink) : InputId.Axis(CommonFields.AmbientAxis);

    /// <summary>Rise of the air beside hot parts over that around the others, K; 0 where the requirement has no such field.</summary>
    public static double LocalRise(RequirementValues r) => r.Find(ThermalStage.LocalRise)?.Value ?? 0;
}
