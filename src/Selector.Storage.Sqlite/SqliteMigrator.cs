using Microsoft.EntityFrameworkCore;

namespace Selector.Storage.Sqlite;

/// <summary>
/// Migrates the file under a lock of the operating system, which is gone with the process that held it. The framework keeps its
/// own lock as a row in the file, and a starter that was killed leaves that row behind for ever (dotnet/efcore #38958); whoever
/// holds our lock knows that no such row can be in use and clears it.
/// </summary>
public sealed class SqliteMigrator(string path, IDbContextFactory<SqliteSelectorContext> contexts) : IStoreMigrator
{
    private static readonly TimeSpan Patience = TimeSpan.FromSeconds(60);
    private static readonly TimeSpan Pause = TimeSpan.FromMilliseconds(20);

    public async Task Migrate(CancellationToken cancel)
    {
        if (Path.GetDirectoryName(Path.GetFullPath(path)) is { Length: > 0 } folder)
        {
            Directory.CreateDirectory(folder);
        }

        var held = await Hold(cancel).ConfigureAwait(false);
        await using (held.ConfigureAwait(false))
        {
            var context = await contexts.CreateDbContextAsync(cancel).ConfigureAwait(false);
            await using (context.ConfigureAwait(false))
            {
                await context.Database.ExecuteSqlRawAsync("PRAGMA journal_mode = WAL", cancel).ConfigureAwait(false);
                await context.Database.ExecuteSqlRawAsync("DROP TABLE IF EXISTS \"__EFMigrationsLock\"", cancel).ConfigureAwait(false);
                await context.Database.MigrateAsync(cancel).ConfigureAwait(false);
            }
        }
    }

    /// <summary>Waits for the lock file. It stays where it is afterwards: deleting it would let two starters lock two files.</summary>
    private async Task<FileStream> Hold(CancellationToken cancel)
    {
        for (var waited = TimeSpan.Zero; ; waited += Pause)
        {
            try
            {
                return new FileStream(path + ".migrating", FileMode.OpenOrCreate, FileAccess.ReadWrite, FileShare.None);
            }
            catch (IOException e) when (e is not (DirectoryNotFoundException or PathTooLongException))
            {
                if (waited >= Patience)
                {
                    throw new TimeoutException(
                        $"Another program has been migrating {path} for {Patience.TotalSeconds:0} s. Stop it, then start again.", e);
                }

                await Task.Delay(Pause, cancel).ConfigureAwait(false);
            }
        }
    }
}
