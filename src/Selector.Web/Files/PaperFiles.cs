using System.Globalization;
using System.Text;
using Selector.Documents;
using Selector.Documents.Csv;
using Selector.Web.Session;

namespace Selector.Web.Files;

/// <summary>The papers as files.</summary>
internal static class PaperFiles
{
    public static void MapPapers(this IEndpointRouteBuilder routes)
    {
        routes.MapGet("/supply/{number:int}/papers.pdf", Pdf);
        routes.MapGet("/supply/{number:int}/papers/{table}.csv", Csv);
    }

    /// <summary>Tables of both papers that can be had as files, by name.</summary>
    public static IEnumerable<(string Name, string Text)> Tables(Documents.Sheets.PaperInput input) =>
        Papers.Reports(input).SelectMany(CsvTables.Of).DistinctBy(t => t.Name);

    private static async Task<IResult> Pdf(int number, PaperMaker papers, CancellationToken cancel) =>
        await papers.Input(number, cancel) is { } input
            ? TypedResults.File(await Task.Run(() => Papers.Both(input), cancel), "application/pdf", Name(number, "papers.pdf"))
            : TypedResults.NotFound();

    private static async Task<IResult> Csv(int number, string table, PaperMaker papers, CancellationToken cancel) =>
        await papers.Input(number, cancel) is { } input
            && Tables(input).FirstOrDefault(t => t.Name == table) is { Text: { } text }
            ? TypedResults.File(WithMark(text), "text/csv; charset=utf-8", Name(number, table + ".csv"))
            : TypedResults.NotFound();

    /// <summary>Spreadsheets take a file without a byte order mark for one in the machine's old code page.</summary>
    private static byte[] WithMark(string text) => [.. Encoding.UTF8.Preamble, .. Encoding.UTF8.GetBytes(text)];

    private static string Name(int number, string rest) => string.Create(CultureInfo.InvariantCulture, $"supply-{number:0000}-{rest}");
}
