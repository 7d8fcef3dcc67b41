using Selector.Engine.Supplies;

namespace Selector.Engine.Circuits.Inlet;

/// <summary>Keys of the inlet fields and the axis of a hot restart.</summary>
public static class InletFields
{
    public const string Limiter = "inlet.limiter";
    public const string Varistor = "inlet.varistor";
    public const string RestartAxis = "restart";

    /// <summary>Whether the requirement has the thermistor.</summary>
    public static bool HasLimiter(RequirementValues r) => r.Is(Limiter, "ntc");
}
