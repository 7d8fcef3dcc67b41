using System.Globalization;
using System.Text;
using FsCheck;
using FsCheck.Xunit;
using Selector.Engine.Quantities;

namespace Selector.Engine.Tests.Quantities;

/// <summary>Laws that hold for every text and every number.</summary>
public class QuantityProperties
{
    private const int Cases = 10_000;

    /// <summary>Pieces from which nearly valid texts are made: arbitrary characters alone hardly ever get past the first digit.</summary>
    private static readonly string[] Pieces =
    [
        "0", "1", "23", "456", "7890", ".", ",", " ", "\u202f", "-", "\u2212", "+", "e", "E", "k", "K", "m", "M", "meg", "u", "\u00b5", "f",
        "R", "V", "A", "F", "H", "h", "Hz", "\u03a9", "ohm", "%", "ppm", "/K", "\u00b0C", "K", "A\u00b2s", "mm", "\u00b1", "'", "\ud800", "\0", "NaN",
    ];

    private static readonly NumberDisplay[] Displays =
        [NumberDisplay.Invariant, NumberDisplay.English, NumberDisplay.German, NumberDisplay.French, NumberDisplay.Turkish];

    private static readonly string[] Cultures = ["", "en-US", "de-DE", "fr-FR", "tr-TR"];

    [Property(MaxTest = Cases)]
    public void AnyTextIsAnswered(string text, byte unit) => AssertAnswered(text, UnitOf(unit));

    [Property(MaxTest = Cases)]
    public void NearlyValidTextIsAnswered(byte[] pieces, byte unit) => AssertAnswered(Text(pieces), UnitOf(unit));

    [Property(MaxTest = Cases)]
    public void SeventeenDigitsComeBackExactly(NormalFloat value, byte unit, byte display)
    {
        NumberDisplay signs = Displays[display % Displays.Length];
        string text = QuantityWriter.Write(value.Get, UnitOf(unit), QuantityWriter.MostDigits, signs);
        QuantityReading back = QuantityReader.Read(text, UnitOf(unit), signs);
        Assert.True(back.Ok, $"{text}: {back.Fault}");

        // Per cent is two powers of ten away from the decimal digits, and yet no digit is lost: the shift is done on the text.
        Assert.Equal(value.Get == 0 ? 0 : value.Get, back.Value);
    }

    [Property(MaxTest = Cases)]
    public void FifteenDigitsComeBackNearlyOverAllMagnitudes(double mantissa, sbyte exponent, byte unit)
    {
        double value = mantissa * Math.Pow(10, exponent);
        if (!double.IsFinite(value) || Math.Abs(value) is not (0 or > 1e-290 and < 1e290))
        {
            return;
        }

        QuantityReading back = QuantityReader.Read(QuantityWriter.Write(value, UnitOf(unit), 15), UnitOf(unit));
        Assert.True(back.Ok, back.Fault);
        Assert.InRange(Math.Abs(back.Value - value), 0, Math.Abs(value) * 5.01e-15);
    }

    [Property(MaxTest = Cases)]
    public void TheCultureOfTheHostChangesNothing(byte[] pieces, NormalFloat value, byte unit)
    {
        CultureInfo before = CultureInfo.CurrentCulture;
        try
        {
            CultureInfo.CurrentCulture = CultureInfo.GetCultureInfo("de-DE");
#pragma warning disable CA1305 // The point of this line is the current culture: without it the property would prove nothing.
            Assert.Equal("1,5", 1.5.ToString());
#pragma warning restore CA1305
            var seen = new HashSet<(long, string?, string)>();
            foreach (string culture in Cultures)
            {
                CultureInfo.CurrentCulture = CultureInfo.GetCultureInfo(culture);
                QuantityReading reading = QuantityReader.Read(Text(pieces), UnitOf(unit));
                seen.Add((BitConverter.DoubleToInt64Bits(reading.Value), reading.Fault, QuantityWriter.Write(value.Get, UnitOf(unit))));
            }

            Assert.Single(seen);
        }
        finally
        {
            CultureInfo.CurrentCulture = before;
        }
    }

    private static void AssertAnswered(string text, Unit unit)
    {
        foreach (NumberDisplay display in Displays)
        {
            QuantityReading reading = QuantityReader.Read(text, unit, display);
            Assert.True(double.IsFinite(reading.Value));
            Assert.True(reading.Ok || (reading.Value == 0 && reading.Fault!.EndsWith('.')));
            Assert.False(reading.Fault?.Contains('\ud800', StringComparison.Ordinal) ?? false);
        }
    }

    private static string Text(byte[] pieces)
    {
        var text = new StringBuilder();
        foreach (byte piece in pieces.Take(12))
        {
            text.Append(Pieces[piece % Pieces.Length]);
        }

        return text.ToString();
    }

    private static Unit UnitOf(byte index) => Units.All[index % Units.All.Length];
}
