using Selector.Engine.Parts.Families;
using Selector.Engine.Supplies;

namespace Selector.Engine;

/// <summary>The stages and families that ship with the product. Registering one here is all it takes to add it.</summary>
public static class Standard
{
    public static Registry Registry { get; } = new(
        [],
        [
            TransformerFamily.Spec,
            BridgeFamily.Spec,
            DiodeFamily.Spec,
            CapacitorFamily.Spec,
            RegulatorFamily.Spec,
            InductorFamily.Spec,
            ResistorFamily.Spec,
        ]);
}
