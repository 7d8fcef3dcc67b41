using Selector.Engine.Quantities;

namespace Selector.Engine.Circuits;

/// <summary>Where an input of a stage comes from.</summary>
public enum InputKind
{
    /// <summary>A corner axis, such as the mains voltage.</summary>
    Axis,

    /// <summary>A rating of the part in a position.</summary>
    Column,

    /// <summary>How many equal parts fill a position.</summary>
    Count,

    /// <summary>A named quantity that another stage writes.</summary>
    Link,
}

/// <summary>Names one input of a stage.</summary>
/// <param name="Kind">Where it comes from.</param>
/// <param name="Name">Axis, rating key or link; empty for a count.</param>
/// <param name="Position">For a column or a count, the position; else empty.</param>
public readonly record struct InputId(InputKind Kind, string Name, string Position = "")
{
    public static InputId Axis(string name) => new(InputKind.Axis, name);

    public static InputId Link(string name) => new(InputKind.Link, name);

    public static InputId Column(string position, string key) => new(InputKind.Column, key, position);

    public static InputId Count(string position) => new(InputKind.Count, "", position);
}

/// <summary>An input that a stage reads, in the order of its solver.</summary>
/// <param name="Id">What it is.</param>
/// <param name="Fallback">
/// Stands in where a part does not say; null when the stage cannot be solved without. A fallback is only for what can be left
/// out and named, never for a rating: the stresses that then read low list the column in <see cref="StressSpec.Needs"/>.
/// </param>
public sealed record InputSpec(InputId Id, double? Fallback = null);

/// <summary>Which way an output goes when an input rises.</summary>
public enum Push : sbyte
{
    Falls = -1,
    None = 0,
    Rises = 1,

    /// <summary>Not known or not always the same: the interval is searched.</summary>
    Unproven = 2,
}

/// <summary>How an output depends on one input, with the proof or the reason.</summary>
public sealed record Dependence(InputId Input, Push Push, string Proof);

/// <summary>Short ways to state the same direction for several inputs.</summary>
public static class Dependences
{
    public static IEnumerable<Dependence> Rises(string proof, params InputId[] inputs) => inputs.Select(i => new Dependence(i, Push.Rises, proof));

    public static IEnumerable<Dependence> Falls(string proof, params InputId[] inputs) => inputs.Select(i => new Dependence(i, Push.Falls, proof));

    /// <summary>Inputs that do not bear on the output, or only around a loop whose gain is below one and so cannot turn a sign.</summary>
    public static IEnumerable<Dependence> None(string proof, params InputId[] inputs) => inputs.Select(i => new Dependence(i, Push.None, proof));
}

/// <summary>A named quantity that a stage writes for others.</summary>
/// <param name="Name">Unique among the stages of one supply, for example "bus.min".</param>
/// <param name="Unit">Its unit.</param>
/// <param name="Start">First guess for the loops among stages.</param>
/// <param name="On">Directions in the inputs of the stage.</param>
public sealed record LinkSpec(string Name, Unit Unit, double Start, params Dependence[] On)
{
    /// <summary>Direction in the inputs that are not listed: unproven, or none where the equation does not contain them.</summary>
    public Push Others { get; init; } = Push.Unproven;

    /// <summary>Not a quantity of the circuit but where the stage's next search begins: no loop waits for it to settle.</summary>
    public bool IsHint { get; init; }
}
