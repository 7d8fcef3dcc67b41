using System.Collections.Frozen;
using System.Collections.Immutable;
using Microsoft.EntityFrameworkCore;
using Selector.Engine.Parts;
using Selector.Engine.Supplies;
using Selector.Storage;

namespace Selector.Application.Catalogue;

/// <summary>What people do with the shared catalogue.</summary>
public sealed class CatalogueDesk(StoreWork store, Registry registry, SelectorOptions options, TimeProvider time)
{
    private readonly SemaphoreSlim _building = new(1);
    private volatile CatalogueSnapshot? _latest;

    /// <summary>The catalogue as it is now. Built once per version and shared; asking costs one small query.</summary>
    public async ValueTask<CatalogueSnapshot> Snapshot(CancellationToken cancel = default)
    {
        var context = await store.Open(cancel).ConfigureAwait(false);
        await using (context.ConfigureAwait(false))
        {
            var version = await Version(context, cancel).ConfigureAwait(false);
            if (_latest is { } latest && latest.Version == version)
            {
                return latest;
            }

            await _building.WaitAsync(cancel).ConfigureAwait(false);
            try
            {
                return await Build(context, cancel).ConfigureAwait(false);
            }
            finally
            {
                _building.Release();
            }
        }
    }

    /// <summary>Takes in a file of one family, all of it or nothing.</summary>
    /// <param name="family">Id of the family.</param>
    /// <param name="text">The file.</param>
    /// <param name="dryRun">Only say what would be done.</param>
    /// <param name="cancel">Stops before anything is written.</param>
    public async Task<ImportReport> Import(string family, string text, bool dryRun = false, CancellationToken cancel = default)
    {
        ArgumentNullException.ThrowIfNull(text);
        if (registry.FindFamily(family) is not { } spec)
        {
            return Refuse(family, new RowFault(1, "", "There is no such family.", $"Known are {string.Join(", ", registry.Families.Select(f => f.Id))}."));
        }

        if (text.Length > options.LongestImport)
        {
            return Refuse(family, new RowFault(1, "", $"The file has {text.Length} characters; at most {options.LongestImport} are taken.", "Split it."));
        }

        var reading = PartCsv.Read(spec, text);
        if (!reading.Faults.IsEmpty)
        {
            return new ImportReport(family, 0, 0, 0, reading.Faults, false);
        }

        return dryRun ? await Compare(spec, reading.Parts, cancel).ConfigureAwait(false) : await store.Write(
            (context, token) => new CatalogueWriter(context, time.GetUtcNow().UtcDateTime, token).Put(spec, reading.Parts), cancel).ConfigureAwait(false);
    }

    /// <summary>The parts of a family as a file.</summary>
    /// <exception cref="KeyNotFoundException">No such family.</exception>
    public async Task<string> Export(string family, CancellationToken cancel = default)
    {
        var spec = registry.Family(family);
        return PartCsv.Write(spec, (await Snapshot(cancel).ConfigureAwait(false)).Of(spec.Id));
    }

    private static Task<long> Version(SelectorContext context, CancellationToken cancel) =>
        context.CatalogueVersions.Select(v => v.Version).SingleAsync(cancel);

    private static ImportReport Refuse(string family, RowFault fault) => new(family, 0, 0, 0, [fault], false);

    /// <summary>Reads the version before and after the parts: when it has not moved, they belong to it.</summary>
    private async Task<CatalogueSnapshot> Build(SelectorContext context, CancellationToken cancel)
    {
        for (var version = await Version(context, cancel).ConfigureAwait(false); ;)
        {
            if (_latest is { } latest && latest.Version == version)
            {
                return latest;
            }

            var rows = await context.Parts.AsNoTracking().OrderBy(p => p.Id).ToListAsync(cancel).ConfigureAwait(false);
            var after = await Version(context, cancel).ConfigureAwait(false);
            if (after == version)
            {
                var families = rows
                    .Select(r => (Row: r, Family: registry.FindFamily(r.Family)))
                    .Where(r => r.Family is not null)
                    .GroupBy(r => r.Row.Family, StringComparer.Ordinal)
                    .ToFrozenDictionary(g => g.Key, g => g.Select(r => PartRows.Part(r.Row, r.Family!)).ToImmutableArray(), StringComparer.Ordinal);
                return _latest = new CatalogueSnapshot(version, families);
            }

            version = after;
        }
    }

    private async Task<ImportReport> Compare(FamilySpec family, ImmutableArray<Part> parts, CancellationToken cancel)
    {
        var there = (await Snapshot(cancel).ConfigureAwait(false)).Of(family.Id).ToDictionary(p => (p.Maker, p.OrderingCode), p => PartCsv.Write(family, [p]));
        var found = parts.Where(p => there.ContainsKey((p.Maker, p.OrderingCode))).ToList();
        var changed = found.Count(p => there[(p.Maker, p.OrderingCode)] != PartCsv.Write(family, [p]));
        return new ImportReport(family.Id, parts.Length - found.Count, changed, found.Count - changed, [], false);
    }
}
