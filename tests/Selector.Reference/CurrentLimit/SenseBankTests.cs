using FsCheck;
using FsCheck.Xunit;
using Selector.Engine.Circuits;
using Selector.Engine.Circuits.CurrentLimit;
using Selector.Reference.StepDown;

namespace Selector.Reference.CurrentLimit;

/// <summary>The sense-resistor bank against its table (F7: exact arithmetic over all corners) and against enumeration.</summary>
public class SenseBankTests
{
    public static TheoryData<string> Ids => [.. CsvRows.Of("f7_sense_bank.csv").Select(row => row.Id)];

    [Theory]
    [MemberData(nameof(Ids))]
    public void EveryColumnAgrees(string id)
    {
        var row = CsvRows.Of("f7_sense_bank.csv").Single(r => r.Id == id);
        var (n, r, t) = ((int)row.Number("n_parallel"), row.Number("r_each_ohm"), row.Number("tol_frac"));
        SenseBankStress s;
        var status = row["drive"] == "current"
            ? SenseBank.AtCurrent(n, r, t, row.Number("i_total_a"), out s)
            : SenseBank.AtVoltage(n, r, t, row.Number("v_across_v"), out s);
        Assert.Equal(SolveStatus.Solved, status);
        Near(row, "p_one_nominal_w", s.OneNominalPower);
        Near(row, "p_one_worst_w", s.OneWorstPower);
        Near(row, "p_total_worst_w", s.TotalWorstPower);
        Near(row, "r_parallel_min_ohm", s.ParallelMinimum);
        Near(row, "r_parallel_max_ohm", s.ParallelMaximum);
        Near(row, "i_one_worst_a", s.OneWorstPowerCurrent);
        Near(row, "i_one_max_a", s.OneGreatestCurrent);
    }

    // Practice case 1, computed by hand: ten of 10 ohm and 5 % at 1 A; the worst has one low and nine high.
    [Fact]
    public void TenResistors()
    {
        SenseBank.AtCurrent(10, 10, 0.05, 1, out var s);
        Assert.Equal(0.11365, s.OneWorstPower, 5e-6);
        Assert.Equal(1.05, s.TotalWorstPower, 1e-12);
        Assert.Equal(0.1, s.OneNominalPower, 1e-12);
    }

    // Three resistors of 40 %: others in parallel are 0.7 R, above the low end, so neither end is the worst.
    [Fact]
    public void AWideToleranceHasItsWorstInside()
    {
        SenseBank.AtCurrent(3, 1, 0.4, 1, out var s);
        Assert.Equal(0.7 * 0.25, s.OneWorstPower, 1e-12);
        Assert.True(s.OneWorstPower > Power(0.6, 0.7) && s.OneWorstPower > Power(1.4, 0.7));

        static double Power(double r, double others) => r * Math.Pow(others / (r + others), 2);
    }

    [Property(MaxTest = 10_000)]
    public void NoCornerAndNoPointInsideExceedsIt(DoNotSize<ulong> seed)
    {
        var maker = new CaseMaker(seed.Item);
        var n = 1 + maker.Dice.Pick(5);
        var (r, t, i) = (maker.Dice.Log(1e-3, 1e3), maker.Dice.Even(0, 0.5), maker.Dice.Log(1e-3, 1e2));
        SenseBank.AtCurrent(n, r, t, i, out var s);
        SenseBank.AtVoltage(n, r, t, i, out var v);
        var (one, total, current, voltageOne, voltageTotal) = (0.0, 0.0, 0.0, 0.0, 0.0);
        for (var corner = 0; corner < 1 << n; corner++)
        {
            var conductance = 0.0;
            for (var k = 0; k < n; k++)
            {
                conductance += 1 / Value(corner, k);
            }

            var volts = i / conductance;
            total = Math.Max(total, i * volts);
            voltageTotal = Math.Max(voltageTotal, i * i * conductance);
            var first = Value(corner, 0);
            current = Math.Max(current, volts / first);
            voltageOne = Math.Max(voltageOne, i * i / first);
            // The first resistor anywhere inside its tolerance, the others in this corner.
            var others = conductance - 1 / first;
            foreach (var x in new[] { first, r * (1 + t * maker.Dice.Even(-1, 1)) })
            {
                one = Math.Max(one, Math.Pow(i / (1 + x * others), 2) * x);
            }
        }

        Assert.True(one <= s.OneWorstPower * (1 + 1e-12));
        Assert.Equal(total, s.TotalWorstPower, 1e-12 * total);
        Assert.Equal(current, s.OneGreatestCurrent, 1e-12 * current);
        Assert.Equal(voltageOne, v.OneWorstPower, 1e-12 * voltageOne);
        Assert.Equal(voltageTotal, v.TotalWorstPower, 1e-12 * voltageTotal);

        double Value(int corner, int k) => r * (1 + ((corner >> k & 1) == 0 ? -t : t));
    }

    [Theory]
    [InlineData(0, 1, 0.1, 1)]
    [InlineData(3, 0, 0.1, 1)]
    [InlineData(3, double.NaN, 0.1, 1)]
    [InlineData(3, 1e300, 0.1, 1)]
    [InlineData(3, 1, 1, 1)]
    [InlineData(3, 1, -0.1, 1)]
    [InlineData(3, 1, 0.1, double.NaN)]
    [InlineData(3, 1, 0.1, double.NegativeInfinity)]
    public void BadInput(int n, double r, double t, double drive)
    {
        Assert.Equal(SolveStatus.BadInput, SenseBank.AtCurrent(n, r, t, drive, out _));
        Assert.Equal(SolveStatus.BadInput, SenseBank.AtVoltage(n, r, t, drive, out _));
    }

    private static void Near(CsvRow row, string column, double value) =>
        Assert.True(CsvRows.Deviation(value, row.Number(column), 0) < 1e-8, $"{row.Id} {column}: {value:R}");
}
