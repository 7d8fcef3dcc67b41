using Selector.Engine.Circuits;
using Selector.Engine.Parts;
using Selector.Engine.Parts.Families;
using Selector.Engine.Ranking;
using Selector.Engine.Supplies;
using Selector.Engine.Tests.Support;

namespace Selector.Engine.Tests.Ranking;

/// <summary>
/// The ranking screens and searches only what decides. Here every part is fitted and the whole supply assessed, without either:
/// who holds must be the same, and so must the margins.
/// </summary>
public class WholeAgainstScreenedTests
{
    [Theory]
    [InlineData("dc", "C1", 1)]
    [InlineData("dc", "D5", 2)]
    [InlineData("dc", "L1", 3)]
    [InlineData("dc", "U1", 4)]
    [InlineData("mains", "C1", 5)]
    [InlineData("mains", "T1", 6)]
    public void Every_part_gets_the_standing_that_the_whole_assessment_gives_it(string source, string position, int seed)
    {
        var requirement = Requirement.Empty.With("source", source).With(CommonFields.OutputVoltage, "5 V").With(CommonFields.OutputRipple, "0.2")
            .With("short.held", source == "dc" ? "held" : "none");
        var model = SupplyModel.Build(Standard.Registry, RequirementReader.Read(Standard.Registry, requirement));
        var fittings = DemoParts.Fitted(requirement).Fittings;
        var parts = Variants(fittings[position].Part, new CounterRandom((ulong)seed), 40).ToList();

        var ranking = Engine.Ranking.Ranker.Rank(model, fittings, position, parts, TestPolicy.Industrial, default);

        var holding = 0;
        foreach (var candidate in ranking.Candidates)
        {
            var whole = Assessor.Assess(model, fittings.SetItem(position, candidate.Fitting), TestPolicy.Industrial, Budget.Standard);
            var own = whole.Positions.Single(p => p.Spec.Id == position);
            var usable = own.Rows.All(r => r.Verdict != Verdict.NotUsable);
            var margin = own.Limiting?.Margin;
            holding += candidate.Standing == Standing.Holds ? 1 : 0;
            if (candidate.Standing == Standing.Holds)
            {
                Assert.True(usable && margin >= -1e-4, $"{candidate.Part.OrderingCode} {margin}");
            }

            if (candidate.Limiting?.Margin is { } ranked && usable)
            {
                Assert.Equal(margin!.Value, ranked, 1e-4 * Math.Max(1, Math.Abs(ranked)));
            }

            if (candidate.MarginAtMost is { } most && usable)
            {
                Assert.True(margin <= most + 1e-4 * Math.Max(1, Math.Abs(most)), $"{candidate.Part.OrderingCode} {margin} above {most}");
            }

            if (candidate.Elsewhere?.Margin is { } elsewhere)
            {
                var row = whole.Rows.Single(r => r.Id == candidate.Elsewhere.Id);
                if (row.Margin is { } worst)
                {
                    Assert.Equal(worst, elsewhere, 1e-3 * Math.Max(1, Math.Abs(worst)));
                }
                else
                {
                    // A supply that runs away somewhere with this part may have no solution at that row's own corner; it must not hold.
                    Assert.True(candidate.Standing != Standing.Holds, $"{candidate.Part.OrderingCode}: {row.Id} {row.Verdict} {row.Reason}, ranked {elsewhere}");
                }
            }
        }

        Assert.True(holding >= 1 && holding < ranking.Candidates.Length, $"{holding} hold: " + string.Join("; ", ranking.Candidates.Take(5).Select(c => c.Reason)));
    }

    /// <summary>The part with every rating varied, so that some hold and some do not.</summary>
    private static IEnumerable<Part> Variants(Part part, CounterRandom random, int count)
    {
        for (var i = 0; i < count; i++)
        {
            var varied = part with { OrderingCode = $"V{i:00}" };
            foreach (var rating in part.Family.Ratings.Where(r => !r.IsChoice && part.Has(r.Key) && r.Key is not (TransformerFamily.Primary or TransformerFamily.Halves)))
            {
                varied = varied.With(rating.Key, part[rating.Key] * random.Between(0.6, 1.6));
            }

            yield return varied;
        }
    }
}
