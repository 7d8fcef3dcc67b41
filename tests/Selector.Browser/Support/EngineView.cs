using Microsoft.Extensions.DependencyInjection;
using Selector.Application;
using Selector.Application.Assessing;
using Selector.Application.Supplies;
using Selector.Documents.Sheets;
using Selector.Engine;
using Selector.Engine.Supplies;
using Selector.Storage.Sqlite;

namespace Selector.Browser.Support;

/// <summary>The same supply assessed by the engine in the test's own process, from the server's store.</summary>
internal static class EngineView
{
    public static async Task<Assessment> Of(RunningServer server, int number)
    {
        await using var services = new ServiceCollection()
            .AddLogging()
            .AddSelectorSqlite(server.Store)
            .AddSelectorApplication(Standard.Registry)
            .BuildServiceProvider();
        var state = await services.GetRequiredService<SupplyDesk>().Open(number, CancellationToken.None);
        return await services.GetRequiredService<AssessmentDesk>().Assess(state!, CancellationToken.None);
    }

    public static PaperInput Paper(Assessment a) =>
        new(a.State.Name, a.State.Number, "", a.Requirement, a.Design, a.Ledger);

    public static IEnumerable<LedgerRow> Assessed(Assessment a) => a.Ledger.Rows.Where(r => r.Spec is not null);
}
