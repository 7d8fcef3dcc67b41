using Selector.Engine.Quantities;

namespace Selector.Engine.Parts.Families;

/// <summary>Insulators between a part and its sink.</summary>
public static class InterfaceFamily
{
    public const string Id = "interface";
    public const string Cooling = "cooling";
    public const string Insulation = "insulation_voltage";
    public const string Thickness = "thickness";

    public static FamilySpec Spec { get; } = new(Id, "thermal interface", "thermal interfaces",
    [
        new(Cooling, "case to sink", Units.KelvinPerWatt, Range.Cooling, "Thermal resistance for the package that it is cut for.") { Required = true, InDescription = true },
        new(Insulation, "insulation voltage", Units.Volt, Range.Volts, "Working voltage that it insulates."),
        new(Thickness, "thickness", Units.Millimetre, new(0.01, 10), "As supplied."),
    ])
    {
        Technologies = ["silicone pad", "mica", "polyimide"],
    };
}
