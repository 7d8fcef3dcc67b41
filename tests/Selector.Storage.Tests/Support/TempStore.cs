using Microsoft.Data.Sqlite;
using Microsoft.EntityFrameworkCore;
using Microsoft.Extensions.DependencyInjection;
using Selector.Storage.Sqlite;

namespace Selector.Storage.Tests.Support;

/// <summary>A real file in a folder of its own, gone with the test.</summary>
internal sealed class TempStore : IDisposable
{
    private readonly string _folder = Directory.CreateTempSubdirectory("selector-test-").FullName;
    private readonly List<ServiceProvider> _starters = [];

    public string File => Path.Combine(_folder, "deeper", "selector.db");

    /// <summary>What another process that opens the same file would have: nothing shared but the file.</summary>
    public IServiceProvider Starter(string? file = null)
    {
        var starter = new ServiceCollection().AddSelectorSqlite(file ?? File).BuildServiceProvider();
        _starters.Add(starter);
        return starter;
    }

    public async Task<StoreWork> Migrated()
    {
        var starter = Starter();
        await starter.GetRequiredService<IStoreMigrator>().Migrate(default);
        return starter.GetRequiredService<StoreWork>();
    }

    /// <summary>Copies the file and its log as a killed process would leave them at this moment.</summary>
    public string AsKilledNow()
    {
        var copy = Path.Combine(_folder, Path.GetRandomFileName(), "selector.db");
        Directory.CreateDirectory(Path.GetDirectoryName(copy)!);
        foreach (var end in (string[])["", "-wal"])
        {
            if (System.IO.File.Exists(File + end))
            {
                System.IO.File.Copy(File + end, copy + end);
            }
        }

        return copy;
    }

    public void Dispose()
    {
        foreach (var starter in _starters)
        {
            starter.Dispose();
        }

        SqliteConnection.ClearAllPools();
        Directory.Delete(_folder, recursive: true);
    }
}
