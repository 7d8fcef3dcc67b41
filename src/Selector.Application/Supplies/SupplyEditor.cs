using Microsoft.EntityFrameworkCore;
using Selector.Engine.Supplies;
using Selector.Storage;
using Selector.Storage.Entities;

namespace Selector.Application.Supplies;

/// <summary>Decides and writes edits within one transaction of the store.</summary>
internal sealed class SupplyEditor(SelectorContext context, Registry registry, DateTime now, CancellationToken cancel)
{
    /// <summary>Adds a supply with its first texts; all have been found fit to be stored.</summary>
    public async Task<SupplyState> Create(string name, IReadOnlyDictionary<string, string> fields, string by)
    {
        var supply = new SupplyRecord { Name = name, CreatedUtc = now, EditedUtc = now };
        context.Supplies.Add(supply);
        await context.SaveChangesAsync(cancel).ConfigureAwait(false);
        var log = new SupplyLog(context, supply, by, now);
        log.Begin(SupplyFields.Name, "", name);
        foreach (var (field, text) in fields.OrderBy(f => f.Key, StringComparer.Ordinal))
        {
            log.Begin(field, SupplyFields.Unwritten(registry, field), text);
        }

        return await Saved(supply).ConfigureAwait(false);
    }

    public async Task<EditOutcome> Apply(int number, Edit edit)
    {
        if (await Find(number).ConfigureAwait(false) is not { } supply)
        {
            return new EditOutcome.NotFound(number);
        }

        var stands = await Stands(number, edit.Field).ConfigureAwait(false);
        var text = stands?.Text ?? SupplyFields.Unwritten(registry, edit.Field);
        if (edit.Old is { } old && old != text)
        {
            var wrote = stands is null ? null : await Entry(number, stands.Sequence).ConfigureAwait(false);
            var state = await State(supply).ConfigureAwait(false);
            return new EditOutcome.Conflict(edit.Field, edit.New, text, wrote?.By ?? "", wrote?.AtUtc ?? supply.CreatedUtc, state);
        }

        if (edit.New == text)
        {
            return new EditOutcome.Applied(await State(supply).ConfigureAwait(false));
        }

        new SupplyLog(context, supply, edit.By, now).Add(edit.Field, text, stands, edit.New);
        return new EditOutcome.Applied(await Saved(supply).ConfigureAwait(false));
    }

    /// <summary>Takes back the last edit, or with <paramref name="redo"/> the last undo. Nothing is overwritten: the log ends with what is taken back.</summary>
    public async Task<EditOutcome> TakeBack(int number, string by, bool redo)
    {
        if (await Find(number).ConfigureAwait(false) is not { } supply)
        {
            return new EditOutcome.NotFound(number);
        }

        var sequence = redo ? supply.RedoTop : supply.UndoTop;
        if (sequence == 0)
        {
            return new EditOutcome.Refused(redo ? "There is nothing to redo." : "There is nothing to undo.");
        }

        var top = (await Entry(number, sequence).ConfigureAwait(false))!;
        var stands = (await Stands(number, top.Field).ConfigureAwait(false))!;
        var log = new SupplyLog(context, supply, by, now);
        if (redo)
        {
            log.Redo(top, stands);
        }
        else
        {
            log.Undo(top, stands);
        }

        return new EditOutcome.Applied(await Saved(supply).ConfigureAwait(false));
    }

    private Task<SupplyRecord?> Find(int number) => context.Supplies.SingleOrDefaultAsync(s => s.Number == number, cancel);

    private Task<SupplyText?> Stands(int number, string field) =>
        context.SupplyTexts.SingleOrDefaultAsync(t => t.Supply == number && t.Field == field, cancel);

    private Task<SupplyEdit?> Entry(int number, int sequence) =>
        context.SupplyEdits.AsNoTracking().SingleOrDefaultAsync(e => e.Supply == number && e.Sequence == sequence, cancel);

    private async Task<SupplyState> Saved(SupplyRecord supply)
    {
        await context.SaveChangesAsync(cancel).ConfigureAwait(false);
        return await State(supply).ConfigureAwait(false);
    }

    private async Task<SupplyState> State(SupplyRecord supply) => SupplyRows.State(
        supply, await context.SupplyTexts.AsNoTracking().Where(t => t.Supply == supply.Number).ToListAsync(cancel).ConfigureAwait(false));
}
