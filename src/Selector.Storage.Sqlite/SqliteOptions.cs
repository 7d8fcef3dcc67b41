using Microsoft.Data.Sqlite;
using Microsoft.EntityFrameworkCore;
using Microsoft.EntityFrameworkCore.Diagnostics;

namespace Selector.Storage.Sqlite;

/// <summary>How a connection to the file is made; the same for the program, the tests and the design tools.</summary>
public static class SqliteOptions
{
    /// <summary>Seconds that a command waits for another writer before it gives up.</summary>
    private const int Patience = 30;

    public static DbContextOptionsBuilder UseSelectorSqlite(this DbContextOptionsBuilder builder, string path)
    {
        ArgumentNullException.ThrowIfNull(builder);
        var connection = new SqliteConnectionStringBuilder
        {
            DataSource = path,
            Mode = SqliteOpenMode.ReadWriteCreate,
            ForeignKeys = true,
            DefaultTimeout = Patience,
        };
        return builder
            .UseSqlite(connection.ToString(), o => o.ExecutionStrategy(d => new BusyRetry(d)))
            .AddInterceptors(ConnectionSettings.Instance)
            .ConfigureWarnings(w => w.Throw(RelationalEventId.MultipleCollectionIncludeWarning));
    }
}
