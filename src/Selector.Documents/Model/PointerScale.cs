namespace Selector.Documents.Model;

/// <summary>
/// Geometry of the pointer scale in shares of its length, from zero to the rating, so that page and paper draw the same one: a
/// bar up to what is allowed, hatching over what the policy takes away, a tick at allowed, a pointer at the stress.
/// </summary>
/// <param name="Pointer">Where the stress stands, 0 to 1.</param>
/// <param name="Tick">Where allowed (for a floor: required) stands, 0 to 1.</param>
/// <param name="IsFloor">The pointer must stand right of the tick instead of left of it.</param>
/// <param name="Beyond">The stress lies past the end of the scale; the pointer stands at the end and an arrow says so.</param>
public sealed record PointerScale(double Pointer, double Tick, bool IsFloor, bool Beyond)
{
    /// <summary>Scale of a stress that may not exceed what is allowed of a rating.</summary>
    /// <returns>Null when a figure is missing or the rating spans nothing.</returns>
    public static PointerScale? Ceiling(double? stress, double? allowed, double? rating) =>
        stress is { } s && allowed is { } a && rating is > 0 and var end && double.IsFinite(s) && double.IsFinite(a) && double.IsFinite(end)
            ? new(Share(s, end), Share(a, end), false, s > end)
            : null;

    /// <summary>Scale of a value that must reach what is required; it ends at the greater of the two and a little more.</summary>
    /// <returns>Null when a figure is missing or nothing is required.</returns>
    public static PointerScale? Floor(double? value, double? required)
    {
        const double Headroom = 1.25;
        if (value is not { } v || required is not > 0 || !double.IsFinite(v) || !double.IsFinite(required.Value))
        {
            return null;
        }

        var end = required.Value * Headroom;
        return new(Share(v, end), Share(required.Value, end), true, v > end);
    }

    private static double Share(double value, double end) => Math.Clamp(value / end, 0, 1);
}
