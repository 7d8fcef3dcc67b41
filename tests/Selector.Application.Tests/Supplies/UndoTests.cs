using Selector.Application.Supplies;
using Selector.Application.Tests.Support;

namespace Selector.Application.Tests.Supplies;

public sealed class UndoTests
{
    private static async Task<string> Volts(Shop shop, int number) => (await shop.Supplies.Open(number))!.Text(shop.Stage.Fields[0]);

    [Fact]
    public async Task Undo_goes_back_edit_by_edit_and_redo_forward_again()
    {
        using var shop = await Shop.Open();
        var number = (await shop.Supply()).Number;
        foreach (var text in (string[])["11 V", "12 V", "13 V"])
        {
            await shop.Supplies.Apply(number, new Edit(ToyStage.Volts, null, text, "ann"));
        }

        foreach (var text in (string[])["12 V", "11 V", "10 V"])
        {
            Assert.True((await shop.Supplies.Undo(number, "ben")).State().CanRedo);
            Assert.Equal(text, await Volts(shop, number));
        }

        Assert.IsType<EditOutcome.Refused>(await shop.Supplies.Undo(number, "ben"));
        foreach (var text in (string[])["11 V", "12 V", "13 V"])
        {
            await shop.Supplies.Redo(number, "ben");
            Assert.Equal(text, await Volts(shop, number));
        }

        Assert.IsType<EditOutcome.Refused>(await shop.Supplies.Redo(number, "ben"));
        Assert.True((await shop.Supplies.Open(number))!.CanUndo);
    }

    [Fact]
    public async Task An_undo_is_an_entry_of_the_log_that_names_what_it_takes_back()
    {
        using var shop = await Shop.Open();
        var number = (await shop.Supply()).Number;
        await shop.Supplies.Apply(number, new Edit(ToyStage.Volts, null, "12 V", "ann"));
        await shop.Supplies.Undo(number, "ben");
        var log = await shop.Supplies.Log(number);
        Assert.Equal((log[^2].Sequence, "12 V", "10 V", "ben"), (log[^1].Undoes, log[^1].Old, log[^1].New, log[^1].By));
    }

    [Fact]
    public async Task A_new_edit_ends_what_could_be_redone()
    {
        using var shop = await Shop.Open();
        var number = (await shop.Supply()).Number;
        await shop.Supplies.Apply(number, new Edit(ToyStage.Volts, null, "12 V", "ann"));
        await shop.Supplies.Undo(number, "ann");
        var after = (await shop.Supplies.Apply(number, new Edit(ToyStage.Note, null, "3 %", "ann"))).State();
        Assert.False(after.CanRedo);
        Assert.IsType<EditOutcome.Refused>(await shop.Supplies.Redo(number, "ann"));
        await shop.Supplies.Undo(number, "ann");
        Assert.IsType<EditOutcome.Refused>(await shop.Supplies.Undo(number, "ann"));
    }

    [Fact]
    public async Task What_a_supply_began_with_cannot_be_undone()
    {
        using var shop = await Shop.Open();
        var supply = await shop.Supply((ToyStage.Volts, "30 V"));
        Assert.False(supply.CanUndo);
        Assert.IsType<EditOutcome.Refused>(await shop.Supplies.Undo(supply.Number, "ann"));
    }

    [Fact]
    public async Task A_name_is_undone_like_any_field()
    {
        using var shop = await Shop.Open();
        var number = (await shop.Supply()).Number;
        Assert.Equal("new", (await shop.Supplies.Rename(number, "new", "ann")).State().Name);
        Assert.Equal("bench", (await shop.Supplies.Undo(number, "ann")).State().Name);
    }

    [Fact]
    public async Task Random_edits_undone_to_the_end_leave_the_beginning_and_redone_the_end()
    {
        using var shop = await Shop.Open();
        var number = (await shop.Supply()).Number;
        var random = new Random(20261201);
        for (var i = 0; i < 60; i++)
        {
            _ = random.Next(5) switch
            {
                0 => await shop.Supplies.Undo(number, "ann"),
                1 => await shop.Supplies.Redo(number, "ann"),
                2 => await shop.Supplies.Apply(number, new Edit(ToyStage.Note, null, $"{i} %", "ann")),
                _ => await shop.Supplies.Apply(number, new Edit(ToyStage.Volts, null, $"{i} V", "ann")),
            };
        }

        while ((await shop.Supplies.Open(number))!.CanRedo)
        {
            await shop.Supplies.Redo(number, "ann");
        }

        var end = (await shop.Supplies.Open(number))!;
        while ((await shop.Supplies.Open(number))!.CanUndo)
        {
            await shop.Supplies.Undo(number, "ann");
        }

        var begin = (await shop.Supplies.Open(number))!;
        Assert.Equal(("10 V", "0 %"), (begin.Text(shop.Stage.Fields[0]), begin.Text(shop.Stage.Fields[1])));
        while ((await shop.Supplies.Open(number))!.CanRedo)
        {
            await shop.Supplies.Redo(number, "ann");
        }

        Assert.Equal(end.Texts, (await shop.Supplies.Open(number))!.Texts);
    }
}
