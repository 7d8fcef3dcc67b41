using Selector.Engine.Quantities;

namespace Selector.Engine.Parts.Families;

/// <summary>Four diodes in one case.</summary>
public static class BridgeFamily
{
    public const string Id = "bridge-rectifier";
    public const string Basis = "current_basis";

    /// <summary>Place of "DC output" among the words of <see cref="Basis"/>.</summary>
    public const double BasisOutput = 0;

    public static FamilySpec Spec { get; } = new(Id, "bridge rectifier", "bridge rectifiers",
    [
        .. RectifierRatings.All,
        new(Basis, "current stated for", Units.One, new(0, 1), "Whether the average current is that of the DC output or of one leg.") { Choices = ["dc output", "one leg"], Required = true },
    ])
    {
        Technologies = [DiodeFamily.Silicon],
        Checks = DiodeFamily.Spec.Checks,
    };
}
