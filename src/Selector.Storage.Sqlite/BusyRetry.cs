using Microsoft.Data.Sqlite;
using Microsoft.EntityFrameworkCore;
using Microsoft.EntityFrameworkCore.Storage;

namespace Selector.Storage.Sqlite;

/// <summary>
/// Tries again when the file is held by another writer. The busy timeout covers most of it, but SQLite answers at once where
/// waiting could not help, such as a reader that turns writer on an old picture of the file.
/// </summary>
internal sealed class BusyRetry(ExecutionStrategyDependencies dependencies)
    : ExecutionStrategy(dependencies, maxRetryCount: 8, maxRetryDelay: TimeSpan.FromSeconds(2))
{
    private const int Busy = 5;
    private const int Locked = 6;

    protected override bool ShouldRetryOn(Exception exception) =>
        (exception as SqliteException ?? exception.InnerException as SqliteException) is { SqliteErrorCode: Busy or Locked };

    protected override TimeSpan? GetNextDelay(Exception lastException) =>
        base.GetNextDelay(lastException) is { } wait ? wait / 10 : null;
}
