using Microsoft.EntityFrameworkCore;

namespace Selector.Storage.Sqlite;

/// <summary>The shared model on SQLite.</summary>
public sealed class SqliteSelectorContext(DbContextOptions<SqliteSelectorContext> options) : SelectorContext(options);
