using System.Collections.Immutable;
using Microsoft.EntityFrameworkCore;
using Selector.Application.Catalogue;
using Selector.Application.Examples;
using Selector.Application.Tests.Support;
using Selector.Engine;
using Selector.Engine.Supplies;
using Selector.Storage;

namespace Selector.Application.Tests.Examples;

public sealed class StoreStartTests
{
    private const string Bench = """{"version":1,"name":"bench","texts":{"toy.volts":"14 V","fit.R1":"Acme|two words parallel 3","fit.R2":"Acme|gone"}}""";

    private static readonly ImmutableArray<(string, string)> Files = [("resistor", Resistors.File(Resistors.Row("two words"), Resistors.Row("B"))), ("valve", "x")];

    private static StoreStart Start(Shop shop) => new(
        shop.Get<IStoreMigrator>(), shop.Store, shop.Registry, new ExampleShelf([("bench", Bench)]), TimeProvider.System);

    [Fact]
    public async Task A_new_store_gets_the_catalogue_and_the_examples_with_their_parts()
    {
        using var shop = Shop.New();
        var report = await Start(shop).Prepare(Files, default);
        Assert.True(report.Seeded);
        Assert.Equal(2, report.Warnings.Length);
        Assert.Contains(report.Warnings, w => w.Contains("valve", StringComparison.Ordinal));
        Assert.Contains(report.Warnings, w => w.Contains("Acme|gone", StringComparison.Ordinal));
        var part = (await shop.Catalogue.Snapshot()).Of("resistor").Single(p => p.OrderingCode == "two words");
        var supply = (await shop.Supplies.Open(Assert.Single(await shop.Supplies.List()).Number))!;
        Assert.Equal(("bench", $"part {part.Id} parallel 3", ""), (supply.Name, supply.Fit("R1"), supply.Fit("R2")));
        Assert.Null((await shop.Assessments.Assess(supply)).Ledger.Fault);
    }

    [Fact]
    public async Task A_store_that_was_used_is_left_alone()
    {
        using var shop = await Shop.Open();
        await shop.Catalogue.Import("resistor", Resistors.File(Resistors.Row("own")));
        Assert.False((await Start(shop).Prepare(Files, default)).Seeded);
        Assert.Equal("own", Assert.Single((await shop.Catalogue.Snapshot()).Of("resistor")).OrderingCode);
        Assert.Empty(await shop.Supplies.List());
    }

    [Fact]
    public async Task Two_programs_that_start_on_an_empty_store_seed_it_once_twenty_times()
    {
        for (var round = 0; round < 20; round++)
        {
            using var one = Shop.New();
            using var other = one.Beside();
            using var together = new Barrier(2);
            var reports = await Task.WhenAll(new[] { one, other }.Select(shop => Task.Run(() =>
            {
                together.SignalAndWait();
                return Start(shop).Prepare(Files, default);
            })));
            Assert.Single(reports, r => r.Seeded);
            Assert.Single(await other.Supplies.List());
            Assert.Equal(2, (await one.Catalogue.Snapshot()).Of("resistor").Length);
        }
    }

    [Fact]
    public async Task What_the_program_carries_has_no_fault()
    {
        foreach (var (name, text) in Embedded.In("catalogue"))
        {
            Assert.Empty(PartCsv.Read(Standard.Registry.Family(name), text).Faults.Select(f => $"{name}: {f.Words}"));
        }

        using var shop = Shop.New();
        var standard = new StoreStart(shop.Get<IStoreMigrator>(), shop.Store, Standard.Registry, new ExampleShelf(), TimeProvider.System);
        Assert.Empty((await standard.Prepare()).Warnings);
        foreach (var example in new ExampleShelf().Examples)
        {
            var requirement = new Requirement(example.Texts.RemoveRange(example.Texts.Keys.Where(k => k.StartsWith("fit.", StringComparison.Ordinal))));
            Assert.All(requirement.Texts.Keys, k => Assert.Contains(Standard.Registry.Fields, f => f.Key == k));
            Assert.Empty(RequirementReader.Read(Standard.Registry, requirement).Faults.Select(f => f.Fault));
        }
    }

    [Theory]
    [InlineData("{}")]
    [InlineData("[]")]
    [InlineData("{\"version\":2,\"name\":\"x\",\"texts\":{}}")]
    [InlineData("not json")]
    public void An_example_that_cannot_be_read_is_named(string text) =>
        Assert.Contains("bench", Assert.Throws<InvalidDataException>(() => new ExampleShelf([("bench", text)])).Message, StringComparison.Ordinal);
}
