using Selector.Application.Supplies;
using Selector.Engine.Supplies;

namespace Selector.Web.Session;

/// <content>Changes: each is an edit of one field that names the text which it replaces.</content>
public sealed partial class SheetSession
{
    /// <summary>Replaces the text of a field.</summary>
    /// <param name="field">Which.</param>
    /// <param name="old">What the person saw before typing.</param>
    /// <param name="text">What they typed, kept as it is.</param>
    public async Task Edit(string field, string old, string text)
    {
        _troubles.Remove(field);
        await Settle(await supplies.Apply(number, new Edit(field, old, text, by)), field, text);
    }

    /// <summary>Fits a part, or empties the position with null.</summary>
    public Task Fit(string position, Fitting? fitting) =>
        Edit(SupplyFields.Fit(position), State!.Fit(position), FittingText.Format(fitting));

    public async Task Undo() => await Settle(await supplies.Undo(number, by), "", "");

    public async Task Redo() => await Settle(await supplies.Redo(number, by), "", "");

    /// <summary>After a conflict: the text that stands is right, forget what was typed.</summary>
    public void TakeTheirs(string field)
    {
        _troubles.Remove(field);
        Say("The text that stands is kept.");
    }

    /// <summary>After a conflict: what was typed shall replace what stands.</summary>
    public Task InsistOnMine(string field) =>
        _troubles.TryGetValue(field, out var t) && t.Stands is { } stands ? Edit(field, stands, t.Typed) : Task.CompletedTask;

    private async Task Settle(EditOutcome outcome, string field, string typed)
    {
        switch (outcome)
        {
            case EditOutcome.Applied applied:
                Adopt(applied.State);
                await Solve();
                break;
            case EditOutcome.Conflict conflict:
                _troubles[field] = new FieldTrouble(typed, conflict.Stands, conflict.Words);
                Adopt(conflict.State);
                Say(conflict.Words);
                await Solve();
                break;
            case EditOutcome.Refused refused:
                _troubles[field] = new FieldTrouble(typed, null, refused.Reason);
                Say(refused.Reason);
                break;
            default:
                Say("This supply is no longer there.");
                break;
        }
    }
}
