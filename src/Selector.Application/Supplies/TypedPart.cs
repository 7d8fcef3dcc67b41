using System.Collections.Immutable;
using System.Text;
using System.Text.Json;
using Selector.Application.Catalogue;
using Selector.Engine.Parts;
using Selector.Engine.Supplies;

namespace Selector.Application.Supplies;

/// <summary>A part that was typed in for one supply, as JSON in the text of its fitting.</summary>
internal static class TypedPart
{
    public const int SchemaVersion = 1;

    public static string Format(Part part)
    {
        using var buffer = new MemoryStream();
        using (var json = new Utf8JsonWriter(buffer, JsonText.Writing))
        {
            json.WriteStartObject();
            json.WriteString("code", part.OrderingCode);
            json.WriteString("family", part.Family.Id);
            json.WriteString("maker", part.Maker);
            json.WriteString("package", part.Package);
            json.WritePropertyName("prices");
            PricesText.Write(json, part.Prices);
            json.WritePropertyName("ratings");
            RatingsText.WriteRatings(json, part.Family, part.Ratings);
            json.WriteString("source", part.Source);
            json.WriteString("technology", part.Technology);
            json.WriteNumber("version", SchemaVersion);
            json.WriteEndObject();
        }

        return Encoding.UTF8.GetString(buffer.ToArray());
    }

    public static (Part? Part, string? Fault) Parse(string text, Registry registry)
    {
        try
        {
            using var json = JsonDocument.Parse(text);
            var root = json.RootElement;
            if (root.ValueKind != JsonValueKind.Object || registry.FindFamily(JsonText.Word(root, "family")) is not { } family)
            {
                return (null, "The typed-in part is of a family that this program does not know. Type it again.");
            }

            var ratings = root.TryGetProperty("ratings", out var given)
                ? RatingsText.ReadRatings(given, family)
                : [.. family.Ratings.Select(_ => double.NaN)];
            var part = new Part
            {
                Family = family,
                Maker = JsonText.Word(root, "maker"),
                OrderingCode = JsonText.Word(root, "code"),
                Package = JsonText.Word(root, "package"),
                Source = JsonText.Word(root, "source"),
                Technology = JsonText.Word(root, "technology"),
                Prices = root.TryGetProperty("prices", out var prices) ? PricesText.Read(prices) : PriceList.None,
                Ratings = ratings,
            };
            return PartCheck.Fault(part) is { } fault ? (null, $"The typed-in part cannot be used: {fault}") : (part, null);
        }
        catch (Exception e) when (e is JsonException or InvalidOperationException or FormatException or OverflowException)
        {
            return (null, "The typed-in part cannot be read. Type it again.");
        }
    }
}
