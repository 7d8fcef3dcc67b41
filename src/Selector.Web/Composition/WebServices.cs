using Microsoft.AspNetCore.ResponseCompression;
using Selector.Web.Session;

namespace Selector.Web.Composition;

/// <summary>What the pages need besides the desks.</summary>
internal static class WebServices
{
    public static IServiceCollection AddSelectorWeb(this IServiceCollection services)
    {
        services.AddRazorComponents().AddInteractiveServerComponents();
        services.AddResponseCompression(o =>
        {
            o.Providers.Add<BrotliCompressionProvider>();
            o.Providers.Add<GzipCompressionProvider>();
        });
        services.AddHostedService<WarmUp>();
        return services.AddSheets();
    }

    /// <summary>What a sheet and its papers need; also all that a component test registers.</summary>
    public static IServiceCollection AddSheets(this IServiceCollection services) => services
        .AddSingleton<SheetWork>()
        .AddSingleton<PaperMaker>();
}
