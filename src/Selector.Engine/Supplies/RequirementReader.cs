using System.Collections.Immutable;
using System.Globalization;
using Selector.Engine.Quantities;

namespace Selector.Engine.Supplies;

/// <summary>Reads a requirement by the fields that the stages declare. Never throws on what people type.</summary>
public static class RequirementReader
{
    /// <summary>Every declared field, understood or with its fault beside it.</summary>
    public static RequirementValues Read(Registry registry, Requirement requirement)
    {
        var first = registry.Fields.Select(f => Read(f, requirement.Text(f))).ToImmutableArray();
        var plain = new RequirementValues(first);
        var shown = first.Select(v => v with { Shown = v.Field.Shown?.Invoke(plain) ?? true }).ToImmutableArray();
        return new RequirementValues(Together(registry, new RequirementValues(shown)));
    }

    private static FieldValue Read(FieldSpec field, string text)
    {
        if (field.IsChoice)
        {
            var at = field.Choices.ToList().FindIndex(c =>
                string.Equals(c.Key, text.Trim(), StringComparison.OrdinalIgnoreCase)
                || string.Equals(c.Label, text.Trim(), StringComparison.OrdinalIgnoreCase));
            return at < 0
                ? new(field, text, 0, "", $"{field.Label}: choose one of {string.Join(", ", field.Choices.Select(c => c.Label))}.", true)
                : new(field, text, at, field.Choices[at].Label, null, true);
        }

        var reading = QuantityReader.Read(text, field.Unit);
        if (reading.Fault is { } fault)
        {
            return new(field, text, 0, "", $"{field.Label}: {fault}", true);
        }

        var echo = QuantityWriter.Write(reading.Value, field.Unit, 4, trim: true);
        if (!field.Range.Contains(reading.Value))
        {
            return new(field, text, 0, echo, $"{field.Label}: {echo} is outside {Say(field)}. Type a value inside.", true);
        }

        if (field.Whole && reading.Value != Math.Floor(reading.Value))
        {
            return new(field, text, 0, echo, $"{field.Label}: type a whole number.", true);
        }

        return new(field, text, reading.Value, echo, null, true);
    }

    private static string Say(FieldSpec field) => string.Create(CultureInfo.InvariantCulture,
        $"{QuantityWriter.Write(field.Range.Low, field.Unit, 4, trim: true)} to {QuantityWriter.Write(field.Range.High, field.Unit, 4, trim: true)}");

    /// <summary>What is inconsistent among fields is said at the first field of the check.</summary>
    private static ImmutableArray<FieldValue> Together(Registry registry, RequirementValues values)
    {
        var faults = new Dictionary<string, string>(StringComparer.Ordinal);
        foreach (var check in registry.Checks)
        {
            var fields = check.Keys.Select(values.Find).ToList();
            if (fields.All(f => f is { Shown: true, Fault: null })
                && !check.Holds([.. fields.Select(f => f!.Value)]))
            {
                faults.TryAdd(check.Keys[0], $"{fields[0]!.Field.Label}: {check.Message}");
            }
        }

        return [.. values.Fields.Select(f => faults.TryGetValue(f.Field.Key, out var fault) ? f with { Fault = fault } : f)];
    }
}
