using System.Collections.Immutable;
using Selector.Application.Supplies;
using Selector.Application.Tests.Support;

namespace Selector.Application.Tests.Supplies;

public sealed class RefusalTests
{
    [Theory]
    [InlineData(ToyStage.Volts, 4096, true)]
    [InlineData(ToyStage.Volts, 4097, false)]
    [InlineData(ToyStage.Volts, 10_000_000, false)]
    [InlineData("fit.R1", 10_000_000, false)]
    [InlineData(SupplyFields.Name, 121, false)]
    public async Task A_text_that_is_too_long_is_refused_in_words(string field, int length, bool kept)
    {
        using var shop = await Shop.Open();
        var supply = await shop.Supply();
        var outcome = await shop.Supplies.Apply(supply.Number, new Edit(field, null, new string('7', length), "ann"));
        if (kept)
        {
            Assert.Equal(length, outcome.State().Texts[field].Length);
            return;
        }

        var reason = Assert.IsType<EditOutcome.Refused>(outcome).Reason;
        Assert.Contains($"{length}", reason, StringComparison.Ordinal);
        Assert.Contains("Shorten", reason, StringComparison.Ordinal);
        Assert.Equal(supply.Version, (await shop.Supplies.Open(supply.Number))!.Version);
    }

    [Theory]
    [InlineData("no.such.field")]
    [InlineData("fit.")]
    [InlineData("fit.R1; drop")]
    [InlineData("")]
    public async Task A_field_that_nobody_declares_is_refused(string field)
    {
        using var shop = await Shop.Open();
        var supply = await shop.Supply();
        Assert.IsType<EditOutcome.Refused>(await shop.Supplies.Apply(supply.Number, new Edit(field, null, "1", "ann")));
    }

    [Theory]
    [InlineData(0x0000)]
    [InlineData(0x001B)]
    [InlineData(0x0085)]
    [InlineData(0xD800)]
    [InlineData(0xDFFF)]
    public async Task Text_that_a_store_would_not_keep_is_refused(int sign)
    {
        var text = $"a{(char)sign}b";
        using var shop = await Shop.Open();
        var supply = await shop.Supply();
        Assert.IsType<EditOutcome.Refused>(await shop.Supplies.Apply(supply.Number, new Edit(ToyStage.Volts, null, text, "ann")));
    }

    [Theory]
    [InlineData("tw\u00f6lf \u2126 \ud83d\udd0c")]
    [InlineData("'; DROP TABLE supply; --")]
    [InlineData("<script>")]
    [InlineData("NaN")]
    [InlineData("")]
    public async Task Text_that_makes_no_sense_is_kept_to_the_letter(string text)
    {
        using var shop = await Shop.Open();
        var supply = await shop.Supply();
        await shop.Supplies.Apply(supply.Number, new Edit(ToyStage.Volts, null, text, "ann"));
        Assert.Equal(text, (await shop.Supplies.Open(supply.Number))!.Texts[ToyStage.Volts]);
    }

    [Fact]
    public async Task A_supply_without_a_name_or_with_a_text_too_long_is_not_created()
    {
        using var shop = await Shop.Open();
        Assert.IsType<EditOutcome.Refused>(await shop.Supplies.Create("  ", ImmutableDictionary<string, string>.Empty, "ann"));
        var fields = ImmutableDictionary<string, string>.Empty.Add(ToyStage.Volts, new string('1', 5000));
        Assert.IsType<EditOutcome.Refused>(await shop.Supplies.Create("x", fields, "ann"));
        Assert.Empty(await shop.Supplies.List());
    }
}
