using Selector.Application.Supplies;
using Selector.Application.Tests.Support;

namespace Selector.Application.Tests.Supplies;

public sealed class EditLogTests
{
    private static Edit Volts(string? old, string text, string by = "ann") => new(ToyStage.Volts, old, text, by);

    [Fact]
    public async Task An_edit_stands_and_is_in_the_log()
    {
        using var shop = await Shop.Open();
        var supply = await shop.Supply();
        var after = (await shop.Supplies.Apply(supply.Number, Volts("10 V", "12 V"))).State();
        Assert.Equal("12 V", after.Texts[ToyStage.Volts]);
        Assert.True(after.Version > supply.Version);
        Assert.True(after.CanUndo);
        var line = (await shop.Supplies.Log(supply.Number))[^1];
        Assert.Equal(("10 V", "12 V", "ann", null), (line.Old, line.New, line.By, line.Undoes));
    }

    [Fact]
    public async Task An_edit_of_a_text_that_moved_on_is_a_conflict_that_names_the_winner()
    {
        using var shop = await Shop.Open();
        var supply = await shop.Supply();
        await shop.Supplies.Apply(supply.Number, Volts("10 V", "12 V", "ben"));
        var conflict = Assert.IsType<EditOutcome.Conflict>(await shop.Supplies.Apply(supply.Number, Volts("10 V", "15 V")));
        Assert.Equal(("12 V", "15 V", "ben"), (conflict.Stands, conflict.Wanted, conflict.By));
        Assert.Equal("12 V", conflict.State.Texts[ToyStage.Volts]);
        Assert.Contains("ben", conflict.Words, StringComparison.Ordinal);
        Assert.Equal("12 V", (await shop.Supplies.Open(supply.Number))!.Texts[ToyStage.Volts]);
    }

    [Fact]
    public async Task Without_an_old_text_the_edit_replaces_whatever_stands()
    {
        using var shop = await Shop.Open();
        var supply = await shop.Supply((ToyStage.Volts, "30 V"));
        Assert.Equal("12 V", (await shop.Supplies.Apply(supply.Number, Volts(null, "12 V"))).State().Texts[ToyStage.Volts]);
    }

    [Fact]
    public async Task Edits_of_two_fields_do_not_meet()
    {
        using var shop = await Shop.Open();
        var supply = await shop.Supply();
        await shop.Supplies.Apply(supply.Number, Volts("10 V", "12 V", "ben"));
        var after = (await shop.Supplies.Apply(supply.Number, new Edit(ToyStage.Note, "0 %", "5 %", "ann"))).State();
        Assert.Equal(("12 V", "5 %"), (after.Texts[ToyStage.Volts], after.Texts[ToyStage.Note]));
    }

    [Fact]
    public async Task An_edit_to_the_text_that_stands_adds_nothing_to_the_log()
    {
        using var shop = await Shop.Open();
        var supply = await shop.Supply();
        var before = (await shop.Supplies.Log(supply.Number)).Length;
        Assert.Equal(supply.Version, (await shop.Supplies.Apply(supply.Number, Volts("10 V", "10 V"))).State().Version);
        Assert.Equal(before, (await shop.Supplies.Log(supply.Number)).Length);
    }

    [Fact]
    public async Task A_supply_that_is_not_there_is_not_found()
    {
        using var shop = await Shop.Open();
        Assert.Equal(new EditOutcome.NotFound(7), await shop.Supplies.Apply(7, Volts(null, "1 V")));
        Assert.Equal(new EditOutcome.NotFound(7), await shop.Supplies.Undo(7, "ann"));
        Assert.Null(await shop.Supplies.Open(7));
    }

    [Fact]
    public async Task The_texts_that_stand_are_those_that_the_log_adds_up_to()
    {
        using var shop = await Shop.Open();
        var supply = await shop.Supply((ToyStage.Note, "1 %"));
        for (var i = 0; i < 12; i++)
        {
            await shop.Supplies.Apply(supply.Number, i % 3 == 0 ? Volts(null, $"{i + 1} V") : new Edit($"fit.R{i % 2}", null, $"part {i}", "ann"));
            if (i % 4 == 3)
            {
                await shop.Supplies.Undo(supply.Number, "ann");
            }
        }

        var folded = (await shop.Supplies.Log(supply.Number)).GroupBy(l => l.Field).ToDictionary(g => g.Key, g => g.Last().New);
        folded.Remove(SupplyFields.Name);
        Assert.Equal(folded.OrderBy(f => f.Key, StringComparer.Ordinal), (await shop.Supplies.Open(supply.Number))!.Texts);
    }

    [Fact]
    public async Task A_new_start_of_the_program_finds_everything()
    {
        using var shop = await Shop.Open();
        var supply = await shop.Supply((ToyStage.Volts, "30 V"));
        await shop.Supplies.Rename(supply.Number, "test fixture", "ann");
        await shop.Supplies.Apply(supply.Number, Volts("30 V", "24 V"));
        var before = (await shop.Supplies.Undo(supply.Number, "ann")).State();
        using var later = shop.Beside();
        var after = (await later.Supplies.Open(supply.Number))!;
        Assert.Equal(before with { Texts = after.Texts }, after);
        Assert.Equal(before.Texts, after.Texts);
        Assert.True(after.CanRedo);
        Assert.Equal("test fixture", Assert.Single(await later.Supplies.List()).Name);
    }
}
