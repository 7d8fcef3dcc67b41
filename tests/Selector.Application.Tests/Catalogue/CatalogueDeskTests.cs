using Selector.Application.Tests.Support;
using Selector.Engine.Parts;

namespace Selector.Application.Tests.Catalogue;

public sealed class CatalogueDeskTests
{
    private const string Family = "resistor";

    [Fact]
    public async Task An_import_adds_changes_and_leaves_alone_and_says_how_many()
    {
        using var shop = await Shop.Open();
        var first = await shop.Catalogue.Import(Family, Resistors.File(Resistors.Row("A"), Resistors.Row("B")));
        Assert.Equal((2, 0, 0, true), (first.Added, first.Changed, first.Unchanged, first.Done));
        var id = (await shop.Catalogue.Snapshot()).Of(Family).Single(p => p.OrderingCode == "B").Id;
        var next = await shop.Catalogue.Import(Family, Resistors.File(Resistors.Row("A"), Resistors.Row("B", watts: "1"), Resistors.Row("C")));
        Assert.Equal((1, 1, 1, true), (next.Added, next.Changed, next.Unchanged, next.Done));
        var b = (await shop.Catalogue.Snapshot()).Of(Family).Single(p => p.OrderingCode == "B");
        Assert.Equal((id, 1.0), (b.Id, b["power"]));
        Assert.Equal<PriceBreak>([new(1, 500), new(100, 213)], b.Prices.Breaks);
    }

    [Fact]
    public async Task One_wrong_row_keeps_all_others_out()
    {
        using var shop = await Shop.Open();
        await shop.Catalogue.Import(Family, Resistors.File(Resistors.Row("A")));
        var before = await shop.Catalogue.Snapshot();
        var report = await shop.Catalogue.Import(Family, Resistors.File(Resistors.Row("A", watts: "9"), Resistors.Row("B"), Resistors.Row("C", watts: "?")));
        Assert.False(report.Done);
        Assert.Equal((4, 1), (Assert.Single(report.Refused).Row, report.RefusedRows));
        Assert.Same(before, await shop.Catalogue.Snapshot());
    }

    [Fact]
    public async Task A_dry_run_says_the_same_and_writes_nothing()
    {
        using var shop = await Shop.Open();
        await shop.Catalogue.Import(Family, Resistors.File(Resistors.Row("A"), Resistors.Row("B")));
        var before = await shop.Catalogue.Snapshot();
        var file = Resistors.File(Resistors.Row("A"), Resistors.Row("B", watts: "1"), Resistors.Row("C"));
        var dry = await shop.Catalogue.Import(Family, file, dryRun: true);
        Assert.Same(before, await shop.Catalogue.Snapshot());
        Assert.Equal(await shop.Catalogue.Import(Family, file), dry with { Done = true });
    }

    [Fact]
    public async Task The_snapshot_is_shared_until_the_catalogue_changes_by_whomever()
    {
        using var shop = await Shop.Open();
        using var other = shop.Beside();
        await shop.Catalogue.Import(Family, Resistors.File(Resistors.Row("A")));
        var first = await shop.Catalogue.Snapshot();
        Assert.Same(first, await shop.Catalogue.Snapshot());
        await other.Catalogue.Import(Family, Resistors.File(Resistors.Row("A")));
        Assert.Same(first, await shop.Catalogue.Snapshot());
        await other.Catalogue.Import(Family, Resistors.File(Resistors.Row("B")));
        var second = await shop.Catalogue.Snapshot();
        Assert.True(second.Version > first.Version);
        Assert.Equal(2, second.Of(Family).Length);
        Assert.Single(first.Of(Family));
    }

    [Fact]
    public async Task An_export_imported_again_changes_nothing()
    {
        using var shop = await Shop.Open();
        await shop.Catalogue.Import(Family, Resistors.File(Resistors.Row("=A", ohms: "4k7"), Resistors.Row("@B", ohms: "0.1")));
        var file = await shop.Catalogue.Export(Family);
        Assert.Contains(",'=A,", file, StringComparison.Ordinal);
        var report = await shop.Catalogue.Import(Family, file);
        Assert.Equal((0, 0, 2), (report.Added, report.Changed, report.Unchanged));
        Assert.Equal(file, await shop.Catalogue.Export(Family));
    }

    [Fact]
    public async Task Imports_at_once_from_two_programs_all_arrive()
    {
        using var shop = await Shop.Open();
        using var other = shop.Beside();
        var before = (await shop.Catalogue.Snapshot()).Version;
        await Task.WhenAll(Enumerable.Range(0, 20).Select(i => Task.Run(() =>
            (i % 2 == 0 ? shop : other).Catalogue.Import(Family, Resistors.File(Resistors.Row($"P{i}"), Resistors.Row("shared", watts: $"{i + 1}"))))));
        var after = await shop.Catalogue.Snapshot();
        Assert.Equal((21, before + 20), (after.Of(Family).Length, after.Version));
    }

    [Fact]
    public async Task An_unknown_family_and_a_file_over_the_limit_are_refused_in_words()
    {
        using var shop = await Shop.Open(new SelectorOptions { LongestImport = 1000 });
        Assert.Contains("no such family", Assert.Single((await shop.Catalogue.Import("valve", "x")).Refused).Reason, StringComparison.Ordinal);
        var long1 = await shop.Catalogue.Import(Family, new string('x', 1001));
        Assert.Contains("1001", Assert.Single(long1.Refused).Reason, StringComparison.Ordinal);
    }
}
