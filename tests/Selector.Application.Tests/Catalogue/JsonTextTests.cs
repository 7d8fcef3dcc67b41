using System.Globalization;
using FsCheck;
using FsCheck.Xunit;
using Selector.Application.Catalogue;
using Selector.Application.Tests.Support;
using Selector.Engine;

namespace Selector.Application.Tests.Catalogue;

public sealed class JsonTextTests
{
    /// <summary>From RFC 8785, appendix B.</summary>
    [Theory]
    [InlineData(0x0000000000000000, "0")]
    [InlineData(0x0000000000000001, "5e-324")]
    [InlineData(0x7fefffffffffffff, "1.7976931348623157e+308")]
    [InlineData(0x4340000000000000, "9007199254740992")]
    [InlineData(0x4430000000000000, "295147905179352830000")]
    [InlineData(0x44b52d02c7e14af5, "9.999999999999997e+22")]
    [InlineData(0x444b1ae4d6e2ef4e, "999999999999999700000")]
    [InlineData(0x444b1ae4d6e2ef50, "1e+21")]
    [InlineData(0x3eb0c6f7a0b5ed8d, "0.000001")]
    [InlineData(0x3eb0c6f7a0b5ed8c, "9.999999999999997e-7")]
    [InlineData(0x41b3de4355555553, "333333333.3333332")]
    [InlineData(0x41b3de4355555554, "333333333.33333325")]
    public void Numbers_are_written_as_the_standard_says(long bits, string text) =>
        Assert.Equal(text, JsonText.Number(BitConverter.Int64BitsToDouble(bits)));

    [Property(MaxTest = 5000)]
    public void Any_number_comes_back_to_the_bit(long bits)
    {
        var value = BitConverter.Int64BitsToDouble(bits);
        if (double.IsFinite(value) && value != 0)
        {
            Assert.Equal(value, double.Parse(JsonText.Number(value), NumberStyles.Float, CultureInfo.InvariantCulture));
        }
    }

    [Fact]
    public void Ratings_are_one_canonical_text_with_family_and_version()
    {
        var text = RatingsText.Format(Resistors.Family, Resistors.Part(ohms: 4.7e-6).Ratings);
        Assert.Equal("""{"family":"resistor","ratings":{"power":0.5,"resistance":0.0000047},"version":1}""", text);
    }

    [Fact]
    public void A_rating_that_the_family_has_lost_or_got_since_does_no_harm()
    {
        var ratings = RatingsText.Parse("""{"family":"resistor","ratings":{"gone":7,"power":1},"version":1}""", Resistors.Family);
        Assert.Equal(Resistors.Family.Ratings.Select(r => r.Key == "power" ? 1 : double.NaN), ratings);
    }

    [Fact]
    public void Choices_are_stored_by_word()
    {
        var family = Standard.Registry.Family("bridge-rectifier");
        var ratings = family.Ratings.Select(r => r.IsChoice ? 1 : double.NaN).ToArray();
        var text = RatingsText.Format(family, [.. ratings]);
        Assert.Contains("\"one leg\"", text, StringComparison.Ordinal);
        Assert.Equal(ratings, RatingsText.Parse(text, family));
    }
}
