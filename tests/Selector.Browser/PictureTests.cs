using Deque.AxeCore.Playwright;
using Microsoft.Playwright;
using Selector.Browser.Support;

namespace Selector.Browser;

/// <summary>Every page fits its window, stands up to an accessibility check, and asks no other host for anything.</summary>
[Collection(DeskCollection.Name)]
public class PictureTests(Desk desk)
{
    private static readonly string[] Addresses = ["/", "/supply/1", "/supply/2", "/supply/2/papers", "/catalogue", "/catalogue/inductor"];

    [ChromiumFact]
    public async Task No_page_scrolls_sideways_at_1280_or_1920()
    {
        foreach (var width in (int[])[1280, 1920])
        {
            var page = await desk.Page(width);
            foreach (var address in Addresses)
            {
                await page.GotoAsync(address);
                await Settled(page, address);
                Assert.True(
                    await page.EvaluateAsync<bool>("() => document.documentElement.scrollWidth <= window.innerWidth"), $"{address} at {width}");
                await Keep(page, $"{width}{address.Replace('/', '-')}");
            }
        }
    }

    [ChromiumFact]
    public async Task Axe_reports_nothing_on_any_page_in_light_and_dark()
    {
        var found = new List<string>();
        foreach (var scheme in (ColorScheme[])[ColorScheme.Light, ColorScheme.Dark])
        {
            var page = await desk.Page(1280, 900, scheme);
            foreach (var address in Addresses)
            {
                await page.GotoAsync(address);
                await Settled(page, address);
                var result = await page.RunAxe();
                found.AddRange(result.Violations.Select(v => $"{address} {scheme}: {v.Id} {v.Nodes.FirstOrDefault()?.Html}"));
                await Keep(page, $"{scheme}{address.Replace('/', '-')}");
            }
        }

        Assert.Empty(found);
    }

    [ChromiumFact]
    public async Task An_opened_row_shows_candidates_and_why_and_asks_no_other_host()
    {
        var page = await desk.Page();
        var foreign = new List<string>();
        page.Request += (_, r) =>
        {
            if (!r.Url.StartsWith(desk.Server.Address, StringComparison.Ordinal) && !r.Url.StartsWith("data:", StringComparison.Ordinal)
                && !r.Url.StartsWith(desk.Server.Address.Replace("http", "ws", StringComparison.Ordinal), StringComparison.Ordinal))
            {
                foreign.Add(r.Url);
            }
        };
        var sheet = new SheetPage(page);
        await sheet.Open("/supply/2");
        await page.Locator("tr[data-position='C1'][data-kind='ripple-current'] button").First.ClickAsync();
        await page.Locator("[data-candidate]").First.WaitForAsync(new() { Timeout = 60_000 });

        Assert.True(await page.Locator("[data-candidate]").CountAsync() > 5);
        Assert.Contains("√", await page.Locator("main").InnerTextAsync(), StringComparison.Ordinal);
        Assert.Empty(foreign);
        await Keep(page, "opened-row");
        var result = await page.RunAxe();
        Assert.True(result.Violations.Length == 0, string.Join("; ", result.Violations.Select(v => $"{v.Id} {v.Nodes.FirstOrDefault()?.Html}")));
    }

    [ChromiumFact]
    public async Task Printed_the_sheet_drops_its_tools_and_fits()
    {
        var page = await desk.Page();
        await new SheetPage(page).Open("/supply/2");
        await page.EmulateMediaAsync(new PageEmulateMediaOptions { Media = Media.Print });

        Assert.Empty(await page.Locator("button[data-tool]:visible").AllInnerTextsAsync());
        Assert.True(await page.EvaluateAsync<bool>("() => document.documentElement.scrollWidth <= window.innerWidth"));
        await Keep(page, "print-supply-2");
    }

    private static async Task Settled(IPage page, string address)
    {
        if (address is "/supply/1" or "/supply/2")
        {
            await new SheetPage(page).Ready();
        }
    }

    /// <summary>Pictures are kept where SELECTOR_PICTURES says, to be looked at.</summary>
    private static async Task Keep(IPage page, string name)
    {
        if (Environment.GetEnvironmentVariable("SELECTOR_PICTURES") is { Length: > 0 } folder)
        {
            await page.ScreenshotAsync(new PageScreenshotOptions { Path = Path.Combine(folder, name + ".png"), FullPage = true });
        }
    }
}
