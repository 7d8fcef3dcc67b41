using Microsoft.EntityFrameworkCore;
using Microsoft.Extensions.DependencyInjection;
using Selector.Storage.Tests.Support;

namespace Selector.Storage.Tests;

public sealed class StoreWorkTests : IDisposable
{
    private readonly TempStore _temp = new();

    public void Dispose() => _temp.Dispose();

    [Fact]
    public async Task Work_that_throws_leaves_nothing_behind()
    {
        var store = await _temp.Migrated();
        await Assert.ThrowsAsync<InvalidOperationException>(() => store.Write<int>(
            async (context, token) =>
            {
                context.Supplies.Add(Some.Supply());
                await context.SaveChangesAsync(token);
                throw new InvalidOperationException("in the middle");
            },
            default));
        await using var context = await store.Open(default);
        Assert.Empty(await context.Supplies.ToListAsync());
    }

    [Fact]
    public async Task A_kill_between_save_and_commit_keeps_what_was_acknowledged_and_nothing_else()
    {
        var store = await _temp.Migrated();
        for (var i = 0; i < 20; i++)
        {
            var name = $"acknowledged {i}";
            await store.Write((c, _) => Task.FromResult(c.Supplies.Add(Some.Supply(name))), default);
        }

        var left = "";
        await store.Write(
            async (context, token) =>
            {
                context.Supplies.Add(Some.Supply("half done"));
                context.Parts.Add(Some.Part());
                await context.SaveChangesAsync(token);
                left = _temp.AsKilledNow();
                return 0;
            },
            default);

        var next = _temp.Starter(left);
        await next.GetRequiredService<IStoreMigrator>().Migrate(default);
        await using var after = await next.GetRequiredService<StoreWork>().Open(default);
        var names = await after.Supplies.OrderBy(s => s.Number).Select(s => s.Name).ToListAsync();
        Assert.Equal([.. Enumerable.Range(0, 20).Select(i => $"acknowledged {i}")], names);
        Assert.Empty(await after.Parts.ToListAsync());
        Assert.Equal("ok", await after.Database.SqlQueryRaw<string>("SELECT integrity_check AS Value FROM pragma_integrity_check").SingleAsync());
    }

    [Fact]
    public async Task Every_change_of_a_row_counts_its_version_up()
    {
        var store = await _temp.Migrated();
        var number = (await store.Write((c, _) => Task.FromResult(c.Supplies.Add(Some.Supply()).Entity), default)).Number;
        for (var version = 1; version <= 3; version++)
        {
            var name = $"name {version}";
            await store.Write(
                async (c, token) =>
                {
                    var supply = await c.Supplies.SingleAsync(s => s.Number == number, token);
                    Assert.Equal(version, supply.Version);
                    return supply.Name = name;
                },
                default);
        }
    }

    [Fact]
    public async Task A_change_made_from_an_older_version_is_refused()
    {
        var store = await _temp.Migrated();
        await store.Write((c, _) => Task.FromResult(c.Supplies.Add(Some.Supply())), default);
        await using var slow = await store.Open(default);
        var seen = await slow.Supplies.SingleAsync();
        await store.Write(async (c, token) => (await c.Supplies.SingleAsync(token)).Name = "quick", default);
        seen.Name = "slow";
        await Assert.ThrowsAsync<DbUpdateConcurrencyException>(() => slow.SaveChangesAsync());
    }

    [Fact]
    public async Task Writers_of_two_starters_lose_no_count()
    {
        var one = await _temp.Migrated();
        var other = _temp.Starter().GetRequiredService<StoreWork>();
        await one.Write((c, _) => Task.FromResult(c.Supplies.Add(Some.Supply())), default);
        await Task.WhenAll(Enumerable.Range(0, 40).Select(i => Task.Run(() => (i % 2 == 0 ? one : other).Write(
            async (c, token) => (await c.Supplies.SingleAsync(token)).LastSequence++, default))));
        await using var context = await one.Open(default);
        Assert.Equal(40, (await context.Supplies.SingleAsync()).LastSequence);
    }

    [Fact]
    public async Task The_same_part_cannot_be_there_twice()
    {
        var store = await _temp.Migrated();
        await using var context = await store.Open(default);
        context.Parts.AddRange(Some.Part("R-1"), Some.Part("R-1"));
        await Assert.ThrowsAsync<DbUpdateException>(() => context.SaveChangesAsync());
        context.ChangeTracker.Clear();
        context.Parts.AddRange(Some.Part("R-1"), Some.Part("R-2"), Some.Part("R-1", "Another"));
        await context.SaveChangesAsync();
    }

    [Fact]
    public async Task Times_come_back_as_utc_and_local_ones_are_refused()
    {
        var store = await _temp.Migrated();
        await store.Write((c, _) => Task.FromResult(c.Supplies.Add(Some.Supply())), default);
        await using var context = await store.Open(default);
        var supply = await context.Supplies.SingleAsync();
        Assert.Equal(Some.Time, supply.CreatedUtc);
        Assert.Equal(DateTimeKind.Utc, supply.CreatedUtc.Kind);
        supply.EditedUtc = new DateTime(2026, 1, 1, 0, 0, 0, DateTimeKind.Local);
        await Assert.ThrowsAnyAsync<Exception>(() => context.SaveChangesAsync());
    }
}
