using Microsoft.AspNetCore.Hosting.Server;
using Microsoft.AspNetCore.Hosting.Server.Features;
using Selector.Web.Components;
using Selector.Web.Files;

namespace Selector.Web.Composition;

/// <summary>Puts the server together. The only place, with <see cref="StoreServices"/>, that knows which store there is.</summary>
public static class Server
{
    private const string DefaultAddress = "http://127.0.0.1:5080";

    public static WebApplication Build(string[] args)
    {
        // The folder of the program, not the one it is started from: settings and pages lie beside the program.
        var builder = WebApplication.CreateBuilder(new WebApplicationOptions
        {
            Args = args,
            ApplicationName = typeof(Server).Assembly.GetName().Name,
            ContentRootPath = AppContext.BaseDirectory,
        });

        // Without it, files of the framework are only found in the Development environment or when published.
        builder.WebHost.UseStaticWebAssets();
        if (!LoopbackOnly.IsAddressGiven(builder.Configuration))
        {
            builder.WebHost.UseUrls(DefaultAddress);
        }

        builder.WebHost.ConfigureKestrel(kestrel =>
        {
            kestrel.AddServerHeader = false;
            kestrel.ConfigureEndpointDefaults(LoopbackOnly.Demand);
        });
        builder.Services.AddSelectorStore(builder.Configuration);
        builder.Services.AddSelectorWeb();
        var app = builder.Build();
        Pipeline(app);
        return app;
    }

    /// <summary>Brings the store to this version and says where the server is once it listens.</summary>
    public static async Task Prepare(WebApplication app)
    {
        LoopbackOnly.Demand(app.Configuration);
        await StoreServices.Prepare(app.Services, app.Lifetime.ApplicationStopping);
        app.Lifetime.ApplicationStarted.Register(() =>
        {
            var addresses = app.Services.GetRequiredService<IServer>().Features.Get<IServerAddressesFeature>();
            foreach (var address in addresses?.Addresses ?? [])
            {
                Console.WriteLine($"Selector is at {address}  (Ctrl+C ends it)");
            }
        });
    }

    private static void Pipeline(WebApplication app)
    {
        app.UseExceptionHandler("/fault", createScopeForErrors: true);
        app.UseStatusCodePagesWithReExecute("/nothing-here", createScopeForStatusCodePages: true);
        app.UseSecurityHeaders(SecurityPolicy.Headers);
        app.Use(SameSite.Guard);
        app.UseResponseCompression();
        app.UseAntiforgery();
        app.MapHealth();
        app.MapStaticAssets();
        app.MapPapers();
        app.MapCatalogueFiles();
        app.MapRazorComponents<App>().AddInteractiveServerRenderMode(o => o.ContentSecurityFrameAncestorsPolicy = "'none'");
    }
}
