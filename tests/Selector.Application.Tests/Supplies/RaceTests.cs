using Selector.Application.Supplies;
using Selector.Application.Tests.Support;

namespace Selector.Application.Tests.Supplies;

public sealed class RaceTests
{
    [Fact]
    public async Task Two_hundred_racing_pairs_have_one_winner_each_and_the_loser_sees_the_winners_text()
    {
        using var ann = await Shop.Open();
        using var ben = ann.Beside();
        var number = (await ann.Supply()).Number;
        var stands = "10 V";
        for (var pair = 0; pair < 200; pair++)
        {
            using var together = new Barrier(2);
            var old = stands;
            var outcomes = await Task.WhenAll(
                Race(ann, new Edit(ToyStage.Volts, old, $"{pair} V of ann", "ann")),
                Race(ben, new Edit(ToyStage.Volts, old, $"{pair} V of ben", "ben")));
            var won = Assert.Single(outcomes.OfType<EditOutcome.Applied>());
            var lost = Assert.Single(outcomes.OfType<EditOutcome.Conflict>());
            stands = won.State.Texts[ToyStage.Volts];
            Assert.Equal(stands, lost.Stands);
            Assert.EndsWith(lost.By, stands, StringComparison.Ordinal);
            Assert.NotEqual(lost.Wanted, lost.Stands);

            Task<EditOutcome> Race(Shop shop, Edit edit) => Task.Run(() =>
            {
                together.SignalAndWait();
                return shop.Supplies.Apply(number, edit);
            });
        }

        var log = (await ann.Supplies.Log(number)).Where(l => l.Field == ToyStage.Volts).ToList();
        Assert.Equal(200, log.Count);
        Assert.Equal(log.Skip(1).Select(l => l.Old), log.SkipLast(1).Select(l => l.New));
    }

    [Fact]
    public async Task Racing_undos_take_back_one_edit_each()
    {
        using var ann = await Shop.Open();
        using var ben = ann.Beside();
        var number = (await ann.Supply()).Number;
        for (var i = 1; i <= 20; i++)
        {
            await ann.Supplies.Apply(number, new Edit(ToyStage.Volts, null, $"{i + 10} V", "ann"));
        }

        var outcomes = await Task.WhenAll(Enumerable.Range(0, 30).Select(i => Task.Run(() => (i % 2 == 0 ? ann : ben).Supplies.Undo(number, "x"))));
        Assert.Equal(20, outcomes.OfType<EditOutcome.Applied>().Count());
        Assert.Equal(10, outcomes.OfType<EditOutcome.Refused>().Count());
        Assert.Equal("10 V", (await ann.Supplies.Open(number))!.Texts[ToyStage.Volts]);
    }
}
