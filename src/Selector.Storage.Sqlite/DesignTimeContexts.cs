using Microsoft.EntityFrameworkCore;
using Microsoft.EntityFrameworkCore.Design;

namespace Selector.Storage.Sqlite;

/// <summary>Lets the migration tool make a context; it only reads the model, no file is opened.</summary>
public sealed class DesignTimeContexts : IDesignTimeDbContextFactory<SqliteSelectorContext>
{
    public SqliteSelectorContext CreateDbContext(string[] args)
    {
        var builder = new DbContextOptionsBuilder<SqliteSelectorContext>();
        builder.UseSelectorSqlite("design.db");
        return new SqliteSelectorContext(builder.Options);
    }
}
