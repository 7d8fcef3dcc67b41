using Microsoft.EntityFrameworkCore;
using Microsoft.Extensions.DependencyInjection;

namespace Selector.Storage.Sqlite;

/// <summary>Registers the embedded store.</summary>
public static class SqliteServices
{
    /// <param name="services">The composition root's.</param>
    /// <param name="path">File of the store; see <see cref="StorePath"/>.</param>
    public static IServiceCollection AddSelectorSqlite(this IServiceCollection services, string path)
    {
        services.AddDbContextFactory<SqliteSelectorContext>(o => o.UseSelectorSqlite(path));
        services.AddSingleton<IDbContextFactory<SelectorContext>, SqliteContexts>();
        services.AddSingleton<IStoreMigrator>(s =>
            new SqliteMigrator(path, s.GetRequiredService<IDbContextFactory<SqliteSelectorContext>>()));
        services.AddSingleton<StoreWork>();
        return services;
    }
}
