using System.Collections.Immutable;
using Microsoft.Data.Sqlite;
using Microsoft.Extensions.DependencyInjection;
using Selector.Application.Assessing;
using Selector.Application.Catalogue;
using Selector.Application.Supplies;
using Selector.Engine;
using Selector.Engine.Supplies;
using Selector.Storage;
using Selector.Storage.Sqlite;

namespace Selector.Application.Tests.Support;

/// <summary>The services on a real file in a folder of its own; another shop on the same file is another process as far as they can tell.</summary>
internal sealed class Shop : IDisposable
{
    private readonly ServiceProvider _services;
    private readonly string? _folder;

    private Shop(string file, string? folder, SelectorOptions? options, TimeProvider? time)
    {
        File = file;
        _folder = folder;
        Registry = new Registry([Stage], Standard.Registry.Families);
        var services = new ServiceCollection();
        if (time is not null)
        {
            services.AddSingleton(time);
        }

        _services = services.AddSelectorApplication(Registry, options).AddSelectorSqlite(file).BuildServiceProvider();
    }

    public string File { get; }

    public ToyStage Stage { get; } = new();

    public Registry Registry { get; }

    public SupplyDesk Supplies => Get<SupplyDesk>();

    public CatalogueDesk Catalogue => Get<CatalogueDesk>();

    public AssessmentDesk Assessments => Get<AssessmentDesk>();

    public SupplyNotices Notices => Get<SupplyNotices>();

    public StoreWork Store => Get<StoreWork>();

    public StoreStart Start => Get<StoreStart>();

    public static async Task<Shop> Open(SelectorOptions? options = null, TimeProvider? time = null)
    {
        var shop = New(options, time);
        await shop.Get<IStoreMigrator>().Migrate(default);
        return shop;
    }

    /// <summary>A shop whose store does not exist yet.</summary>
    public static Shop New(SelectorOptions? options = null, TimeProvider? time = null)
    {
        var folder = Directory.CreateTempSubdirectory("selector-test-").FullName;
        return new Shop(Path.Combine(folder, "selector.db"), folder, options, time);
    }

    /// <summary>Other services on the same file.</summary>
    public Shop Beside() => new(File, null, null, null);

    public T Get<T>()
        where T : notnull => _services.GetRequiredService<T>();

    public async Task<SupplyState> Supply(params (string Field, string Text)[] fields) =>
        (await Supplies.Create("bench", fields.ToImmutableDictionary(f => f.Field, f => f.Text), "ann")).State();

    public void Dispose()
    {
        _services.Dispose();
        if (_folder is not null)
        {
            SqliteConnection.ClearAllPools();
            Directory.Delete(_folder, recursive: true);
        }
    }
}

internal static class Outcomes
{
    /// <summary>The new state of an edit that must have been applied.</summary>
    public static SupplyState State(this EditOutcome outcome) => Assert.IsType<EditOutcome.Applied>(outcome).State;
}
