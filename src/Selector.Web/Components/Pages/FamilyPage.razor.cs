using System.Collections.Immutable;
using Microsoft.AspNetCore.Components;
using Selector.Application.Catalogue;
using Selector.Engine.Parts;
using Selector.Engine.Supplies;
using Selector.Web.Words;

namespace Selector.Web.Components.Pages;

/// <summary>The parts of one family, with a column for each rating that the family declares.</summary>
public sealed partial class FamilyPage : ComponentBase
{
    /// <summary>More rows than this serve nobody; the page asks for a narrower search instead.</summary>
    private const int Most = 500;

    private FamilySpec? _family;
    private ImmutableArray<Part> _found = [];
    private int _all;

    [Parameter]
    public string Family { get; set; } = "";

    [SupplyParameterFromQuery(Name = "find")]
    private string? Find { get; set; }

    [Inject]
    private CatalogueDesk Catalogue { get; set; } = default!;

    [Inject]
    private Registry Registry { get; set; } = default!;

    [Inject]
    private NavigationManager Navigation { get; set; } = default!;

    private string Caption => _found.Length > Most
        ? $"The first {Most} of {Shown.Count(_found.Length)} parts found. Narrow the search to see the others."
        : _found.Length == _all ? $"{Shown.Count(_all)} parts." : $"{Shown.Count(_found.Length)} of {Shown.Count(_all)} parts.";

    protected override async Task OnParametersSetAsync()
    {
        _family = Registry.FindFamily(Family);
        if (_family is null)
        {
            Navigation.NotFound();
            return;
        }

        var parts = (await Catalogue.Snapshot(CancellationToken.None)).Of(Family);
        _all = parts.Length;
        _found = string.IsNullOrWhiteSpace(Find) ? parts : [.. parts.Where(p => Contains(p, Find.Trim()))];
    }

    private static bool Contains(Part part, string text) =>
        new[] { part.FullName, part.ShopNumber, part.Technology }.Any(w => w.Contains(text, StringComparison.OrdinalIgnoreCase));
}
