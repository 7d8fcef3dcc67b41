using Microsoft.Playwright;

namespace Selector.Browser.Support;

/// <summary>Server and browser that all tests of the project share.</summary>
public sealed class Desk : IAsyncLifetime
{
    private IPlaywright? _playwright;
    private IBrowser? _browser;

    internal RunningServer Server { get; private set; } = null!;

    public async Task InitializeAsync()
    {
        if (!File.Exists(ChromiumFactAttribute.Path))
        {
            return;
        }

        Server = await RunningServer.Start();
        _playwright = await Playwright.CreateAsync();
        _browser = await _playwright.Chromium.LaunchAsync(new BrowserTypeLaunchOptions
        {
            ExecutablePath = ChromiumFactAttribute.Path,
            Args =
            [
                "--no-sandbox", "--disable-gpu", "--disable-quic", "--no-first-run", "--disable-background-networking",
                "--disable-component-update", "--disable-sync", "--disable-dev-shm-usage",
            ],
        });
    }

    public async Task<IPage> Page(int width = 1280, int height = 900, ColorScheme scheme = ColorScheme.Light)
    {
        var context = await _browser!.NewContextAsync(new BrowserNewContextOptions
        {
            BaseURL = Server.Address,
            ColorScheme = scheme,
            ViewportSize = new ViewportSize { Width = width, Height = height },
        });
        return await context.NewPageAsync();
    }

    public async Task DisposeAsync()
    {
        if (_browser is not null)
        {
            await _browser.CloseAsync();
        }

        _playwright?.Dispose();
        Server?.Dispose();
    }
}

[CollectionDefinition(Name)]
public sealed class DeskCollection : ICollectionFixture<Desk>
{
    public const string Name = "one server, one browser";
}
