using System.Text;
using Selector.Application.Catalogue;
using Selector.Engine.Supplies;

namespace Selector.Web.Files;

/// <summary>The catalogue as files, one a family, in the form in which it is taken in again.</summary>
internal static class CatalogueFiles
{
    public static void MapCatalogueFiles(this IEndpointRouteBuilder routes) => routes.MapGet("/catalogue/{family}.csv", Csv);

    private static async Task<IResult> Csv(string family, CatalogueDesk catalogue, Registry registry, CancellationToken cancel) =>
        registry.FindFamily(family) is { } spec
            ? TypedResults.File(Encoding.UTF8.GetBytes(await catalogue.Export(spec.Id, cancel)), "text/csv; charset=utf-8", spec.Id + ".csv")
            : TypedResults.NotFound();
}
