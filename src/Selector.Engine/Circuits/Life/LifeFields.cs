using System.Collections.Immutable;
using Selector.Engine.Corners;
using Selector.Engine.Supplies;

namespace Selector.Engine.Circuits.Life;

/// <summary>What a stage needs to state a life over the load profile.</summary>
public static class LifeFields
{
    public const string Hours = "life.hours";
    public const string FullShare = "life.full-share";
    public const string PartLoad = "life.part-load";
    public const string Ambient = "life.ambient";
    public const string Switchings = "life.switchings";

    public const string Equation = "L = 1 / Σ (share / L_i), L_i = L_0 2^((T_0 − T_air)/10) 2^(ΔT_0 (1 − (I/I_0)²)/10), mains nominal";

    /// <summary>The estimate must be this much longer than what is asked. Common practice, no source.</summary>
    private const double Reserve = 1.5;

    /// <summary>The life asked, with the usual reserve, h.</summary>
    public static Bound Bound(RequirementValues r) => new Bound.Required(Reserve * r[Hours], Hours);

    /// <summary>Full load and the rest, at everyday conditions.</summary>
    public static ImmutableArray<ProfilePoint> Profile(RequirementValues r)
    {
        var full = r[FullShare];
        var load = r[CommonFields.LoadFull];
        return [.. new[] { Point(full, load), Point(1 - full, Math.Max(r[CommonFields.LoadLeast], r[PartLoad] * load)) }.Where(p => p.Share > 0)];

        ProfilePoint Point(double share, double amperes) => new(share, ImmutableDictionary<string, double>.Empty
            .Add(CommonFields.LoadAxis, amperes)
            .Add(CommonFields.AmbientAxis, Math.Clamp(r[Ambient], r[CommonFields.AmbientLow], r[CommonFields.AmbientHigh])));
    }
}
