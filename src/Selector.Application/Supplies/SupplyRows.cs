using System.Collections.Immutable;
using Microsoft.EntityFrameworkCore;
using Selector.Storage;
using Selector.Storage.Entities;

namespace Selector.Application.Supplies;

/// <summary>A supply's rows turned into its state.</summary>
internal static class SupplyRows
{
    public static async Task<SupplyState?> Read(SelectorContext context, int number, CancellationToken cancel)
    {
        // The version is read before and after: without a transaction another edit could fall between the two tables.
        while (true)
        {
            var supply = await context.Supplies.AsNoTracking().SingleOrDefaultAsync(s => s.Number == number, cancel).ConfigureAwait(false);
            if (supply is null)
            {
                return null;
            }

            var texts = await context.SupplyTexts.AsNoTracking().Where(t => t.Supply == number).ToListAsync(cancel).ConfigureAwait(false);
            var after = await context.Supplies.Where(s => s.Number == number).Select(s => s.Version).SingleOrDefaultAsync(cancel).ConfigureAwait(false);
            if (after == supply.Version)
            {
                return State(supply, texts);
            }
        }
    }

    public static SupplyState State(SupplyRecord supply, IEnumerable<SupplyText> texts) => new(
        supply.Number,
        supply.Name,
        texts.Where(t => t.Field != SupplyFields.Name).ToImmutableSortedDictionary(t => t.Field, t => t.Text, StringComparer.Ordinal),
        supply.Version,
        supply.EditedUtc,
        supply.UndoTop != 0,
        supply.RedoTop != 0);
}
