using System.Collections.Frozen;
using System.Collections.Immutable;

namespace Selector.Engine.Supplies;

/// <summary>One field as it was understood.</summary>
/// <param name="Field">Its declaration.</param>
/// <param name="Text">As typed.</param>
/// <param name="Value">In the field's unit; for a choice the place of the word. Meaningless while there is a fault.</param>
/// <param name="Echo">What was understood, in engineering notation.</param>
/// <param name="Fault">What is wrong and what to do; null when nothing is.</param>
/// <param name="Shown">Whether the field matters to this requirement.</param>
public sealed record FieldValue(FieldSpec Field, string Text, double Value, string Echo, string? Fault, bool Shown);

/// <summary>A requirement as it was understood, fault by fault. Made by <see cref="RequirementReader"/>.</summary>
public sealed class RequirementValues
{
    private readonly FrozenDictionary<string, FieldValue> _byKey;

    internal RequirementValues(ImmutableArray<FieldValue> fields)
    {
        Fields = fields;
        _byKey = fields.ToFrozenDictionary(f => f.Field.Key, StringComparer.Ordinal);
    }

    /// <summary>All fields in the order of the stages.</summary>
    public ImmutableArray<FieldValue> Fields { get; }

    /// <summary>Fields with a fault that matter now; with any there is nothing to solve.</summary>
    public IEnumerable<FieldValue> Faults => Fields.Where(f => f.Shown && f.Fault is not null);

    public bool Ok => !Faults.Any();

    /// <summary>Value of a field in its unit.</summary>
    /// <exception cref="KeyNotFoundException">No stage declares it.</exception>
    public double this[string key] => _byKey[key].Value;

    /// <summary>Whether a choice stands at the given word; false when the field is not declared.</summary>
    public bool Is(string key, string choice) =>
        _byKey.TryGetValue(key, out var f) && f.Field.IsChoice
        && f.Value >= 0 && f.Value < f.Field.Choices.Length && f.Field.Choices[(int)f.Value].Key == choice;

    public FieldValue? Find(string key) => _byKey.GetValueOrDefault(key);
}
