using Microsoft.AspNetCore.Components;
using Selector.Application.Supplies;
using Selector.Web.Components.Sheet;
using Selector.Web.Session;

namespace Selector.Web.Components.Pages;

/// <summary>The sheet of one supply.</summary>
public sealed partial class SheetPage : ComponentBase, IDisposable
{
    private SheetSession? _session;
    private TitleBlock? _title;
    private IDisposable? _notices;

    [Parameter]
    public int Number { get; set; }

    [Inject]
    private SupplyDesk Supplies { get; set; } = default!;

    [Inject]
    private SupplyNotices Notices { get; set; } = default!;

    [Inject]
    private SheetWork Work { get; set; } = default!;

    [Inject]
    private NavigationManager Navigation { get; set; } = default!;

    private bool Live => RendererInfo.IsInteractive;

    /// <summary>
    /// Loads before anything is drawn: what was drawn on the server for the first answer then stays on the screen until the
    /// interactive page has the same to show, and nothing flickers.
    /// </summary>
    public override async Task SetParametersAsync(ParameterView parameters)
    {
        parameters.SetParameterProperties(this);
        if (_session?.Number != Number)
        {
            Close();
            var session = new SheetSession(Number, Supplies, Work, Owner.Name);
            if (await session.Open(CancellationToken.None))
            {
                _session = session;
                session.Changed += Redraw;
                _notices = Live ? Notices.Subscribe(Number, Heard) : null;
            }
            else
            {
                session.Dispose();
                Navigation.NotFound();
            }
        }

        // The view itself may not be read after the first wait.
        await base.SetParametersAsync(ParameterView.Empty);
    }

    public void Dispose() => Close();

    private void Close()
    {
        _notices?.Dispose();
        if (_session is { } session)
        {
            session.Changed -= Redraw;
            session.Dispose();
            _session = null;
        }
    }

    private void Redraw() => _ = InvokeAsync(StateHasChanged);

    // The notice comes on the writer's thread.
    private void Heard(SupplyChange change) => _ = InvokeAsync(() => _session?.Follow(change.Version) ?? Task.CompletedTask);
}
