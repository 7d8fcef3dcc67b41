using Selector.Engine.Circuits;
using Selector.Engine.Circuits.Mains;
using Selector.Reference.Support;

namespace Selector.Reference.Mains;

/// <summary>Every computed column of the rectifier tables (F1, F1x), piecewise-linear diodes: computed with ngspice 39.</summary>
public class RectifierTableTests
{
    private const double Tolerance = 5e-4;

    public static TheoryData<string, string> Rows
    {
        get
        {
            var data = new TheoryData<string, string>();
            foreach (var file in (string[])["f1_rectifier.csv", "f1x_cp_collapse.csv"])
            {
                foreach (var row in CsvRows.Of(file).Where(r => r["diode_model"] == "pwl"))
                {
                    data.Add(file, row.Id);
                }
            }

            return data;
        }
    }

    [Theory]
    [MemberData(nameof(Rows))]
    public void Every_column_agrees(string file, string id)
    {
        var row = CsvRows.Of(file).Single(r => r.Id == id);
        var status = RectifierSolver.Solve(RectifierTable.Case(row), Budget.Standard, out var solution);
        if (row.Has("collapses") && row["collapses"] == "1")
        {
            Assert.Equal(SolveStatus.NoOperatingPoint, status);
            return;
        }

        Assert.Equal(SolveStatus.Solved, status);
        foreach (var (column, value) in RectifierTable.Columns(solution).Where(c => row.Has(c.Column) && row[c.Column].Length > 0))
        {
            var deviation = CsvRows.Deviation(value, row.Number(column), row.LargestOfUnit(column));
            Assert.True(deviation <= Tolerance, $"{id} {column}: {value:R} against {row[column]}, off by {deviation:E2}");
        }
    }

    [Fact]
    public void A_neighbouring_start_does_not_change_the_answer()
    {
        foreach (var row in CsvRows.Of("f1_rectifier.csv").Where(r => r["diode_model"] == "pwl"))
        {
            var circuit = RectifierTable.Case(row);
            RectifierSolver.Solve(circuit, Budget.Standard, out var cold);
            RectifierSolver.Solve(circuit with { Load = circuit.Load * 1.02 }, Budget.Standard, out var neighbour);
            RectifierSolver.Solve(circuit, Budget.Standard, neighbour.Next, RectifierDetail.All, out var warm);

            Assert.Equal(cold.BusMean, warm.BusMean, 1e-6 * cold.BusMean);
            Assert.Equal(cold.CapacitorRms, warm.CapacitorRms, 1e-5 * cold.CapacitorRms);
        }
    }
}
