using System.Collections.Immutable;
using System.Text.Json;

namespace Selector.Application.Examples;

/// <summary>A supply to begin with.</summary>
/// <param name="Name">Its name.</param>
/// <param name="Texts">Fields as in a supply, but a fitting names its part "maker|ordering code", then perhaps "parallel 4".</param>
public sealed record Example(string Name, ImmutableSortedDictionary<string, string> Texts)
{
    private const int SchemaVersion = 1;

    /// <summary>Reads {"version":1,"name":..,"texts":{field:text}}.</summary>
    /// <exception cref="InvalidDataException">Not of that shape; says where.</exception>
    public static Example Read(string file, string text)
    {
        try
        {
            using var json = JsonDocument.Parse(text);
            var root = json.RootElement;
            if (root.GetProperty("version").GetInt32() != SchemaVersion)
            {
                throw new InvalidDataException($"Example {file} is of another version than {SchemaVersion}.");
            }

            return new Example(
                root.GetProperty("name").GetString()!,
                root.GetProperty("texts").EnumerateObject().ToImmutableSortedDictionary(p => p.Name, p => p.Value.GetString()!, StringComparer.Ordinal));
        }
        catch (Exception e) when (e is JsonException or KeyNotFoundException or InvalidOperationException)
        {
            throw new InvalidDataException($"Example {file} cannot be read: {e.Message}", e);
        }
    }
}
