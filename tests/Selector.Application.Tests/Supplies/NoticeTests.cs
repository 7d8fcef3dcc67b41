using Selector.Application.Supplies;
using Selector.Application.Tests.Support;

namespace Selector.Application.Tests.Supplies;

public sealed class NoticeTests
{
    [Fact]
    public async Task Listeners_of_a_supply_hear_its_edits_until_they_leave()
    {
        using var shop = await Shop.Open();
        var (one, other) = (await shop.Supply(), await shop.Supply());
        var heard = new List<SupplyChange>();
        using (shop.Notices.Subscribe(one.Number, heard.Add))
        {
            await shop.Supplies.Apply(other.Number, new Edit(ToyStage.Volts, null, "2 V", "ann"));
            await shop.Supplies.Apply(one.Number, new Edit(ToyStage.Volts, "wrong", "2 V", "ann"));
            Assert.Empty(heard);
            var state = (await shop.Supplies.Apply(one.Number, new Edit(ToyStage.Volts, null, "2 V", "ann"))).State();
            Assert.Equal([new SupplyChange(one.Number, state.Version)], heard);
        }

        await shop.Supplies.Undo(one.Number, "ann");
        Assert.Single(heard);
    }

    [Fact]
    public async Task A_listener_that_is_gone_does_not_undo_the_writers_success()
    {
        using var shop = await Shop.Open();
        using var gone = shop.Notices.Subscribe(null, _ => throw new ObjectDisposedException("page"));
        Assert.IsType<EditOutcome.Applied>(await shop.Supplies.Apply((await shop.Supply()).Number, new Edit(ToyStage.Volts, null, "2 V", "ann")));
    }
}
