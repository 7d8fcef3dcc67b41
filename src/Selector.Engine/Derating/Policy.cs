using System.Collections.Immutable;

namespace Selector.Engine.Derating;

/// <summary>A derating policy: data, not code. A family or stress without a clause is not covered and never passes.</summary>
/// <param name="Id">Lower case, hyphens.</param>
/// <param name="Name">As printed.</param>
/// <param name="Version">Counts up with every change.</param>
/// <param name="Standing">What kind of document stands behind it, in a sentence.</param>
/// <param name="Clauses">In any order.</param>
public sealed record Policy(string Id, string Name, int Version, string Standing, ImmutableArray<Clause> Clauses)
{
    /// <summary>Name and version, as printed.</summary>
    public string Title => $"{Name} {Version}";

    /// <summary>The clause for a stress: one that names the technology before one that is for any; null when there is none.</summary>
    public Clause? Find(string family, string technology, string stress)
    {
        Clause? general = null;
        foreach (var clause in Clauses)
        {
            if (clause.Family != family || clause.Stress != stress)
            {
                continue;
            }

            if (clause.Technology == technology)
            {
                return clause;
            }

            if (clause.Technology.Length == 0)
            {
                general ??= clause;
            }
        }

        return general;
    }
}
