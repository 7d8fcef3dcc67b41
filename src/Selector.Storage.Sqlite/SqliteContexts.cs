using Microsoft.EntityFrameworkCore;

namespace Selector.Storage.Sqlite;

/// <summary>Hands out the SQLite context where the shared one is asked for.</summary>
internal sealed class SqliteContexts(IDbContextFactory<SqliteSelectorContext> inner) : IDbContextFactory<SelectorContext>
{
    public SelectorContext CreateDbContext() => inner.CreateDbContext();
}
