using Microsoft.AspNetCore.DataProtection;
using Selector.Application;
using Selector.Engine;
using Selector.Storage.Sqlite;

namespace Selector.Web.Composition;

/// <summary>Which store there is, which stages and families: said here and nowhere else in the pages' program.</summary>
internal static class StoreServices
{
    /// <summary>A whole family on a mains supply takes long on a small machine; whoever closes the row ends it sooner.</summary>
    private static readonly TimeSpan RankingLimit = TimeSpan.FromSeconds(60);

    public static IServiceCollection AddSelectorStore(this IServiceCollection services, IConfiguration configuration)
    {
        var path = StorePath.Find(configuration[StorePath.Setting]);
        services.AddSelectorSqlite(path);
        services.AddSelectorApplication(Standard.Registry, new SelectorOptions { SolveLimit = RankingLimit });

        // Keys that protect forms lie beside the store, so that a form that was opened before a restart can still be sent.
        services.AddDataProtection()
            .SetApplicationName("Selector")
            .PersistKeysToFileSystem(new DirectoryInfo(Path.Combine(Path.GetDirectoryName(path)!, "keys")));
        return services;
    }

    /// <summary>Brings the store to the schema of this program and fills a new one with the demo catalogue and the examples.</summary>
    public static async Task Prepare(IServiceProvider services, CancellationToken cancel)
    {
        var report = await services.GetRequiredService<StoreStart>().Prepare(cancel);
        var log = services.GetRequiredService<ILoggerFactory>().CreateLogger(typeof(StoreServices));
        foreach (var warning in report.Warnings)
        {
            log.LogWarning("{Warning}", warning);
        }
    }
}
