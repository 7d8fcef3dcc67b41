using System.Collections.Frozen;
using System.Collections.Immutable;
using Selector.Application.Catalogue;
using Selector.Application.Examples;
using Selector.Application.Policies;
using Selector.Application.Supplies;
using Selector.Engine;
using Selector.Engine.Circuits;
using Selector.Engine.Derating;
using Selector.Engine.Parts;
using Selector.Engine.Supplies;

namespace Selector.Application.Tests.Support;

/// <summary>The shipped examples with the demo catalogue, without a store.</summary>
internal static class ExampleDesigns
{
    public static CatalogueSnapshot Catalogue { get; } = Read();

    public static Policy Policy { get; } = new PolicyShelf().Standard;

    public static IEnumerable<string> Names => Embedded.In("examples").Select(e => e.Name);

    public static Design Of(string name)
    {
        var example = Example.Read(name, Embedded.In("examples").Single(e => e.Name == name).Text);
        var (texts, missing) = ExampleShelf.Resolve(example, Catalogue);
        Assert.Empty(missing);
        var reading = DesignReader.Read(new SupplyState(1, example.Name, texts, 1, DateTime.UnixEpoch, false, false), Catalogue, Standard.Registry);
        Assert.Empty(reading.Faults);
        return reading.Design;
    }

    public static Ledger Assess(Design design) => Assessor.Assess(Standard.Registry, design, Policy, Budget.Standard);

    private static CatalogueSnapshot Read()
    {
        var number = 0;
        return new CatalogueSnapshot(1, Standard.Registry.Families.ToFrozenDictionary(
            f => f.Id,
            f => PartCsv.Read(f, Embedded.In("catalogue").Single(c => c.Name == f.Id).Text).Parts.Select(p => p with { Id = ++number }).ToImmutableArray(),
            StringComparer.Ordinal));
    }
}
