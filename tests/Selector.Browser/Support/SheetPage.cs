using System.Globalization;
using Microsoft.Playwright;

namespace Selector.Browser.Support;

/// <summary>One ledger row as the page carries it.</summary>
internal sealed record PageRow(string Position, string Kind, string Verdict, double? Stress, double? Allowed, double? Margin);

/// <summary>The sheet as a person uses it, by its stable hooks.</summary>
internal sealed class SheetPage(IPage page)
{
    private const string Solved = "main[data-interactive='true']";

    public IPage Page => page;

    public async Task Open(string address)
    {
        await page.GotoAsync(address);
        await Ready();
    }

    /// <summary>Waits until the page answers and its ledger belongs to what was typed.</summary>
    public async Task Ready()
    {
        await page.WaitForSelectorAsync(Solved);
        await page.WaitForFunctionAsync(
            "() => { const m = document.querySelector('main'); return m && m.dataset.interactive === 'true' && m.dataset.version === m.dataset.solvedVersion; }");
    }

    public async Task Type(string field, string text)
    {
        var box = page.Locator($"[data-field='{field}'] input");
        await box.FillAsync(text);
        await box.BlurAsync();
    }

    public async Task Choose(string field, string word) =>
        await page.Locator($"[data-field='{field}'] select").SelectOptionAsync(word);

    public async Task<string> Version() => await page.Locator("main").GetAttributeAsync("data-version") ?? "";

    public async Task<IReadOnlyList<PageRow>> Rows()
    {
        var cells = await page.EvaluateAsync<string[][]>(
            """
            () => [...document.querySelectorAll('tr[data-position][data-kind]')].map(r => {
                const value = c => { const e = r.querySelector(`[data-cell='${c}']`); return e && e.dataset.value ? e.dataset.value : ''; };
                return [r.dataset.position, r.dataset.kind, r.dataset.verdict, value('stress'), value('allowed'), value('margin')];
            })
            """);
        return [.. cells.Select(c => new PageRow(c[0], c[1], c[2], Number(c[3]), Number(c[4]), Number(c[5])))];
    }

    private static double? Number(string text) => text.Length == 0 ? null : double.Parse(text, CultureInfo.InvariantCulture);
}
