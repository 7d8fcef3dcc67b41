using Selector.Engine.Quantities;

namespace Selector.Engine.Parts.Families;

/// <summary>Heat sinks in still air.</summary>
public static class HeatSinkFamily
{
    public const string Id = "heat-sink";
    public const string Cooling = "cooling";
    public const string Rise = "cooling_rise";
    public const string Length = "length";
    public const string Width = "width";
    public const string Height = "height";

    public static FamilySpec Spec { get; } = new(Id, "heat sink", "heat sinks",
    [
        new(Cooling, "sink to air", Units.KelvinPerWatt, Range.Cooling, "Thermal resistance by natural convection, fins upright.") { Required = true, InDescription = true },
        new(Rise, "stated at a rise of", Units.Kelvin, new(1, 200), "Rise of the sink over the air at which the maker states it: natural convection is better when hotter."),
        new(Length, "length", Units.Millimetre, Range.Length, "Of the extrusion."),
        new(Width, "width", Units.Millimetre, Range.Length, "Across the fins."),
        new(Height, "height", Units.Millimetre, Range.Length, "Fins and base."),
    ])
    {
        Technologies = ["extruded aluminium"],
    };
}
