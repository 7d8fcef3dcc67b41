using Selector.Engine.Parts;
using Selector.Engine.Quantities;
using Selector.Engine.Supplies;

namespace Selector.Web.Words;

/// <summary>Numbers and parts as the page writes them. The ledger's numbers are written as on the derating sheet, sign by sign.</summary>
internal static class Shown
{
    /// <summary>Stands where there is nothing to say.</summary>
    public const string Dash = "\u2013";

    private const string NarrowSpace = "\u202f";

    /// <summary>Number and unit, or a dash.</summary>
    public static string Number(double? value, Unit? unit) => value is { } v ? QuantityWriter.Write(v, unit ?? Units.One) : Dash;

    /// <summary>A margin as a figure. Below 0.1 % digits would be noise: it is then rounded to 0.01 %.</summary>
    public static string Share(double? margin) => margin is not { } m ? Dash
        : Math.Abs(m) < 1e-3 ? QuantityWriter.Write(Math.Round(m, 4, MidpointRounding.AwayFromZero), Units.Percent, trim: true)
        : QuantityWriter.Write(m, Units.Percent);

    /// <summary>"≥ 35.0 V".</summary>
    public static string AtLeast(double value, Unit? unit) => "\u2265" + NarrowSpace + Number(value, unit);

    /// <summary>A margin in words: "12 %", or "lacks 10 %" below zero. To 0.1 % at best, as candidates are ranked.</summary>
    public static string Margin(double margin)
    {
        var size = QuantityWriter.Write(Math.Round(Math.Abs(margin), 3, MidpointRounding.AwayFromZero), Units.Percent, 2);
        return margin < 0 ? "lacks " + size : size;
    }

    /// <summary>A number as scripts and tests read it; empty for none.</summary>
    public static string Raw(double? value) => value?.ToString("R", System.Globalization.CultureInfo.InvariantCulture) ?? "";

    /// <summary>A rating of a part: number, word of a choice, or a dash where the data sheet says nothing.</summary>
    public static string Rating(RatingSpec spec, double value) =>
        double.IsNaN(value) ? Dash
        : !spec.IsChoice ? QuantityWriter.Write(value, spec.Unit, 4, trim: true)
        : value >= 0 && value < spec.Choices.Length ? spec.Choices[(int)value] : Dash;

    /// <summary>What describes a part beside its code: "4700 µF 35 V".</summary>
    public static string Description(Part part) => string.Join(" ", part.Family.Ratings
        .Zip(part.Ratings)
        .Where(r => r.First.InDescription && !double.IsNaN(r.Second))
        .Select(r => Rating(r.First, r.Second)));

    /// <summary>An identifier in words: "output-voltage" is "output voltage".</summary>
    public static string Plain(string id) => id.Replace('-', ' ').Replace('_', ' ').Replace('.', ' ');

    /// <summary>Whole number with narrow spaces between thousands.</summary>
    public static string Count(long count) => count.ToString("#,0", Thousands);

    /// <summary>A moment as the reader's clock shows it: "14:02" today, else with its date.</summary>
    public static string Time(DateTime utc, TimeProvider clock) =>
        Local(utc, clock) is var local && local.Date == clock.GetLocalNow().Date
            ? local.ToString("HH:mm", System.Globalization.CultureInfo.InvariantCulture)
            : Moment(utc, clock);

    /// <summary>With its date in any case, for what is printed.</summary>
    public static string Moment(DateTime utc, TimeProvider clock) =>
        Local(utc, clock).ToString("d MMM yyyy HH:mm", System.Globalization.CultureInfo.InvariantCulture);

    private static DateTime Local(DateTime utc, TimeProvider clock) =>
        TimeZoneInfo.ConvertTimeFromUtc(DateTime.SpecifyKind(utc, DateTimeKind.Utc), clock.LocalTimeZone);

    /// <summary>Name of an element that belongs to a row, position or field; only what an address may hold.</summary>
    public static string Anchor(string kind, string id) =>
        kind + "-" + string.Concat(id.Select(c => char.IsAsciiLetterOrDigit(c) || c is '-' ? c : '_'));

    /// <summary>Anchor of a ledger row.</summary>
    public static string Anchor(LedgerRow row) => Anchor("row", row.Id);

    private static readonly System.Globalization.NumberFormatInfo Thousands = new() { NumberGroupSeparator = NarrowSpace };
}
