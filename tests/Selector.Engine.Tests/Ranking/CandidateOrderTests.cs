using Selector.Engine.Circuits;
using Selector.Engine.Parts;
using Selector.Engine.Parts.Families;
using Selector.Engine.Ranking;
using Selector.Engine.Supplies;
using Selector.Engine.Tests.Support;

namespace Selector.Engine.Tests.Ranking;

public class CandidateOrderTests
{
    private static readonly SupplyModel Model = SupplyModel.Build(
        Standard.Registry, RequirementReader.Read(Standard.Registry, Requirement.Empty.With(CommonFields.LoadFull, "1 A")));

    // Computed by hand: both keep the least margin of 0, so the price decides and not the point of margin.
    [Fact]
    public void Among_those_that_hold_the_cheaper_ranks_first_though_its_margin_is_smaller()
    {
        var tight = Reservoir("TIGHT", 45).Priced(6_000);
        var wide = Reservoir("WIDE", 46).Priced(24_000);

        var ranking = Rank("C1", wide, tight);

        Assert.Equal(["TIGHT", "WIDE"], ranking.Candidates.Select(c => c.Part.OrderingCode));
        Assert.All(ranking.Candidates, c => Assert.Equal(Standing.Holds, c.Standing));
        Assert.True(ranking.Candidates[0].LeastMargin < ranking.Candidates[1].LeastMargin);
    }

    [Fact]
    public void Equal_price_goes_by_stock_and_then_by_part_number()
    {
        var ranking = Rank("C1",
            Reservoir("B", 50).Priced(5_000, 10), Reservoir("A", 50).Priced(5_000, 10), Reservoir("Z", 50).Priced(5_000, 99));

        Assert.Equal(["Z", "A", "B"], ranking.Candidates.Select(c => c.Part.OrderingCode));
    }

    [Fact]
    public void What_lacks_comes_after_what_holds_and_says_the_stress_and_by_how_much()
    {
        var ranking = Rank("C1", Reservoir("LOW", 25).Priced(100), Reservoir("OK", 50).Priced(50_000));

        Assert.Equal(["OK", "LOW"], ranking.Candidates.Select(c => c.Part.OrderingCode));
        // 28 V against 0.8 x 25 V: 1 - 28/20 = -40 %.
        Assert.Equal("voltage, ripple peak included lacks 40.0 %", ranking.Candidates[1].Reason);
    }

    [Fact]
    public void A_part_without_a_needed_rating_is_named_as_not_rated_with_what_it_needs()
    {
        var ranking = Rank("C1", Reservoir("BLANK", 50).With(CapacitorFamily.Ripple, double.NaN).Priced(100), Reservoir("OK", 50));

        Assert.Equal(Standing.NotRated, ranking.Candidates[1].Standing);
        Assert.StartsWith("not rated: ripple current, weighted needs ripple current", ranking.Candidates[1].Reason);
    }

    [Fact]
    public void Ranking_gives_the_same_margins_as_fitting_the_part()
    {
        var parts = new[] { Reservoir("A", 40), Reservoir("B", 63).With(CapacitorFamily.Ripple, 0.7) };

        var ranking = Rank("C1", parts);

        Assert.All(ranking.Candidates, candidate =>
        {
            var fitted = Assessor.Assess(Model, DemoParts.Fitted(Requirement.Empty).Fit("C1", candidate.Fitting).Fittings, TestPolicy.Industrial, Budget.Standard);
            var alone = fitted.Positions.Single(p => p.Spec.Id == "C1").Rows.Where(r => r.Margin is not null).ToList();
            var ranked = candidate.Own.Where(r => r.Margin is not null).ToList();
            Assert.Equal(alone.Select(r => r.Id), ranked.Select(r => r.Id));

            // Loops among stages are closed to 1e-6, from wherever the search came.
            Assert.All(alone.Zip(ranked), pair => Assert.Equal(pair.First.Margin!.Value, pair.Second.Margin!.Value, 4e-6));
        });
    }

    [Fact]
    public void A_resistor_is_tried_alone_and_in_every_parallel_arrangement_of_its_family()
    {
        var model = SupplyModel.Build(Standard.Registry, RequirementReader.Read(Standard.Registry,
            Requirement.Empty.With("sense", "bank").With("sense.resistance", "0.1 ohm").With("output.ripple", "200 mV")));

        var ranking = Engine.Ranking.Ranker.Rank(
            model, DemoParts.Fitted(Requirement.Empty).Fittings, "R4", [DemoParts.Sense], TestPolicy.Industrial, CancellationToken.None);

        Assert.Equal(10, ranking.Candidates.Length);
        var best = ranking.Candidates[0];
        Assert.True((Standing.Holds, 10) == (best.Standing, best.Fitting.Count), best.Reason);
    }

    [Fact]
    public void A_cancelled_ranking_stops()
    {
        using var cancel = new CancellationTokenSource();
        cancel.Cancel();

        Assert.ThrowsAny<OperationCanceledException>(() => Engine.Ranking.Ranker.Rank(
            Model, DemoParts.Fitted(Requirement.Empty).Fittings, "C1", [Reservoir("A", 50)], TestPolicy.Industrial, cancel.Token));
    }

    private static Part Reservoir(string code, double volts) =>
        (DemoParts.Reservoir with { OrderingCode = code }).With(CapacitorFamily.Voltage, volts);

    /// <summary>The parts one by one; pairs in parallel are tried elsewhere.</summary>
    private static Engine.Ranking.Ranking Rank(string position, params Part[] parts)
    {
        var ranking = Engine.Ranking.Ranker.Rank(
            Model, DemoParts.Fitted(Requirement.Empty).Fittings, position, parts, TestPolicy.Industrial, CancellationToken.None);
        return ranking with { Candidates = [.. ranking.Candidates.Where(c => c.Fitting.Count == 1)] };
    }
}
