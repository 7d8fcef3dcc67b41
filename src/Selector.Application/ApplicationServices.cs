using Microsoft.Extensions.DependencyInjection;
using Microsoft.Extensions.DependencyInjection.Extensions;
using Selector.Application.Assessing;
using Selector.Application.Catalogue;
using Selector.Application.Examples;
using Selector.Application.Policies;
using Selector.Application.Supplies;
using Selector.Engine.Supplies;

namespace Selector.Application;

/// <summary>Registers what people do. The store is registered beside it by the composition root.</summary>
public static class ApplicationServices
{
    /// <param name="services">The composition root's.</param>
    /// <param name="registry">Stages and families.</param>
    /// <param name="options">Bounds; null for the standard ones.</param>
    /// <exception cref="ArgumentException">An option is out of range.</exception>
    public static IServiceCollection AddSelectorApplication(this IServiceCollection services, Registry registry, SelectorOptions? options = null)
    {
        services.TryAddSingleton(TimeProvider.System);
        services.AddSingleton(registry);
        services.AddSingleton((options ?? new SelectorOptions()).Checked());
        services.AddSingleton<SupplyNotices>();
        services.AddSingleton<SupplyDesk>();
        services.AddSingleton<CatalogueDesk>();
        services.AddSingleton<PolicyShelf>(_ => new PolicyShelf());
        services.AddSingleton<ExampleShelf>(_ => new ExampleShelf());
        services.AddSingleton<SolveQueue>();
        services.AddSingleton<AssessmentDesk>();
        services.AddSingleton<StoreStart>();
        return services;
    }
}
