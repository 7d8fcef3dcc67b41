namespace Selector.Web.Composition;

/// <summary>Lets a container ask its own server how it is, without another program in the image.</summary>
internal static class HealthProbe
{
    private const string Option = "--check-health";
    private static readonly TimeSpan Patience = TimeSpan.FromSeconds(4);

    /// <summary>The address to ask; null when the program was not started for that.</summary>
    public static Uri? Asked(string[] args) =>
        args is [Option, var address] && Uri.TryCreate(address, UriKind.Absolute, out var uri) ? uri : null;

    /// <summary>0 when the server says that it is well, else 1.</summary>
    public static async Task<int> Run(Uri address)
    {
        using var client = new HttpClient { Timeout = Patience };
        try
        {
            using var answer = await client.GetAsync(address);
            return answer.IsSuccessStatusCode ? 0 : 1;
        }
        catch (Exception e) when (e is HttpRequestException or TaskCanceledException)
        {
            await Console.Error.WriteLineAsync($"No answer from {address}.");
            return 1;
        }
    }
}
