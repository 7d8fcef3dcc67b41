using Microsoft.EntityFrameworkCore;
using Microsoft.Extensions.DependencyInjection;
using Selector.Storage.Sqlite;
using Selector.Storage.Tests.Support;

namespace Selector.Storage.Tests;

public sealed class MigrationTests : IDisposable
{
    private readonly TempStore _temp = new();

    public void Dispose() => _temp.Dispose();

    [Fact]
    public async Task An_empty_folder_gets_a_store_with_the_whole_schema()
    {
        var store = await _temp.Migrated();
        await using var context = await store.Open(default);
        Assert.Empty(await context.Database.GetPendingMigrationsAsync());
        Assert.NotEmpty(await context.Database.GetAppliedMigrationsAsync());
        Assert.Equal(0, await context.CatalogueVersions.Select(v => v.Version).SingleAsync());
        Assert.Empty(await context.Parts.ToListAsync());
        Assert.Empty(await context.SupplyEdits.ToListAsync());
        Assert.Empty(await context.SupplyTexts.ToListAsync());
    }

    [Fact]
    public void The_model_has_no_change_that_no_migration_makes()
    {
        using var context = new DesignTimeContexts().CreateDbContext([]);
        Assert.False(context.Database.HasPendingModelChanges());
    }

    [Fact]
    public async Task The_file_uses_the_write_ahead_log_and_waits_for_the_disk()
    {
        var store = await _temp.Migrated();
        await using var context = await store.Open(default);
        Assert.Equal("wal", await context.Database.SqlQueryRaw<string>("SELECT journal_mode AS Value FROM pragma_journal_mode").SingleAsync());
        Assert.Equal(2, await context.Database.SqlQueryRaw<int>("SELECT synchronous AS Value FROM pragma_synchronous").SingleAsync());
        Assert.Equal(5000, await context.Database.SqlQueryRaw<int>("SELECT timeout AS Value FROM pragma_busy_timeout").SingleAsync());
        Assert.Equal(1, await context.Database.SqlQueryRaw<int>("SELECT foreign_keys AS Value FROM pragma_foreign_keys").SingleAsync());
    }

    [Fact]
    public async Task Two_starters_on_an_empty_store_both_find_it_migrated_twenty_times()
    {
        for (var round = 0; round < 20; round++)
        {
            using var temp = new TempStore();
            var starters = new[] { temp.Starter(), temp.Starter() };
            using var together = new Barrier(starters.Length);
            await Task.WhenAll(starters.Select(s => Task.Run(async () =>
            {
                together.SignalAndWait();
                await s.GetRequiredService<IStoreMigrator>().Migrate(default);
                await using var context = await s.GetRequiredService<StoreWork>().Open(default);
                Assert.Empty(await context.Database.GetPendingMigrationsAsync());
                Assert.Equal(1, await context.CatalogueVersions.CountAsync());
            })));
        }
    }

    [Fact]
    public async Task A_lock_that_a_killed_starter_left_behind_does_not_stop_the_next_one()
    {
        // What dotnet/efcore #38958 describes: the row of the framework's own lock outlives the process that wrote it.
        Directory.CreateDirectory(Path.GetDirectoryName(_temp.File)!);
        var store = _temp.Starter().GetRequiredService<StoreWork>();
        await using var context = await store.Open(default);
        await context.Database.ExecuteSqlRawAsync(
            """
            CREATE TABLE "__EFMigrationsLock" ("Id" INTEGER NOT NULL CONSTRAINT "PK___EFMigrationsLock" PRIMARY KEY, "Timestamp" TEXT NOT NULL);
            INSERT INTO "__EFMigrationsLock"("Id", "Timestamp") VALUES(1, '2020-01-01 00:00:00+00:00');
            """);

        using var patience = new CancellationTokenSource(TimeSpan.FromSeconds(30));
        await _temp.Starter().GetRequiredService<IStoreMigrator>().Migrate(patience.Token);
        Assert.Empty(await context.Database.GetPendingMigrationsAsync());
    }

    [Fact]
    public async Task A_starter_waits_while_another_one_holds_the_store()
    {
        Directory.CreateDirectory(Path.GetDirectoryName(_temp.File)!);
        var held = new FileStream(_temp.File + ".migrating", FileMode.OpenOrCreate, FileAccess.ReadWrite, FileShare.None);
        var waiting = _temp.Starter().GetRequiredService<IStoreMigrator>().Migrate(default);
        await Task.Delay(200);
        Assert.False(waiting.IsCompleted);
        await held.DisposeAsync();
        await waiting;
    }

    [Fact]
    public async Task Migrating_again_changes_nothing()
    {
        var store = await _temp.Migrated();
        await store.Write((c, _) => Task.FromResult(c.Supplies.Add(Some.Supply())), default);
        await _temp.Migrated();
        await using var context = await store.Open(default);
        Assert.Equal("bench", (await context.Supplies.SingleAsync()).Name);
    }
}
