using Selector.Application.Catalogue;
using Selector.Application.Tests.Support;
using Selector.Engine;
using Selector.Engine.Supplies;

namespace Selector.Application.Tests.Examples;

/// <summary>What ships must hold: the examples, and a copy with one weak part in which the ledger finds exactly that part.</summary>
public class ExampleTests
{
    private static readonly string[] Complete = ["fixture-5v", "bench-9v", "bench-3-18v", "instrument-12v"];

    public static TheoryData<string> Whole => [.. Complete];

    [Theory]
    [MemberData(nameof(Whole))]
    public void Every_row_of_an_example_holds(string name)
    {
        var ledger = ExampleDesigns.Assess(ExampleDesigns.Of(name));

        Assert.Null(ledger.Fault);
        Assert.All(ledger.Rows.Where(r => r.Verdict != Verdict.NotAssessed), r => Assert.True(r.Verdict is Verdict.Holds or Verdict.NoDemand, $"{r.Id} {r.Verdict} {r.Reason}"));
        Assert.All(ledger.Rows.Where(r => r.Stress is not null), r => Assert.True(double.IsFinite(r.Stress!.Value), r.Id));
        Assert.True(ledger.Counts.Hold > 50);
    }

    [Fact]
    public void The_one_weak_part_is_found_and_no_other()
    {
        var ledger = ExampleDesigns.Assess(ExampleDesigns.Of("bench-9v-weak"));

        var bad = ledger.Rows.Where(r => r.Verdict is not (Verdict.Holds or Verdict.NoDemand or Verdict.NotAssessed)).ToList();
        Assert.NotEmpty(bad);
        Assert.All(bad, r => Assert.Equal(("BR1", Verdict.Lacks), (r.Position, r.Verdict)));
    }

    [Fact]
    public void Every_example_is_tried() => Assert.Equal(Complete.Append("bench-9v-weak").Order(StringComparer.Ordinal), ExampleDesigns.Names.Order(StringComparer.Ordinal));

    [Fact]
    public void The_demo_catalogue_reads_without_a_fault_and_has_thirty_parts_of_every_family()
    {
        foreach (var family in Standard.Registry.Families)
        {
            var reading = PartCsv.Read(family, Embedded.In("catalogue").Single(c => c.Name == family.Id).Text);

            Assert.Empty(reading.Faults.Select(f => $"{family.Id}: {f.Words}"));
            Assert.True(reading.Parts.Length >= 30, $"{family.Id}: {reading.Parts.Length}");
            Assert.True(
                family.Ratings.Any(r => !r.Required && reading.Parts.Any(p => !p.Has(r.Key))), $"{family.Id} has no gap in its data");
        }
    }
}
