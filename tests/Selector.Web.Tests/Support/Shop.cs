using Bunit;
using Microsoft.AspNetCore.Components;
using Microsoft.Data.Sqlite;
using Microsoft.Extensions.DependencyInjection;
using Selector.Application;
using Selector.Application.Catalogue;
using Selector.Application.Supplies;
using Selector.Engine;
using Selector.Engine.Parts;
using Selector.Engine.Parts.Families;
using Selector.Engine.Supplies;
using Selector.Storage;
using Selector.Storage.Sqlite;
using Selector.Web.Components.Pages;
using Selector.Web.Composition;

namespace Selector.Web.Tests.Support;

/// <summary>The pages over a real store in a folder of its own, with a toy stage beside the real ones.</summary>
public abstract class Shop : BunitContext, IAsyncLifetime
{
    private readonly string _folder = Directory.CreateTempSubdirectory("selector-web-").FullName;

    protected Shop(bool interactive = true)
    {
        Services.AddSelectorSqlite(Path.Combine(_folder, "selector.db"));
        Services.AddSelectorApplication(Standard.Registry.With([new ToyStage()], []));
        Services.AddSheets();
        SetRendererInfo(new RendererInfo("Server", interactive));
    }

    protected SupplyDesk Supplies => Services.GetRequiredService<SupplyDesk>();

    protected CatalogueDesk Catalogue => Services.GetRequiredService<CatalogueDesk>();

    public async Task InitializeAsync()
    {
        // The schema alone: the demo catalogue would bury the parts of the tests.
        await Services.GetRequiredService<IStoreMigrator>().Migrate(default);
        Part[] parts = [Capacitor("HOLDS-50", 50, 4), Capacitor("LACKS-25", 25, 4), Capacitor("UNRATED-50", 50, double.NaN)];
        var report = await Catalogue.Import(CapacitorFamily.Id, PartCsv.Write(CapacitorFamily.Spec, parts));
        Assert.Equal(3, report.Added);
    }

    async Task IAsyncLifetime.DisposeAsync()
    {
        await base.DisposeAsync();
        SqliteConnection.ClearAllPools();
        Directory.Delete(_folder, recursive: true);
    }

    /// <summary>A new supply from 24 V DC with every position empty, and its number.</summary>
    protected async Task<int> Supply(params (string Field, string Text)[] texts)
    {
        var outcome = await Supplies.Create("Test supply", texts.ToDictionary(t => t.Field, t => t.Text), "tester");
        return Assert.IsType<EditOutcome.Applied>(outcome).State.Number;
    }

    /// <summary>The sheet once it has been solved.</summary>
    protected IRenderedComponent<SheetPage> Sheet(int number)
    {
        var sheet = Render<SheetPage>(p => p.Add(s => s.Number, number));
        sheet.WaitForElement("main", Patience);
        return sheet;
    }

    protected static TimeSpan Patience { get; } = TimeSpan.FromSeconds(30);

    private static Part Capacitor(string code, double volts, double ripple) => new()
    {
        Family = CapacitorFamily.Spec,
        Maker = "Test",
        OrderingCode = code,
        Technology = CapacitorFamily.Spec.Technologies[0],
        Prices = new PriceList("EUR", "2026-11-02", [new PriceBreak(1, 12_600)]),
        Ratings = [.. CapacitorFamily.Spec.Ratings.Select(r => Rating(r.Key, volts, ripple))],
    };

    private static double Rating(string key, double volts, double ripple) => key switch
    {
        CapacitorFamily.Capacitance => 2200e-6,
        CapacitorFamily.Tolerance => 0.2,
        CapacitorFamily.Voltage => volts,
        CapacitorFamily.Ripple => ripple,
        CapacitorFamily.EsrLow => 0.05,
        CapacitorFamily.EsrHigh => 0.03,
        CapacitorFamily.TemperatureMax => 105,
        CapacitorFamily.Life => 5000,
        "multiplier_50" => 0.8,
        "multiplier_100" => 1,
        "multiplier_1k" => 1.2,
        "multiplier_10k" or "multiplier_100k" => 1.3,
        _ => double.NaN,
    };
}
