using FsCheck.Xunit;
using Selector.Engine.Circuits;
using Selector.Engine.Circuits.Mains;
using Selector.Reference.Support;

namespace Selector.Reference.Mains;

public class RectifierProperties
{
    [Property(MaxTest = 10_000)]
    public void Charge_and_energy_balance(ulong seed)
    {
        var c = new RectifierMaker(seed).Case();
        if (RectifierSolver.Solve(c, Budget.Standard, out var s) != SolveStatus.Solved)
        {
            return;
        }

        var diodes = c.Arrangement == RectifierArrangement.Bridge ? 4 : c.Arrangement == RectifierArrangement.CentreTap ? 2 : 1;
        var charge = s.DiodeAverage * (c.Arrangement == RectifierArrangement.HalfWave ? 1 : 2);
        var losses = s.LoadPower + s.WindingLoss + diodes * s.DiodeLoss + s.EsrLoss;
        Assert.Equal(s.LoadMean, charge, 2e-4 * Math.Max(s.LoadMean, 1e-9));
        Assert.Equal(s.SourcePower, losses, 3e-4 * s.SourcePower);
    }

    [Property(MaxTest = 10_000)]
    public void Nothing_that_is_not_finite_comes_out_and_nothing_hangs(ulong seed)
    {
        var maker = new RectifierMaker(seed);
        var c = maker.Spoiled(maker.Case());
        var status = RectifierSolver.Solve(c, Budget.Standard, out var s);
        if (status == SolveStatus.Solved)
        {
            Assert.All(RectifierTable.Columns(s), column => Assert.True(double.IsFinite(column.Value), $"{column.Column} of {c}"));
        }
    }

    /// <summary>The properties pass over what has no solution; this says that it is the exception.</summary>
    [Fact]
    public void Most_of_the_made_cases_are_solved()
    {
        var solved = Enumerable.Range(0, 2_000).Count(seed =>
            RectifierSolver.Solve(new RectifierMaker((ulong)seed).Case(), Budget.Standard, out _) == SolveStatus.Solved);

        Assert.True(solved > 1_600, $"{solved} of 2000");
    }

    /// <summary>Directions that the ledger relies on: the bus rises with the source and falls with load and winding resistance.</summary>
    [Property(MaxTest = 10_000)]
    public void The_bus_follows_the_source_and_gives_way_to_load_and_resistance(ulong seed)
    {
        var c = new RectifierMaker(seed).Case();
        if (RectifierSolver.Solve(c, Budget.Standard, out var s) != SolveStatus.Solved)
        {
            return;
        }

        Assert.True(Bus(c with { SecondaryRms = c.SecondaryRms * 1.05 }) > s.BusMean, c.ToString());
        var more = c.LoadKind == LoadKind.Resistance ? c.Load / 1.05 : c.Load * 1.05;
        Assert.True(Bus(c with { Load = more }) < s.BusMean, c.ToString());
        Assert.True(Bus(c with { WindingResistance = c.WindingResistance * 1.05 + 1e-3 * c.SecondaryRms }) < s.BusMean, c.ToString());
    }

    private static double Bus(RectifierCase c) =>
        RectifierSolver.Solve(c, Budget.Standard, out var s) == SolveStatus.Solved ? s.BusMean : 0;
}
