namespace Selector.Web.Composition;

/// <summary>
/// Refuses what a page of another site could send through the browser of whoever sits here: requests under a foreign host name (a
/// name that was pointed at the loopback address) and requests that a foreign origin starts.
/// </summary>
public static class SameSite
{
    public static Task Guard(HttpContext context, RequestDelegate next)
    {
        ArgumentNullException.ThrowIfNull(context);
        ArgumentNullException.ThrowIfNull(next);
        var request = context.Request;
        if (!LoopbackOnly.IsLoopback(request.Host.Host))
        {
            return Refuse(context, StatusCodes.Status400BadRequest, "This server only answers under a loopback name, such as 127.0.0.1 or localhost.");
        }

        return IsOwn(request) ? next(context)
            : Refuse(context, StatusCodes.Status403Forbidden, "The request came from a page of another site.");
    }

    /// <summary>
    /// Under our own referrer policy a browser names the origin of a form "null"; it then says in another header, which no page can
    /// write, whether the page was ours.
    /// </summary>
    private static bool IsOwn(HttpRequest request) => request.Headers.Origin.ToString() switch
    {
        "" => true,
        "null" => request.Headers["Sec-Fetch-Site"] == "same-origin",
        var origin => origin == $"{request.Scheme}://{request.Host}",
    };

    private static Task Refuse(HttpContext context, int status, string reason)
    {
        context.Response.StatusCode = status;
        context.Response.ContentType = "text/plain; charset=utf-8";
        return context.Response.WriteAsync(reason, context.RequestAborted);
    }
}
