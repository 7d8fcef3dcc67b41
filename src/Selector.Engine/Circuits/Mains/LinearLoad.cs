namespace Selector.Engine.Circuits.Mains;

/// <summary>The load as current and conductance: exact for a current or a resistance, the tangent for a constant power.</summary>
/// <param name="Current">A, at zero volt.</param>
/// <param name="Conductance">A/V; negative for a constant power.</param>
internal readonly record struct LinearLoad(double Current, double Conductance)
{
    /// <summary>The load about a terminal voltage.</summary>
    /// <param name="path">The circuit.</param>
    /// <param name="v">V, about which a constant power is straightened.</param>
    /// <param name="spread">Mean square of the voltage's way from there, V²: its curvature is put into the current, so that the mean is right.</param>
    public static LinearLoad About(in ChargingPath path, double v, double spread = 0) => path.Kind switch
    {
        LoadKind.Current => new(path.Load, 0),
        LoadKind.Resistance => new(0, 1 / path.Load),
        _ => new(2 * path.Load / v + path.Load * spread / (v * v * v), -path.Load / (v * v)),
    };
}
