using Selector.Application.Assessing;
using Selector.Application.Supplies;
using Selector.Application.Tests.Support;
using Selector.Engine.Ranking;
using Selector.Engine.Supplies;

namespace Selector.Application.Tests.Assessing;

public sealed class AssessmentDeskTests
{
    private static async Task<Shop> Stocked(SelectorOptions? options = null)
    {
        var shop = await Shop.Open(options);
        await shop.Catalogue.Import("resistor", Resistors.Rated(
            Resistors.Row("half", watts: "0.5"), Resistors.Row("two", watts: "2", price: "1:0.20"), Resistors.Row("tenth", watts: "0.1")));
        return shop;
    }

    private static async Task<string> Fit(Shop shop, string code) =>
        FittingText.Format(new Fitting((await shop.Catalogue.Snapshot()).Of("resistor").Single(p => p.OrderingCode == code)));

    [Fact]
    public async Task A_supply_is_solved_and_held_against_the_policy()
    {
        using var shop = await Stocked();
        var supply = await shop.Supply((ToyStage.Volts, "20 V"), ("fit.R1", await Fit(shop, "two")));
        var assessment = await shop.Assessments.Assess(supply);
        Assert.Null(assessment.Ledger.Fault);
        Assert.Empty(assessment.Faults);
        var row = Assert.Single(assessment.Ledger.Rows);
        Assert.Equal(20.0 * 20 / 1000, row.Stress!.Value, 1e-12);
        Assert.Equal(Verdict.Holds, row.Verdict);
        Assert.Equal("General industrial 1", assessment.Ledger.Policy);
        Assert.True(assessment.Took > TimeSpan.Zero);
        Assert.Equal((await shop.Catalogue.Snapshot()).Version, assessment.CatalogueVersion);
    }

    [Fact]
    public async Task What_was_typed_wrong_is_said_and_nothing_is_solved()
    {
        using var shop = await Stocked();
        var assessment = await shop.Assessments.Assess(await shop.Supply((ToyStage.Volts, "1000 V")));
        Assert.Contains("Volts", assessment.Ledger.Fault, StringComparison.Ordinal);
        Assert.Single(assessment.Requirement.Faults);
    }

    [Fact]
    public async Task A_part_that_is_gone_a_part_of_another_family_and_an_unknown_policy_are_faults_in_words()
    {
        using var shop = await Stocked();
        await shop.Catalogue.Import("inductor", "maker,ordering_code,inductance_henry\nAcme,L,10u\n");
        var gone = await shop.Assessments.Assess(await shop.Supply(("fit.R1", "part 99"), ("policy", "none")));
        Assert.Equal(2, gone.Faults.Length);
        Assert.Contains(gone.Faults, f => f.StartsWith("R1: ", StringComparison.Ordinal) && f.Contains("no longer", StringComparison.Ordinal));
        Assert.Contains(gone.Faults, f => f.Contains("no policy", StringComparison.Ordinal));
        Assert.Null(gone.Ledger.Positions.Single().Fitting);
        var coil = Assert.Single((await shop.Catalogue.Snapshot()).Of("inductor"));
        var wrong = await shop.Assessments.Assess(await shop.Supply(("fit.R1", $"part {coil.Id}")));
        Assert.Contains("takes a fixed resistor", Assert.Single(wrong.Faults), StringComparison.Ordinal);
    }

    [Fact]
    public async Task Parts_are_ranked_by_what_holds_and_price()
    {
        using var shop = await Stocked();
        var ranking = await shop.Assessments.Rank(await shop.Supply((ToyStage.Volts, "14 V")), ToyStage.Position);
        var single = ranking.Candidates.Where(c => c.Fitting.Count == 1).ToList();
        Assert.Equal(["half", "two", "tenth"], single.Select(c => c.Part.OrderingCode));
        Assert.Equal([Standing.Holds, Standing.Holds, Standing.Lacks], single.Select(c => c.Standing));
    }

    [Fact]
    public async Task Ranking_a_position_that_is_not_there_says_so()
    {
        using var shop = await Stocked();
        var supply = await shop.Supply();
        Assert.Contains("X9", (await Assert.ThrowsAsync<ArgumentException>(() => shop.Assessments.Rank(supply, "X9"))).Message, StringComparison.Ordinal);
    }

    [Fact]
    public async Task A_solve_that_takes_too_long_ends_with_a_fault_and_frees_its_place()
    {
        using var shop = await Stocked(new SelectorOptions { SolveLimit = TimeSpan.FromSeconds(0.2), Solvers = 1 });
        var supply = await shop.Supply();
        shop.Stage.OnSolve = token => token.WaitHandle.WaitOne();
        Assert.Contains("Not solved within 0.2 s", (await shop.Assessments.Assess(supply)).Ledger.Fault, StringComparison.Ordinal);
        await Assert.ThrowsAsync<TimeoutException>(() => shop.Assessments.Rank(supply, ToyStage.Position));
        shop.Stage.OnSolve = null;
        Assert.Null((await shop.Assessments.Assess(supply)).Ledger.Fault);
    }

    [Fact]
    public async Task A_caller_who_leaves_is_not_kept()
    {
        using var shop = await Stocked(new SelectorOptions { Solvers = 1 });
        var supply = await shop.Supply();
        using var leave = new CancellationTokenSource();
        shop.Stage.OnSolve = token =>
        {
            leave.Cancel();
            token.WaitHandle.WaitOne();
        };
        await Assert.ThrowsAnyAsync<OperationCanceledException>(() => shop.Assessments.Assess(supply, leave.Token));
    }

    [Fact]
    public async Task No_more_solves_run_at_once_than_there_are_places_and_too_many_are_turned_away()
    {
        using var shop = await Stocked(new SelectorOptions { Solvers = 2, MostWaiting = 3 });
        var supply = await shop.Supply();
        using var gate = new ManualResetEventSlim();
        var (inside, most) = (0, 0);
        var queue = shop.Get<SolveQueue>();
        var tasks = Enumerable.Range(0, 5).Select(_ => queue.Run(
            token =>
            {
                var now = Interlocked.Increment(ref inside);
                InterlockedMax(ref most, now);
                gate.Wait(token);
                return Interlocked.Decrement(ref inside);
            },
            default)).ToList();
        await Assert.ThrowsAsync<SolverBusyException>(() => shop.Assessments.Assess(supply));
        gate.Set();
        await Task.WhenAll(tasks);
        Assert.InRange(most, 1, 2);
        Assert.Null((await shop.Assessments.Assess(supply)).Ledger.Fault);

        static void InterlockedMax(ref int place, int value)
        {
            for (var seen = place; seen < value && Interlocked.CompareExchange(ref place, value, seen) != seen; seen = place)
            {
            }
        }
    }

    [Fact]
    public void Options_out_of_range_are_named_all_at_once()
    {
        var e = Assert.Throws<ArgumentException>(() => new SelectorOptions { SolveLimit = TimeSpan.Zero, Solvers = 0 }.Checked());
        Assert.Contains("SolveLimit", e.Message, StringComparison.Ordinal);
        Assert.Contains("Solvers", e.Message, StringComparison.Ordinal);
    }
}
