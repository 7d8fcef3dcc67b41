using System.Text;
using System.Text.Json;
using Selector.Engine.Parts;

namespace Selector.Application.Catalogue;

/// <summary>A price list as canonical JSON: {"breaks":[[from, ten-thousandths], ...],"currency":..,"date":..,"version":1}.</summary>
internal static class PricesText
{
    public const int SchemaVersion = 1;

    public static string Format(PriceList prices)
    {
        using var buffer = new MemoryStream();
        using (var json = new Utf8JsonWriter(buffer, JsonText.Writing))
        {
            Write(json, prices);
        }

        return Encoding.UTF8.GetString(buffer.ToArray());
    }

    public static PriceList Parse(string text)
    {
        using var json = JsonDocument.Parse(text);
        return Read(json.RootElement);
    }

    public static void Write(Utf8JsonWriter json, PriceList prices)
    {
        json.WriteStartObject();
        json.WriteStartArray("breaks");
        foreach (var b in prices.Breaks)
        {
            json.WriteStartArray();
            json.WriteNumberValue(b.From);
            json.WriteNumberValue(b.TenThousandths);
            json.WriteEndArray();
        }

        json.WriteEndArray();
        json.WriteString("currency", prices.Currency);
        json.WriteString("date", prices.Date);
        json.WriteNumber("version", SchemaVersion);
        json.WriteEndObject();
    }

    /// <exception cref="InvalidOperationException">The JSON is of another shape.</exception>
    public static PriceList Read(JsonElement root) => new(
        JsonText.Word(root, "currency"),
        JsonText.Word(root, "date"),
        root.TryGetProperty("breaks", out var breaks)
            ? [.. breaks.EnumerateArray().Where(b => b.GetArrayLength() == 2).Select(b => new PriceBreak(b[0].GetInt32(), b[1].GetInt64()))]
            : []);
}
