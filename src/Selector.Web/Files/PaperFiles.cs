namespace Selector.Web.Files;

internal static class PaperFiles
{
    public static void MapPapers(this IEndpointRouteBuilder routes) { }
    public static void MapCatalogueFiles(this IEndpointRouteBuilder routes) { }
}
