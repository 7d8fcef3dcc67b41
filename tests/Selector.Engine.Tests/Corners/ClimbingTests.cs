using Selector.Engine.Circuits;
using Selector.Engine.Corners;
using Selector.Engine.Supplies;
using Selector.Engine.Tests.Support;
using Xunit.Abstractions;

namespace Selector.Engine.Tests.Corners;

/// <summary>
/// Climbs, from random points inside the box of all conditions, towards worse: nothing that it finds may be worse than the
/// stated corner by more than one part in ten thousand.
/// </summary>
public class ClimbingTests(ITestOutputHelper output)
{
    private const double Allowed = 1e-4;
    private const int Starts = 3;

    /// <summary>Severity, the share of what is allowed, below which a stress decides nothing: there 1e-4 of this is the bound.</summary>
    private const double Slight = 0.05;

    public static TheoryData<int> Seeds()
    {
        var data = new TheoryData<int>();
        var count = int.TryParse(Environment.GetEnvironmentVariable("SELECTOR_CLIMBS"), out var n) ? n : 6;
        for (var seed = 1; seed <= count; seed++)
        {
            data.Add(seed);
        }

        return data;
    }

    [Theory]
    [MemberData(nameof(Seeds))]
    public void Nothing_is_worse_than_the_stated_corner(int seed)
    {
        output.WriteLine($"seed {seed}");
        var random = new CounterRandom((ulong)seed);
        var requirement = RandomSupply.Requirement(random);
        var design = RandomSupply.Parts(DemoParts.Fitted(requirement), random);
        var values = RequirementReader.Read(Standard.Registry, requirement);
        Assert.Empty(values.Faults.Select(f => f.Fault));
        var model = SupplyModel.Build(Standard.Registry, values);
        var pool = new ConditionPool(model, new SupplySolver(model, design.Fittings), Budget.Standard);
        Severity[] severities =
        [
            .. model.Stresses.Select((s, i) => new Severity(model, i, design.Fittings.GetValueOrDefault(s.Spec.Position), TestPolicy.Industrial)),
        ];
        var worst = new CornerSearch(model, pool).Worst(severities, out var failed);

        for (var s = 0; s < severities.Length; s++)
        {
            if (worst[s] is not { } stated || failed[s] is not null)
            {
                continue;
            }

            for (var start = 0; start < Starts; start++)
            {
                var found = Climb(model, pool, severities[s], random);
                var (limit, value) = (severities[s].Of(stated), found is null ? double.NegativeInfinity : severities[s].Of(found));
                Assert.True(
                    double.IsInfinity(limit) || value <= limit + Allowed * Math.Max(Math.Abs(limit), Slight),
                    $"seed {seed}: {model.Stresses[s].Spec.Id} {value:R} exceeds {limit:R} at {Say(model, found!)} stated {Say(model, stated)}");
            }
        }

        output.WriteLine($"{pool.Count} conditions");
    }

    /// <summary>Random start, then each axis in turn to whichever of some points is worst, with shrinking steps.</summary>
    private static Condition? Climb(SupplyModel model, ConditionPool pool, Severity severity, CounterRandom random)
    {
        double[] axes = [.. model.Axes.Select(a => a.EndsOnly ? (random.Next() < 0.5 ? a.Range.Low : a.Range.High) : a.Range.At(random.Next()))];
        var best = pool.At(axes);
        for (var step = 0.5; step > 0.02; step /= 2)
        {
            for (var a = 0; a < axes.Length; a++)
            {
                foreach (var move in (ReadOnlySpan<double>)[-step, step])
                {
                    var range = model.Axes[a].Range;
                    var moved = (double[])best.Axes.Clone();
                    moved[a] = model.Axes[a].EndsOnly
                        ? (move < 0 ? range.Low : range.High)
                        : Math.Clamp(moved[a] + move * range.Width, range.Low, range.High);
                    var tried = pool.At(moved);
                    if (tried.Solved && (!best.Solved || severity.Of(tried) > severity.Of(best)))
                    {
                        best = tried;
                    }
                }
            }
        }

        return best.Solved ? best : null;
    }

    private static string Say(SupplyModel model, Condition at) =>
        string.Join(", ", model.Axes.Select((a, i) => FormattableString.Invariant($"{a.Id}={at.Axes[i]:G6}")));
}
