using System.Collections.Immutable;
using System.Text;
using System.Text.Json;
using Selector.Engine.Parts;

namespace Selector.Application.Catalogue;

/// <summary>
/// The ratings of a part as one canonical JSON text: {"family":..,"ratings":{key:number or choice word},"version":1}. What is not
/// given is left out; a key that the family no longer has is passed over, and one that it has got since reads as not given.
/// </summary>
internal static class RatingsText
{
    public const int SchemaVersion = 1;

    public static string Format(FamilySpec family, ImmutableArray<double> ratings)
    {
        using var buffer = new MemoryStream();
        using (var json = new Utf8JsonWriter(buffer, JsonText.Writing))
        {
            json.WriteStartObject();
            json.WriteString("family", family.Id);
            json.WritePropertyName("ratings");
            WriteRatings(json, family, ratings);
            json.WriteNumber("version", SchemaVersion);
            json.WriteEndObject();
        }

        return Encoding.UTF8.GetString(buffer.ToArray());
    }

    /// <exception cref="JsonException">The text was not written by <see cref="Format"/>, or by a later version.</exception>
    public static ImmutableArray<double> Parse(string text, FamilySpec family)
    {
        using var json = JsonDocument.Parse(text);
        var root = json.RootElement;
        if (root.GetProperty("version").GetInt32() > SchemaVersion)
        {
            throw new JsonException("The ratings were written by a later version of this program.");
        }

        return ReadRatings(root.GetProperty("ratings"), family);
    }

    public static void WriteRatings(Utf8JsonWriter json, FamilySpec family, ImmutableArray<double> ratings)
    {
        json.WriteStartObject();
        foreach (var (spec, value) in family.Ratings.Zip(ratings).OrderBy(r => r.First.Key, StringComparer.Ordinal))
        {
            if (double.IsNaN(value))
            {
                continue;
            }

            json.WritePropertyName(spec.Key);
            if (spec.IsChoice)
            {
                json.WriteStringValue(spec.Choices[(int)value]);
            }
            else
            {
                json.WriteRawValue(JsonText.Number(value));
            }
        }

        json.WriteEndObject();
    }

    public static ImmutableArray<double> ReadRatings(JsonElement ratings, FamilySpec family) =>
        [.. family.Ratings.Select(spec => ratings.TryGetProperty(spec.Key, out var value) ? Value(spec, value) : double.NaN)];

    private static double Value(RatingSpec spec, JsonElement value)
    {
        if (spec.IsChoice)
        {
            return value.ValueKind == JsonValueKind.String && spec.Choices.IndexOf(value.GetString()!) is >= 0 and var at ? at : double.NaN;
        }

        return value.ValueKind == JsonValueKind.Number && value.GetDouble() is var number && double.IsFinite(number) ? number : double.NaN;
    }
}
