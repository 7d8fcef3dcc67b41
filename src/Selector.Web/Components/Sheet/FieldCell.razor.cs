using Microsoft.AspNetCore.Components;
using Selector.Engine.Supplies;
using Selector.Web.Session;
using Selector.Web.Words;

namespace Selector.Web.Components.Sheet;

/// <summary>
/// A box keeps what is being typed: a change by somebody else only enters it when nobody is in it, and the edit then names the
/// text that its writer saw, so that the store can tell both.
/// </summary>
public sealed partial class FieldCell : ComponentBase
{
    private string _text = "";
    private string _seen = "";
    private string? _standing;
    private bool _within;
    private ElementReference _box;

    [Parameter]
    [EditorRequired]
    public required FieldValue Value { get; set; }

    [Parameter]
    public FieldTrouble? Trouble { get; set; }

    [Parameter]
    public bool Live { get; set; }

    [Parameter]
    public EventCallback<(string Field, string Old, string Text)> Edited { get; set; }

    [Parameter]
    public EventCallback<string> Mine { get; set; }

    [Parameter]
    public EventCallback<string> Theirs { get; set; }

    private FieldSpec Field => Value.Field;

    private string Key => Field.Key;

    private string Id => Shown.Anchor("f", Key);

    private string Described => $"{Id}-{(Fault is null ? "echo" : "fault")} {Id}-help";

    /// <summary>Without the label that the message begins with: it stands beside the box already.</summary>
    private string? Fault => Trouble?.Words ?? (Value.Fault is not { } fault ? null
        : fault.StartsWith(Field.Label + ": ", StringComparison.Ordinal) ? fault[(Field.Label.Length + 2)..] : fault);

    private string Chosen => Value.Fault is null ? Field.Choices[(int)Value.Value].Key : "";

    public ValueTask Focus() => _box.FocusAsync();

    protected override void OnParametersSet()
    {
        if (_standing == Value.Text)
        {
            return;
        }

        _standing = Value.Text;
        if (!_within && Trouble is null)
        {
            _text = _seen = Value.Text;
        }
    }

    private void Entered()
    {
        _within = true;
        _seen = Trouble is null ? Value.Text : _seen;
    }

    private void Left()
    {
        _within = false;
        if (Trouble is null && _text == _seen)
        {
            _text = _seen = Value.Text;
        }
    }

    private async Task Changed(ChangeEventArgs change)
    {
        _text = change.Value as string ?? "";
        var old = Field.IsChoice ? Value.Text : _seen;
        _seen = _text;
        await Edited.InvokeAsync((Key, old, _text));
    }

    private async Task TakeTheirs()
    {
        _text = _seen = Value.Text;
        await Theirs.InvokeAsync(Key);
    }
}
