using System.Collections.Immutable;
using Selector.Engine.Derating;

namespace Selector.Application.Policies;

/// <summary>The policies that come with the program, in their first version.</summary>
public sealed class PolicyShelf
{
    private const string StandardId = "general-industrial";

    /// <exception cref="InvalidDataException">A policy file is wrong; names file, row and column.</exception>
    public PolicyShelf()
        : this(Embedded.In("policies"))
    {
    }

    internal PolicyShelf(IEnumerable<(string Name, string Text)> files)
    {
        Policies = [.. files.Select(f => Load(f.Name, f.Text))];
        Standard = Find(StandardId) ?? Policies.FirstOrDefault() ?? throw new InvalidDataException("There is no policy.");
    }

    /// <summary>In order of their ids.</summary>
    public ImmutableArray<Policy> Policies { get; }

    /// <summary>The one that a new supply is held against.</summary>
    public Policy Standard { get; }

    public Policy? Find(string id) => Policies.FirstOrDefault(p => p.Id == id);

    private static Policy Load(string id, string text)
    {
        var reading = PolicyCsv.Read(text);
        return reading.Faults.IsEmpty
            ? new Policy(id, Title(id), 1, Standing(reading.Clauses), reading.Clauses)
            : throw new InvalidDataException($"Policy {id}: " + string.Join(" ", reading.Faults.Take(10).Select(f => f.Words)));
    }

    private static string Title(string id) => char.ToUpperInvariant(id[0]) + id[1..].Replace('-', ' ');

    /// <summary>Said from the clauses themselves, so that it cannot claim more than they do.</summary>
    private static string Standing(ImmutableArray<Clause> clauses)
    {
        var seen = clauses.Count(c => c.Certainty == Certainty.SeenAtIssuer);
        return clauses.All(c => c.Certainty == Certainty.CommonPractice)
            ? "Common practice; no issued document stands behind these values."
            : $"{seen} of {clauses.Length} clauses were read in the issuer's own document.";
    }
}
