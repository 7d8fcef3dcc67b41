namespace Selector.Engine.Parts.Families;

/// <summary>Single rectifier diodes: for the mains side and for catching the coil current of a converter.</summary>
public static class DiodeFamily
{
    public const string Id = "rectifier-diode";
    public const string Silicon = "silicon";
    public const string Fast = "silicon fast";
    public const string Schottky = "schottky";

    public static FamilySpec Spec { get; } = new(Id, "rectifier diode", "rectifier diodes", [.. RectifierRatings.All])
    {
        Technologies = [Silicon, Fast, Schottky],
        Checks =
        [
            new([RectifierRatings.Surge, RectifierRatings.Average], v => v[0] >= v[1], "The surge current is below the average current: check both."),
            new([RectifierRatings.Knee, RectifierRatings.JunctionMax], v => v[0] < v[1], "The current is said to be full above the junction limit: check both."),
        ],
    };
}
