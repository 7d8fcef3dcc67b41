using System.Collections.Frozen;
using System.Collections.Immutable;
using Microsoft.EntityFrameworkCore;
using Selector.Application.Catalogue;
using Selector.Application.Examples;
using Selector.Application.Supplies;
using Selector.Engine.Parts;
using Selector.Engine.Supplies;
using Selector.Storage;
using Selector.Storage.Entities;

namespace Selector.Application;

/// <summary>What a start did to the store.</summary>
/// <param name="Seeded">The store was new and got the demo catalogue and the examples.</param>
/// <param name="Warnings">Demo content that was left out, and why; for the log.</param>
public sealed record StartReport(bool Seeded, ImmutableArray<string> Warnings);

/// <summary>
/// Makes the store ready: schema first, then, if nothing was ever put in, the demo catalogue and the examples, all in one
/// transaction. Several servers may start on one store at once: one of them does it, the others find it done.
/// </summary>
public sealed class StoreStart(IStoreMigrator migrator, StoreWork store, Registry registry, ExampleShelf examples, TimeProvider time)
{
    /// <summary>Who the log names for the examples.</summary>
    public const string By = "Selector";

    public Task<StartReport> Prepare(CancellationToken cancel = default) => Prepare(Embedded.In("catalogue"), cancel);

    internal async Task<StartReport> Prepare(ImmutableArray<(string Name, string Text)> catalogue, CancellationToken cancel)
    {
        // Reading the files needs no store: it runs beside the migration.
        var warnings = ImmutableArray.CreateBuilder<string>();
        var reading = Task.Run(() => Read(catalogue, warnings), cancel);
        await migrator.Migrate(cancel).ConfigureAwait(false);
        var files = await reading.ConfigureAwait(false);
        return await store.Write(
            async (context, token) =>
            {
                if (await context.CatalogueVersions.Select(v => v.Version).SingleAsync(token).ConfigureAwait(false) != 0)
                {
                    return new StartReport(false, []);
                }

                var missing = await Seed(context, files, token).ConfigureAwait(false);
                return new StartReport(true, [.. warnings, .. missing]);
            },
            cancel).ConfigureAwait(false);
    }

    private List<(FamilySpec Family, ImmutableArray<Part> Parts)> Read(
        ImmutableArray<(string Name, string Text)> catalogue, ImmutableArray<string>.Builder warnings)
    {
        var files = new List<(FamilySpec, ImmutableArray<Part>)>();
        foreach (var (name, text) in catalogue)
        {
            if (registry.FindFamily(name) is not { } family)
            {
                warnings.Add($"Demo catalogue {name}: there is no such family.");
                continue;
            }

            var reading = PartCsv.Read(family, text);
            warnings.AddRange(reading.Faults.Select(f => $"Demo catalogue {name}: {f.Words}"));
            files.Add((family, reading.Parts));
        }

        return files;
    }

    private async Task<List<string>> Seed(
        SelectorContext context, List<(FamilySpec Family, ImmutableArray<Part> Parts)> files, CancellationToken cancel)
    {
        var now = time.GetUtcNow().UtcDateTime;
        // A new store: numbers are given here, which saves asking it for each of them.
        var number = 0;
        var numbered = files.Select(f => (f.Family, Parts: f.Parts.Select(p => p with { Id = ++number }).ToImmutableArray())).ToList();
        context.ChangeTracker.AutoDetectChangesEnabled = false;
        context.Parts.AddRange(numbered.SelectMany(f => f.Parts).Select(Numbered));
        context.ChangeTracker.AutoDetectChangesEnabled = true;

        await new CatalogueWriter(context, now, cancel).Count().ConfigureAwait(false);
        await context.SaveChangesAsync(cancel).ConfigureAwait(false);

        var snapshot = new CatalogueSnapshot(1, numbered.ToFrozenDictionary(f => f.Family.Id, f => f.Parts, StringComparer.Ordinal));
        var missing = new List<string>();
        var editor = new SupplyEditor(context, registry, now, cancel);
        foreach (var example in examples.Examples)
        {
            var (texts, absent) = ExampleShelf.Resolve(example, snapshot);
            missing.AddRange(absent);
            await editor.Create(example.Name, texts, By).ConfigureAwait(false);
        }

        return missing;
    }

    private static PartRecord Numbered(Part part)
    {
        var row = PartRows.Row(part);
        row.Id = part.Id;
        return row;
    }
}
