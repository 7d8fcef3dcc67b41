using Selector.Engine.Parts;
using Selector.Engine.Supplies;

namespace Selector.Engine.Ranking;

/// <summary>The fittings that a family's rules allow for a part.</summary>
public static class Arrangements
{
    /// <summary>One, then 2, 3, ... in each permitted arrangement.</summary>
    public static IEnumerable<Fitting> Of(Part part)
    {
        yield return new Fitting(part);
        foreach (var rule in part.Family.Arrangements)
        {
            for (var n = 2; n <= rule.Most; n++)
            {
                yield return new Fitting(part, rule.Kind, n);
            }
        }
    }
}
