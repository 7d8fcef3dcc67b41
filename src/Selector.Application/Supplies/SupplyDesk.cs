using System.Collections.Immutable;
using Microsoft.EntityFrameworkCore;
using Selector.Engine.Supplies;
using Selector.Storage;

namespace Selector.Application.Supplies;

/// <summary>What people do with supplies. Every change goes through the log of edits, so that saving, undo, live update and the message to whoever came second are one thing.</summary>
public sealed class SupplyDesk(StoreWork store, Registry registry, SupplyNotices notices, TimeProvider time)
{
    /// <summary>Starts a supply with some texts; the fields left out keep their defaults.</summary>
    public async Task<EditOutcome> Create(
        string name, IReadOnlyDictionary<string, string> fields, string by, CancellationToken cancel = default)
    {
        ArgumentNullException.ThrowIfNull(fields);
        var refusal = SupplyFields.Refusal(registry, SupplyFields.Name, name, by)
            ?? fields.Select(f => SupplyFields.Refusal(registry, f.Key, f.Value, by)).FirstOrDefault(r => r is not null)
            ?? (fields.ContainsKey(SupplyFields.Name) ? "The name is given on its own, not among the fields." : null);
        return refusal is not null
            ? new EditOutcome.Refused(refusal)
            : await Write(async editor => new EditOutcome.Applied(await editor.Create(name, fields, by).ConfigureAwait(false)), cancel)
                .ConfigureAwait(false);
    }

    /// <summary>All supplies, the last edited first.</summary>
    public async Task<ImmutableArray<SupplyLine>> List(CancellationToken cancel = default)
    {
        var context = await store.Open(cancel).ConfigureAwait(false);
        await using (context.ConfigureAwait(false))
        {
            var lines = await context.Supplies.AsNoTracking()
                .OrderByDescending(s => s.EditedUtc).ThenByDescending(s => s.Number)
                .Select(s => new SupplyLine(s.Number, s.Name, s.Version, s.CreatedUtc, s.EditedUtc))
                .ToListAsync(cancel).ConfigureAwait(false);
            return [.. lines];
        }
    }

    /// <summary>A supply as it stands; null when there is none of that number.</summary>
    public async Task<SupplyState?> Open(int number, CancellationToken cancel = default)
    {
        var context = await store.Open(cancel).ConfigureAwait(false);
        await using (context.ConfigureAwait(false))
        {
            return await SupplyRows.Read(context, number, cancel).ConfigureAwait(false);
        }
    }

    /// <summary>Applies an edit if the text that it replaces still stands.</summary>
    public async Task<EditOutcome> Apply(int number, Edit edit, CancellationToken cancel = default) =>
        SupplyFields.Refusal(registry, edit.Field, edit.New, edit.By) is { } refusal
            ? new EditOutcome.Refused(refusal)
            : await Write(editor => editor.Apply(number, edit), cancel).ConfigureAwait(false);

    /// <summary>Gives another name, whatever it is now.</summary>
    public Task<EditOutcome> Rename(int number, string name, string by, CancellationToken cancel = default) =>
        Apply(number, new Edit(SupplyFields.Name, null, name, by), cancel);

    /// <summary>Adds the inverse of the last edit that still stands.</summary>
    public Task<EditOutcome> Undo(int number, string by, CancellationToken cancel = default) => TakeBack(number, by, false, cancel);

    /// <summary>Adds the inverse of the last undo, as long as nothing was edited since.</summary>
    public Task<EditOutcome> Redo(int number, string by, CancellationToken cancel = default) => TakeBack(number, by, true, cancel);

    /// <summary>The whole log of a supply, oldest first.</summary>
    public async Task<ImmutableArray<LogLine>> Log(int number, CancellationToken cancel = default)
    {
        var context = await store.Open(cancel).ConfigureAwait(false);
        await using (context.ConfigureAwait(false))
        {
            return [.. await context.SupplyEdits.AsNoTracking().Where(e => e.Supply == number).OrderBy(e => e.Sequence)
                .Select(e => new LogLine(e.Sequence, e.Field, e.Old, e.New, e.By, e.AtUtc, e.Undoes))
                .ToListAsync(cancel).ConfigureAwait(false)];
        }
    }

    private async Task<EditOutcome> TakeBack(int number, string by, bool redo, CancellationToken cancel) =>
        SupplyFields.RefusalOf(by) is { } refusal
            ? new EditOutcome.Refused(refusal)
            : await Write(editor => editor.TakeBack(number, by, redo), cancel).ConfigureAwait(false);

    private async Task<EditOutcome> Write(Func<SupplyEditor, Task<EditOutcome>> work, CancellationToken cancel)
    {
        var outcome = await store.Write(
            (context, token) => work(new SupplyEditor(context, registry, time.GetUtcNow().UtcDateTime, token)), cancel).ConfigureAwait(false);
        if (outcome is EditOutcome.Applied applied)
        {
            notices.Tell(new SupplyChange(applied.State.Number, applied.State.Version));
        }

        return outcome;
    }
}
