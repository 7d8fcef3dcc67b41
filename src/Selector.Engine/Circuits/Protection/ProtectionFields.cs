using Selector.Engine.Supplies;

namespace Selector.Engine.Circuits.Protection;

/// <summary>Keys of the output protection and their words.</summary>
public static class ProtectionFields
{
    public const string Field = "protect.output";
    public const string ToInput = "to-input";
    public const string Across = "across";

    /// <summary>Whether the requirement has a diode from output to input.</summary>
    public static bool HasOutputDiode(RequirementValues r) => r.Is(Field, ToInput);
}
