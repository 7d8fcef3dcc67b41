using System.Globalization;
using System.Text.Encodings.Web;
using System.Text.Json;

namespace Selector.Application;

/// <summary>
/// How JSON is stored: keys in order, no white space, numbers as ECMAScript writes them (RFC 8785, section 3.2.2.3), so that equal
/// content is equal text on every machine and store.
/// </summary>
internal static class JsonText
{
    public static JsonWriterOptions Writing { get; } = new() { Encoder = JavaScriptEncoder.UnsafeRelaxedJsonEscaping, Indented = false };

    /// <summary>A member that is a string; empty when it is missing or something else.</summary>
    public static string Word(JsonElement of, string name) =>
        of.TryGetProperty(name, out var value) && value.ValueKind == JsonValueKind.String ? value.GetString() ?? "" : "";

    /// <summary>The shortest digits that read back to the same value, laid out as ECMA-262 Number::toString does.</summary>
    /// <param name="value">Finite.</param>
    public static string Number(double value)
    {
        if (!double.IsFinite(value))
        {
            throw new ArgumentOutOfRangeException(nameof(value), value, "JSON has no such number.");
        }

        if (value == 0)
        {
            return "0";
        }

        // "E16" would round; the round-trip text in exponent form is found from "R".
        var (digits, point) = Shortest(Math.Abs(value));
        var text = Lay(digits, point);
        return value < 0 ? "-" + text : text;
    }

    /// <summary>Digits d1d2...dk and n so that the value is 0.d1d2...dk times ten to the n.</summary>
    private static (string Digits, int Point) Shortest(double value)
    {
        var text = value.ToString("R", CultureInfo.InvariantCulture);
        var e = text.IndexOf('E', StringComparison.Ordinal);
        var exponent = e < 0 ? 0 : int.Parse(text[(e + 1)..], NumberStyles.AllowLeadingSign, CultureInfo.InvariantCulture);
        var mantissa = e < 0 ? text : text[..e];
        var dot = mantissa.IndexOf('.', StringComparison.Ordinal);
        var whole = dot < 0 ? mantissa.Length : dot;
        var all = mantissa.Replace(".", "", StringComparison.Ordinal);
        var digits = all.TrimStart('0');
        return (digits.TrimEnd('0'), whole - (all.Length - digits.Length) + exponent);
    }

    private static string Lay(string digits, int point)
    {
        var count = digits.Length;
        if (count <= point && point <= 21)
        {
            return digits + new string('0', point - count);
        }

        if (point is > 0 and <= 21)
        {
            return digits[..point] + "." + digits[point..];
        }

        if (point is > -6 and <= 0)
        {
            return "0." + new string('0', -point) + digits;
        }

        var sign = point - 1 < 0 ? "-" : "+";
        var power = Math.Abs(point - 1).ToString(CultureInfo.InvariantCulture);
        return (count == 1 ? digits : digits[..1] + "." + digits[1..]) + "e" + sign + power;
    }
}
