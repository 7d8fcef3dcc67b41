using System.Collections.Frozen;
using System.Collections.Immutable;
using Selector.Application.Supplies;
using Selector.Application.Tests.Support;
using Selector.Engine;
using Selector.Engine.Parts;
using Selector.Engine.Parts.Families;
using Selector.Engine.Supplies;

namespace Selector.Application.Tests.Supplies;

public sealed class FittingTextTests
{
    private static readonly Part Stocked = Resistors.Part() with { Id = 123 };

    private static readonly CatalogueSnapshot Catalogue = new(
        1, new Dictionary<string, ImmutableArray<Part>> { [ResistorFamily.Id] = [Stocked] }.ToFrozenDictionary());

    private static FittingReading Parse(string text) => FittingText.Parse(text, Catalogue, Standard.Registry);

    [Fact]
    public void A_catalogue_part_comes_back_in_every_arrangement()
    {
        foreach (var fitting in (Fitting[])[new(Stocked), Fitting.Parallel(Stocked, 4)])
        {
            Assert.Equal(new FittingReading(fitting, null), Parse(FittingText.Format(fitting)));
        }

        Assert.Equal("part 123 parallel 4", FittingText.Format(Fitting.Parallel(Stocked, 4)));
    }

    [Fact]
    public void An_empty_position_comes_back_empty()
    {
        Assert.Equal("", FittingText.Format(null));
        Assert.Equal(default, Parse("  "));
    }

    [Theory]
    [InlineData("Ärger & Söhne", "0.1 %\"}{")]
    [InlineData("a\\b", "part 7 parallel 3")]
    public void A_typed_part_comes_back_whole(string maker, string code)
    {
        var part = Resistors.Part(code, 0.1 + 0.2, 1e-3) with
        {
            Maker = maker,
            Technology = "wirewound",
            Package = "axial",
            Source = "sheet of 2026",
            Prices = new PriceList("EUR", "2026-03-31", [new(1, 123_456), new(10, 1)]),
        };
        var (back, fault) = Parse(FittingText.Format(Fitting.Parallel(part, 3)));
        Assert.Null(fault);
        Assert.Equal((ArrangementKind.Parallel, 3), (back!.Kind, back.Count));
        Assert.Equal(part.Ratings.Select(BitConverter.DoubleToInt64Bits), back.Part.Ratings.Select(BitConverter.DoubleToInt64Bits));
        Assert.Equal<PriceBreak>(part.Prices.Breaks, back.Part.Prices.Breaks);
        Assert.Equal(
            part with { Ratings = default, Prices = PriceList.None },
            back.Part with { Ratings = default, Prices = PriceList.None });
    }

    [Theory]
    [InlineData("part 999", "no longer in the catalogue")]
    [InlineData("part", "no fitting")]
    [InlineData("part x", "no fitting")]
    [InlineData("part -1", "no fitting")]
    [InlineData("part 99999999999999999999", "no fitting")]
    [InlineData("nonsense", "no fitting")]
    [InlineData("part 123 parallel", "not understood")]
    [InlineData("part 123 parallel 0", "not understood")]
    [InlineData("part 123 stacked 2", "not understood")]
    [InlineData("part 123 series 2", "may not be fitted in series")]
    [InlineData("part 123 parallel 11", "At most 10")]
    [InlineData("typed", "no fitting")]
    [InlineData("typed {", "incomplete")]
    [InlineData("typed {}", "family")]
    [InlineData("typed []}", "cannot be read")]
    [InlineData("typed {\"family\":\"resistor\",\"maker\":\"A\",\"code\":\"B\",\"technology\":\"film\",\"ratings\":{}}", "missing")]
    [InlineData("typed {\"family\":\"resistor\",\"maker\":\"A\",\"code\":\"B\",\"technology\":\"film\",\"ratings\":7}", "cannot be read")]
    [InlineData("typed {\"family\":\"resistor\",\"maker\":\"A\",\"code\":\"B\",\"technology\":\"tin\",\"ratings\":{}}", "technology")]
    [InlineData("typed {\"family\":\"resistor\",\"maker\":\"A\",\"code\":\"B\",\"technology\":\"film\",\"ratings\":{\"resistance\":-5,\"power\":1}}", "outside")]
    public void What_cannot_be_fitted_is_said_in_words(string text, string says)
    {
        var (fitting, fault) = Parse(text);
        Assert.Null(fitting);
        Assert.Contains(says, fault, StringComparison.Ordinal);
    }
}
