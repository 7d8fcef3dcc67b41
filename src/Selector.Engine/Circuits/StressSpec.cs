using System.Collections.Immutable;
using Selector.Engine.Corners;
using Selector.Engine.Parts;
using Selector.Engine.Quantities;

namespace Selector.Engine.Circuits;

/// <summary>Which way a rating bounds a stress.</summary>
public enum Side
{
    /// <summary>The stress may not exceed what is allowed.</summary>
    Ceiling,

    /// <summary>The computed value must reach what is required.</summary>
    Floor,

    /// <summary>A temperature that may not exceed what is allowed; its margin is measured from the ambient.</summary>
    Temperature,
}

/// <summary>What a stress is held against.</summary>
public abstract record Bound
{
    private Bound()
    {
    }

    /// <summary>A rating of the part in the stress's own position, derated by the policy's clause for the stress's kind.</summary>
    public sealed record Rating(string Key) : Bound;

    /// <summary>A limit of the part that is no matter of derating, such as a greatest duty: held as it stands.</summary>
    public sealed record Limit(string Key) : Bound;

    /// <summary>A figure of the requirement, such as the ripple allowed at the output.</summary>
    public sealed record Required(double Value, string Field) : Bound;
}

/// <summary>A computed quantity of one position that a rating, a limit or the requirement bounds.</summary>
/// <param name="Position">The position that carries it.</param>
/// <param name="Kind">Trade term that the policies know, lower case with hyphens: "ripple-current".</param>
/// <param name="Name">As printed on ledger and paper.</param>
/// <param name="Unit">Unit of stress and bound.</param>
/// <param name="Side">Ceiling, floor or temperature.</param>
/// <param name="Bound">What it is held against.</param>
/// <param name="Equation">The law, in symbols; printed under "why".</param>
public sealed record StressSpec(string Position, string Kind, string Name, Unit Unit, Side Side, Bound Bound, string Equation)
{
    /// <summary>Directions in the inputs of the stage.</summary>
    public ImmutableArray<Dependence> On { get; init; } = [];

    /// <summary>Direction in the inputs that are not listed: unproven, or none where the equation does not contain them.</summary>
    public Push Others { get; init; } = Push.Unproven;

    /// <summary>Ratings without which the stress is only partly computed: shown, but never passed.</summary>
    public ImmutableArray<Need> Needs { get; init; } = [];

    /// <summary>A matter of fitting or not, such as the primary's voltage: it can lack, but a margin of it says nothing.</summary>
    public bool IsMatch { get; init; }

    /// <summary>Not a worst corner but a mean over these conditions, by the time at each (harmonic, as lives add up); empty for a corner.</summary>
    public ImmutableArray<ProfilePoint> Profile { get; init; } = [];

    /// <summary>The temperature at which the rating is read, if it falls with temperature: that of the air in the case, or the ambient, unless a link is named.</summary>
    public string? TemperatureLink { get; init; }

    /// <summary>Unique in a supply.</summary>
    public string Id => $"{Position}.{Kind}";
}

/// <summary>A rating that a stress needs to be whole.</summary>
/// <param name="Position">Whose.</param>
/// <param name="Key">Which.</param>
/// <param name="Without">What the value leaves out while it is missing, for example "conduction only".</param>
public sealed record Need(string Position, string Key, string Without)
{
    /// <summary>When the data do not serve; by default when the rating is not given.</summary>
    public Func<Part, bool>? Lacking { get; init; }

    public bool IsMissing(Part part) => Lacking?.Invoke(part) ?? !part.Has(Key);
}
