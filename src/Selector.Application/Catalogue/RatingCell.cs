using System.Globalization;
using Selector.Engine.Parts;
using Selector.Engine.Quantities;

namespace Selector.Application.Catalogue;

/// <summary>
/// One rating as a cell. Read as people write it (4700u, 4.7m, 20 %), written in the unit of the heading with the digits that read
/// back to the same value. A heading that ends in _frac is a fraction: 0.2 there is 20 %, and 20 without its sign is refused by
/// the range instead of being guessed at.
/// </summary>
internal static class RatingCell
{
    public static string Write(RatingSpec spec, double value) =>
        double.IsNaN(value) ? ""
        : spec.IsChoice ? spec.Choices[(int)value]
        : value.ToString("R", CultureInfo.InvariantCulture);

    /// <summary>The value, NaN for an empty cell; or what is wrong.</summary>
    public static (double Value, string? Fault) Read(RatingSpec spec, string cell)
    {
        var text = cell.Trim();
        if (text.Length == 0)
        {
            return (double.NaN, null);
        }

        if (spec.IsChoice)
        {
            return spec.Choices.IndexOf(text) is >= 0 and var at
                ? (at, null)
                : (0, $"\u201c{PlainText.Short(text)}\u201d is none of the words. Write {PartCheck.Listed(spec.Choices)}.");
        }

        var unit = spec.Unit == Units.Percent && !text.EndsWith('%') ? Units.One : spec.Unit;
        var reading = QuantityReader.Read(text, unit);
        return (reading.Value, reading.Fault);
    }
}
