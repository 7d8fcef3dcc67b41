using System.Data.Common;
using Microsoft.EntityFrameworkCore.Diagnostics;

namespace Selector.Storage.Sqlite;

/// <summary>
/// What SQLite forgets with every connection. FULL makes a commit wait for the disk: with the write-ahead log NORMAL would keep
/// the file whole but could lose saves that were already acknowledged when the power goes.
/// </summary>
internal sealed class ConnectionSettings : DbConnectionInterceptor
{
    private const string Settings = "PRAGMA busy_timeout = 5000; PRAGMA synchronous = FULL;";

    public static ConnectionSettings Instance { get; } = new();

    public override void ConnectionOpened(DbConnection connection, ConnectionEndEventData eventData)
    {
        using var command = connection.CreateCommand();
        command.CommandText = Settings;
        command.ExecuteNonQuery();
    }

    public override async Task ConnectionOpenedAsync(
        DbConnection connection, ConnectionEndEventData eventData, CancellationToken cancellationToken = default)
    {
        var command = connection.CreateCommand();
        await using (command.ConfigureAwait(false))
        {
            command.CommandText = Settings;
            await command.ExecuteNonQueryAsync(cancellationToken).ConfigureAwait(false);
        }
    }
}
