using System.Collections.Immutable;
using Microsoft.EntityFrameworkCore;
using Selector.Engine.Parts;
using Selector.Storage;
using Selector.Storage.Entities;

namespace Selector.Application.Catalogue;

/// <summary>Puts parts into the store within one transaction and counts the catalogue's version up when anything changed.</summary>
internal sealed class CatalogueWriter(SelectorContext context, DateTime now, CancellationToken cancel)
{
    /// <summary>Adds and changes parts of one family by maker and ordering code; a part that is there keeps its number.</summary>
    public async Task<ImportReport> Put(FamilySpec family, ImmutableArray<Part> parts)
    {
        var rows = await context.Parts.Where(p => p.Family == family.Id)
            .ToDictionaryAsync(p => (p.Maker, p.OrderingCode), cancel).ConfigureAwait(false);
        var touched = new List<PartRecord>();
        var added = 0;
        foreach (var part in parts)
        {
            if (rows.TryGetValue((part.Maker, part.OrderingCode), out var row))
            {
                PartRows.Copy(part, row);
                touched.Add(row);
            }
            else
            {
                context.Parts.Add(PartRows.Row(part));
                added++;
            }
        }

        context.ChangeTracker.DetectChanges();
        var changed = touched.Count(r => context.Entry(r).State == EntityState.Modified);
        if (added + changed > 0)
        {
            await Count().ConfigureAwait(false);
            await context.SaveChangesAsync(cancel).ConfigureAwait(false);
        }

        return new ImportReport(family.Id, added, changed, touched.Count - changed, [], true);
    }

    /// <summary>Counts the version up. The count is also what two writers would collide at.</summary>
    public async Task<CatalogueVersion> Count()
    {
        var version = await context.CatalogueVersions.SingleAsync(cancel).ConfigureAwait(false);
        version.ChangedUtc = now;
        context.Entry(version).Property(v => v.ChangedUtc).IsModified = true;
        return version;
    }
}
