using Selector.Storage;
using Selector.Storage.Entities;

namespace Selector.Application.Supplies;

/// <summary>
/// Adds to the log of one supply within a transaction. The log is also two linked stacks: every entry knows the one below it, the
/// supply knows the tops, so that undo and redo cost the same after any number of edits.
/// </summary>
internal sealed class SupplyLog(SelectorContext context, SupplyRecord supply, string by, DateTime now)
{
    /// <summary>An edit of its own: what was undone before it can no longer be redone.</summary>
    public void Add(string field, string old, SupplyText? stands, string text)
    {
        var entry = Write(field, old, stands, text, null, supply.UndoTop);
        supply.UndoTop = entry.Sequence;
        supply.RedoTop = 0;
    }

    /// <summary>The texts with which a supply begins: in the log, but not to be undone.</summary>
    public void Begin(string field, string old, string text) => Write(field, old, null, text, null, 0);

    /// <summary>The inverse of the edit on top of the undos.</summary>
    public void Undo(SupplyEdit top, SupplyText stands)
    {
        var entry = Write(top.Field, top.New, stands, top.Old, top.Sequence, supply.RedoTop);
        supply.UndoTop = top.Below;
        supply.RedoTop = entry.Sequence;
    }

    /// <summary>The inverse of the undo on top of the redos.</summary>
    public void Redo(SupplyEdit top, SupplyText stands)
    {
        var entry = Write(top.Field, top.New, stands, top.Old, top.Sequence, supply.UndoTop);
        supply.RedoTop = top.Below;
        supply.UndoTop = entry.Sequence;
    }

    private SupplyEdit Write(string field, string old, SupplyText? stands, string text, int? undoes, int below)
    {
        var entry = new SupplyEdit
        {
            Supply = supply.Number,
            Sequence = ++supply.LastSequence,
            Field = field,
            Old = old,
            New = text,
            By = by,
            AtUtc = now,
            Undoes = undoes,
            Below = below,
        };
        context.SupplyEdits.Add(entry);
        if (stands is null)
        {
            context.SupplyTexts.Add(new SupplyText { Supply = supply.Number, Field = field, Text = text, Sequence = entry.Sequence });
        }
        else
        {
            stands.Text = text;
            stands.Sequence = entry.Sequence;
        }

        if (field == SupplyFields.Name)
        {
            supply.Name = text;
        }

        supply.EditedUtc = now;
        return entry;
    }
}
