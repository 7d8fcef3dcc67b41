using Selector.Documents.Model;
using Selector.Documents.Sheets;
using Selector.Documents.Tests.Support;

namespace Selector.Documents.Tests;

/// <summary>What purchasing is told, held against sums done by hand.</summary>
public class BillOfMaterialsTests
{
    private static readonly Report Bill = BillOfMaterials.Build(SampleLedger.Input);
    private static readonly Table ByPosition = Bill.Tables.Single(t => t.Name == "bill-of-materials");
    private static readonly Table Order = Bill.Tables.Single(t => t.Name == "order");

    [Fact]
    public void The_reservoir_is_ordered_with_spares_and_its_least_ratings_are_named() => Assert.Equal(
        ["C1", "1", "Arden LE4-472-35", "C-0220", "electrolytic capacitor, 4700\u202fµF, 35\u202fV, aluminium electrolytic",
         "ripple current, weighted \u2265\u202f1.60\u202fA\nvoltage \u2265\u202f34.3\u202fV", "", "25", "26", "1.26\u00a0EUR", "32.76\u00a0EUR", "2026-02-11"],
        Texts(Position("C1")));

    [Fact]
    public void A_part_in_two_places_is_ordered_once_and_at_the_price_of_the_whole_quantity()
    {
        // Four in the bridge and one to catch, 25 supplies, 4 % spares: 130, which reaches the price from 100 upwards.
        Assert.Equal(["125", "130"], Cells(OrderOf("Tamsel R3-200-TR/AMMO"), Order, "needed", "order"));
        Assert.Equal(["0.0775\u00a0EUR", "10.0750\u00a0EUR"], Cells(OrderOf("Tamsel R3-200-TR/AMMO"), Order, "unit-price", "extended"));
        Assert.Equal(["130", "10.0750\u00a0EUR"], Cells(Position("D1-D4"), ByPosition, "order", "extended"));
        Assert.Equal("for D1-D4, D5; least 50, in 10s", Position("D1-D4").Cells[8].Note);
        Assert.Equal(["with D1-D4", "\u2013"], Cells(Position("D5"), ByPosition, "order", "extended"));
    }

    [Fact]
    public void Fitting_in_parallel_counts_every_piece()
    {
        Assert.Equal(["6", "150"], Cells(Position("R4"), ByPosition, "quantity", "needed"));
        Assert.Equal("6 in parallel", Position("R4").Cells[4].Note);
    }

    [Fact]
    public void Only_the_safety_critical_part_bears_the_mark() => Assert.Equal(
        ["T1"], ByPosition.Rows.Where(r => r.Cells[6].Text == "no substitution").Select(r => r.Cells[0].Text));

    [Fact]
    public void An_empty_position_is_to_be_chosen_with_its_least_ratings() => Assert.Equal(
        ["C3", "1", "to be chosen", "", "electrolytic capacitor", "voltage \u2265\u202f34.3\u202fV\nripple current \u2265\u202f939\u202fmA", "", "25", "\u2013", "\u2013", "\u2013", "\u2013"],
        Texts(Position("C3")));

    [Fact]
    public void An_unknown_price_is_said_and_left_out_of_the_sum()
    {
        Assert.Equal("price unknown", Position("L1").Cells[9].Text);
        // 306.80 + 10.0750 + 32.76 + 22.36 + 6.8250 EUR and 55.90 USD.
        Assert.Equal(["378.82\u00a0EUR", "55.90\u00a0USD", "14.57\u00a0EUR", "2.15\u00a0USD"], ByPosition.Rows.Where(r => r.IsTotal).Select(r => r.Cells[10].Text));
        Assert.Contains("without 1 line whose price is unknown", ByPosition.Rows.First(r => r.IsTotal).Cells[5].Text, StringComparison.Ordinal);
        Assert.Contains(Bill.Sections[0].Blocks.OfType<CountStrip>().Last().Items, i => i is { Value: "1", Words: "price unknown" });
    }

    [Fact]
    public void Order_and_bill_come_to_the_same_sum() => Assert.Equal(
        Order.Rows.Where(r => r.IsTotal).Select(r => r.Cells[9].Text),
        ByPosition.Rows.Where(r => r.IsTotal).Take(2).Select(r => r.Cells[10].Text));

    [Fact]
    public void Without_a_usable_number_of_supplies_one_is_counted_and_said()
    {
        var bill = BillOfMaterials.Build(SampleLedger.Input with { Requirement = SampleRequirement.With("build.units", "many") });

        Assert.Equal("1", bill.Tables.First().Rows[0].Cells[7].Text);
        Assert.Contains("one is counted", bill.Sections[0].Blocks.OfType<CountStrip>().Last().Summary, StringComparison.Ordinal);
    }

    private static Row Position(string id) => ByPosition.Rows.Single(r => r.Cells[0].Text == id);

    private static Row OrderOf(string name) => Order.Rows.Single(r => r.Cells[1].Text == name);

    private static IEnumerable<string> Texts(Row row) => row.Cells.Select(c => c.Text);

    private static IEnumerable<string> Cells(Row row, Table table, params string[] keys) =>
        keys.Select(k => row.Cells[table.Columns.ToList().FindIndex(c => c.Key == k)].Text);
}
