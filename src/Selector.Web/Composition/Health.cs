using Selector.Application.Supplies;

namespace Selector.Web.Composition;

/// <summary>Two questions that a supervisor asks: does the process answer, and can it serve.</summary>
internal static class Health
{
    public static void MapHealth(this IEndpointRouteBuilder routes)
    {
        routes.MapGet("/health/live", () => TypedResults.Text("live\n"));
        routes.MapGet("/health/ready", Ready);
    }

    /// <summary>Ready when the store answers a read; what failed goes to the log, not to whoever asked.</summary>
    private static async Task<IResult> Ready(SupplyDesk supplies, ILoggerFactory logs, CancellationToken cancel)
    {
        try
        {
            await supplies.List(cancel);
            return TypedResults.Text("ready\n");
        }
        catch (Exception e) when (e is not OperationCanceledException)
        {
            logs.CreateLogger(typeof(Health)).LogError(e, "The store does not answer.");
            return TypedResults.Text("the store does not answer\n", statusCode: StatusCodes.Status503ServiceUnavailable);
        }
    }
}
