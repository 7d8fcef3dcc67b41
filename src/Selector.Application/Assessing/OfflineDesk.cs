using System.Collections.Frozen;
using System.Collections.Immutable;
using Selector.Application.Catalogue;
using Selector.Application.Examples;
using Selector.Application.Policies;
using Selector.Application.Supplies;
using Selector.Engine.Circuits;
using Selector.Engine.Parts;
using Selector.Engine.Supplies;

namespace Selector.Application.Assessing;

/// <summary>An assessment of a supply in a file.</summary>
/// <param name="Name">Of the supply.</param>
/// <param name="Ledger">Every stress at its worst corner; has a fault when nothing could be solved.</param>
/// <param name="Faults">Parts that the catalogue does not have, and catalogue rows that could not be read.</param>
public sealed record OfflineAssessment(string Name, Ledger Ledger, ImmutableArray<string> Faults);

/// <summary>Assesses a supply that stands in a file, with a catalogue of files, without any store.</summary>
public sealed class OfflineDesk(Registry registry)
{
    /// <summary>
    /// Assesses {"version":1,"name":..,"texts":{field:text}}, in which a fitting names its part "maker|ordering code", then perhaps
    /// "parallel 4".
    /// </summary>
    /// <param name="supply">The file's text.</param>
    /// <param name="catalogue">Catalogue files by family and text; empty for the demo catalogue.</param>
    /// <param name="budget">Bound on work.</param>
    /// <exception cref="InvalidDataException">The file is no supply, or names a policy that there is not; the message may be shown.</exception>
    public OfflineAssessment Assess(string supply, IReadOnlyList<(string Family, string Text)> catalogue, in Budget budget)
    {
        var example = Example.Read("supply", supply);
        var faults = ImmutableArray.CreateBuilder<string>();
        var snapshot = Snapshot(catalogue.Count > 0 ? catalogue : Embedded.In("catalogue"), faults);
        var (texts, missing) = ExampleShelf.Resolve(example, snapshot);
        faults.AddRange(missing);
        var state = new SupplyState(1, example.Name, texts, 1, DateTime.UnixEpoch, false, false);
        var reading = DesignReader.Read(state, snapshot, registry);
        faults.AddRange(reading.Faults);
        var policies = new PolicyShelf();
        var wanted = texts.GetValueOrDefault(SupplyFields.Policy, "");
        var policy = wanted.Length == 0 ? policies.Standard : policies.Find(wanted)
            ?? throw new InvalidDataException($"There is no policy \u201c{PlainText.Short(wanted)}\u201d. Write one of {PartCheck.Listed([.. policies.Policies.Select(p => p.Id)])}.");
        return new OfflineAssessment(example.Name, Assessor.Assess(registry, reading.Design, policy, budget), faults.ToImmutable());
    }

    private CatalogueSnapshot Snapshot(IEnumerable<(string Family, string Text)> files, ImmutableArray<string>.Builder faults)
    {
        var number = 0;
        var families = new Dictionary<string, ImmutableArray<Part>>(StringComparer.Ordinal);
        foreach (var (name, text) in files)
        {
            if (registry.FindFamily(name) is not { } family)
            {
                faults.Add($"{name}: there is no such family.");
                continue;
            }

            var reading = PartCsv.Read(family, text);
            faults.AddRange(reading.Faults.Select(f => $"{name}: {f.Words}"));
            families[name] = [.. reading.Parts.Select(p => p with { Id = ++number })];
        }

        return new CatalogueSnapshot(1, families.ToFrozenDictionary(StringComparer.Ordinal));
    }
}
