using System.Collections.Immutable;
using Bunit;
using Microsoft.AspNetCore.Components;
using Microsoft.Data.Sqlite;
using Microsoft.Extensions.DependencyInjection;
using Selector.Application;
using Selector.Application.Catalogue;
using Selector.Application.Policies;
using Selector.Application.Supplies;
using Selector.Documents;
using Selector.Documents.Sheets;
using Selector.Documents.Tests.Support;
using Selector.Engine;
using Selector.Engine.Circuits;
using Selector.Engine.Derating;
using Selector.Engine.Ranking;
using Selector.Engine.Supplies;
using Selector.Storage;
using Selector.Storage.Sqlite;
using Selector.Web.Components.Pages;
using Selector.Web.Composition;

namespace Selector.Toy;

/// <summary>
/// The test of the design: a stage and a family that are registered from outside stand in form, CSV, ranking, ledger and paper,
/// with nothing in the product changed.
/// </summary>
public sealed class FromOutsideTests : BunitContext, IAsyncLifetime
{
    private static readonly Registry Registry = Standard.Registry.With([new ToyStage()], [ToyFamily.Spec]);

    private static readonly Policy Policy = new PolicyShelf().Standard is var standard
        ? standard with
        {
            Clauses = standard.Clauses.Add(new Clause(
                ToyFamily.Id, "", "lamp-power", new ClauseOperator.Factor(0.5), RatingBasis.Nominal, "toy rules", "1", Certainty.CommonPractice, "")),
        }
        : throw new InvalidOperationException();

    private readonly string _folder = Directory.CreateTempSubdirectory("selector-toy-").FullName;

    public FromOutsideTests()
    {
        Services.AddSelectorSqlite(Path.Combine(_folder, "selector.db"));
        Services.AddSelectorApplication(Registry);
        Services.AddSheets();
        SetRendererInfo(new RendererInfo("Server", true));
    }

    public Task InitializeAsync() => Services.GetRequiredService<IStoreMigrator>().Migrate(default);

    async Task IAsyncLifetime.DisposeAsync()
    {
        await base.DisposeAsync();
        SqliteConnection.ClearAllPools();
        Directory.Delete(_folder, recursive: true);
    }

    [Fact]
    public async Task The_form_has_the_field_and_the_sheet_the_row()
    {
        var created = await Services.GetRequiredService<SupplyDesk>().Create("Toy", new Dictionary<string, string>(), "tester");
        var number = Assert.IsType<EditOutcome.Applied>(created).State.Number;

        var sheet = Render<SheetPage>(p => p.Add(s => s.Number, number));
        sheet.WaitForElement($"tr[data-position='{ToyStage.Position}']", TimeSpan.FromSeconds(30));

        Assert.Equal("50 %", sheet.Find($"[data-field='{ToyStage.Share}'] input").GetAttribute("value"));
        Assert.Contains("power of the lamp", sheet.Find($"tr[data-position='{ToyStage.Position}']").TextContent, StringComparison.Ordinal);
    }

    [Fact]
    public async Task The_catalogue_reads_and_writes_its_file()
    {
        var desk = Services.GetRequiredService<CatalogueDesk>();
        var report = await desk.Import(ToyFamily.Id, "maker,ordering_code,filament_ohm,brightness_w\nToyland,L1,4k7,250m\n");

        Assert.Equal(1, report.Added);
        Assert.Empty(report.Refused);
        var part = Assert.Single((await desk.Snapshot(default)).Of(ToyFamily.Id));
        Assert.Equal((4700, 0.25), (part["filament"], part["brightness"]));
        var file = await desk.Export(ToyFamily.Id);
        Assert.Contains("filament_ohm", file, StringComparison.Ordinal);
        Assert.Empty(PartCsv.Read(ToyFamily.Spec, file).Faults);
    }

    [Fact]
    public void The_ranking_finds_what_holds_and_what_lacks()
    {
        // 28 V at most, half of it across the lamp: 14² / 1000 = 0.196 W; half of the rating may be used.
        var ranking = Ranker.Rank(
            Model(), Design.Empty.Fittings, ToyStage.Position,
            [ToyFamily.Lamp("DEAR", 1000, 1, 9_000), ToyFamily.Lamp("SMALL", 1000, 0.3, 1_000), ToyFamily.Lamp("CHEAP", 1000, 0.5, 2_000)],
            Policy, default);

        Assert.Equal(["CHEAP", "DEAR", "SMALL"], ranking.Candidates.Select(c => c.Part.OrderingCode));
        Assert.Equal([Standing.Holds, Standing.Holds, Standing.Lacks], ranking.Candidates.Select(c => c.Standing));
        Assert.Equal(1 - 0.196 / 0.25, ranking.Candidates[0].Limiting!.Margin!.Value, 9);
    }

    [Fact]
    public void Ledger_and_paper_carry_it()
    {
        var design = Design.Empty.Fit(ToyStage.Position, new Fitting(ToyFamily.Lamp("CHEAP", 1000, 0.5, 2_000)));
        var ledger = Assessor.Assess(Registry, design, Policy, Budget.Standard);
        var row = Assert.Single(ledger.Rows, r => r.Position == ToyStage.Position);
        Assert.Equal((Verdict.Holds, 0.196), (row.Verdict, Math.Round(row.Stress!.Value, 9)));

        var input = new PaperInput("Toy", 1, "", RequirementReader.Read(Registry, design.Requirement), design, ledger);
        var table = DeratingSheet.Build(input).Tables.Single(t => t.Name == "derating");
        Assert.Contains(ReadBack.Rows(Papers.Both(input), table), r => r.Cells[0] == ToyStage.Position && r.Cells.Contains("powerofthelamp"));
        Assert.Contains(BillOfMaterials.Build(input).Tables.SelectMany(t => t.Rows), r => r.Cells.Any(c => c.Text.Contains("CHEAP", StringComparison.Ordinal)));
    }

    private static SupplyModel Model() => SupplyModel.Build(Registry, RequirementReader.Read(Registry, Requirement.Empty));
}
