using Selector.Engine.Circuits;
using Selector.Engine.Circuits.Mains;
using Selector.Engine.Circuits.Mains.Exponential;
using Selector.Reference.Support;

namespace Selector.Reference.Mains;

/// <summary>Rows of the rectifier table with exponential diodes (F1, shockley): computed with ngspice 39, diodes at 27 °C.</summary>
public class ExponentialTests
{
    private const double Tolerance = 5e-3;
    private const double ReferenceTemperature = 27;

    public static TheoryData<string> Rows => [.. CsvRows.Of("f1_rectifier.csv").Where(r => r["diode_model"] == "shockley").Select(r => r.Id)];

    [Theory]
    [MemberData(nameof(Rows))]
    public void Every_column_agrees(string id)
    {
        var row = CsvRows.Of("f1_rectifier.csv").Single(r => r.Id == id);
        var diode = new ExponentialDiode(row.Number("d_is_a"), row.Number("d_n"), row.Number("d_rs_ohm"), ReferenceTemperature);

        Assert.Equal(SolveStatus.Solved, ExponentialSolver.Solve(new ExponentialCase(RectifierTable.Case(row), diode, 2000), Budget.Standard, out var s));

        foreach (var (column, value) in RectifierTable.Columns(s))
        {
            var deviation = CsvRows.Deviation(value, row.Number(column), row.LargestOfUnit(column));
            Assert.True(deviation <= Tolerance, $"{id} {column}: {value:R} against {row[column]}, off by {deviation:E2}");
        }
    }

    // In the limit of a steep knee the exponential diode is a threshold and a slope.
    [Fact]
    public void A_steep_knee_comes_to_the_piecewise_linear_answer()
    {
        var circuit = new RectifierCase(RectifierArrangement.Bridge, 50, 18, 0.6, 0, 0.7, 0.05, 3300e-6, 0.05, LoadKind.Resistance, 25);
        var (emission, slope) = (0.5, 0.05);
        var thermal = new ExponentialDiode(1e-20, emission, slope, 27).ThermalVoltage;
        var diode = new ExponentialDiode(4 * Math.Exp(-0.7 / thermal), emission, slope, 27);

        Assert.Equal(SolveStatus.Solved, RectifierSolver.Solve(circuit, Budget.Standard, out var straight));
        Assert.Equal(SolveStatus.Solved, ExponentialSolver.Solve(new ExponentialCase(circuit, diode, double.PositiveInfinity), Budget.Standard, out var s));

        Assert.Equal(straight.BusMean, s.BusMean, 3e-3 * straight.BusMean);
        Assert.Equal(straight.SecondaryRms, s.SecondaryRms, 0.01 * straight.SecondaryRms);
    }

    // The law itself, both ways: the fitted diode passes through its points; hot it drops some 2 mV/K less (common practice, no source).
    [Fact]
    public void A_diode_passes_through_its_data_sheet_points_and_drops_less_when_hot()
    {
        var diode = ExponentialDiode.Through((0.75, 0.1), (0.95, 2), 0.02, 25)!.Value;

        Assert.Equal(0.75, diode.Voltage(0.1), 1e-3);
        Assert.Equal(0.95, diode.Voltage(2), 1e-3);
        Assert.InRange((diode.At(125).Voltage(0.1) - diode.Voltage(0.1)) / 100, -3e-3, -1e-3);
        Assert.Null(ExponentialDiode.Through((0.9, 0.1), (0.8, 2), 0.02, 25));
        Assert.Null(ExponentialDiode.Through((0.75, 0.1), (0.95, 2), 0.2, 25));
    }
}
