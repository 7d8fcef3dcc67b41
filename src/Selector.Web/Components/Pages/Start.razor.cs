using System.Collections.Immutable;
using System.Globalization;
using Microsoft.AspNetCore.Components;
using Selector.Application.Examples;
using Selector.Application.Supplies;
using Selector.Web.Session;

namespace Selector.Web.Components.Pages;

/// <summary>The first page: examples, then the shop's own supplies.</summary>
public sealed partial class Start : ComponentBase
{
    private ImmutableArray<SupplyLine> _lines = [];
    private string _refused = "";

    [SupplyParameterFromForm(FormName = "new")]
    private string? Name { get; set; }

    [Inject]
    private SupplyDesk Supplies { get; set; } = default!;

    [Inject]
    private ExampleShelf Shelf { get; set; } = default!;

    [Inject]
    private NavigationManager Navigation { get; set; } = default!;

    [Inject]
    private TimeProvider Time { get; set; } = default!;

    /// <summary>The first supply of each example's name, in the order of the shelf; one that was renamed has become the shop's own.</summary>
    private IReadOnlyList<SupplyLine> Examples =>
    [
        .. Shelf.Examples.Select(e => _lines.Where(l => l.Name == e.Name).MinBy(l => l.Number)).OfType<SupplyLine>(),
    ];

    private IReadOnlyList<SupplyLine> Own => [.. _lines.Except(Examples)];

    protected override async Task OnInitializedAsync() => _lines = await Supplies.List();

    private static string Number(SupplyLine line) => line.Number.ToString("0000", CultureInfo.InvariantCulture);

    private async Task Begin()
    {
        switch (await Supplies.Create((Name ?? "").Trim(), ImmutableDictionary<string, string>.Empty, Owner.Name))
        {
            case EditOutcome.Applied applied:
                Navigation.NavigateTo($"supply/{applied.State.Number}");
                break;
            case EditOutcome.Refused refused:
                _refused = refused.Reason;
                break;
        }
    }
}
