using System.Net;
using Microsoft.AspNetCore.Server.Kestrel.Core;

namespace Selector.Web.Composition;

/// <summary>While there are no accounts, whoever reaches the server is its owner: so nobody may reach it from another machine.</summary>
public static class LoopbackOnly
{
    /// <summary>Whether an address to listen on is given by command line, environment or settings.</summary>
    public static bool IsAddressGiven(IConfiguration configuration) =>
        new[] { "urls", "http_ports", "https_ports" }.Any(key => !string.IsNullOrWhiteSpace(configuration[key]))
        || configuration.GetSection("Kestrel:Endpoints").GetChildren().Any();

    /// <summary>Looks at the addresses before anything is started, so that a refusal is one sentence.</summary>
    /// <exception cref="NotLoopbackException">One of them can be reached from another machine.</exception>
    public static void Demand(IConfiguration configuration)
    {
        ArgumentNullException.ThrowIfNull(configuration);
        var urls = (configuration["urls"] ?? "").Split(';', StringSplitOptions.TrimEntries | StringSplitOptions.RemoveEmptyEntries)
            .Concat(configuration.GetSection("Kestrel:Endpoints").GetChildren().Select(e => e["Url"] ?? ""))
            .Where(u => u.Length > 0);
        foreach (var url in urls)
        {
            var host = BindingAddress.Parse(url).Host;
            if (!IsLoopback(host))
            {
                throw new NotLoopbackException(url);
            }
        }
    }

    /// <summary>Whether a host name or address means this machine and nothing else.</summary>
    public static bool IsLoopback(string host) =>
        string.Equals(host, "localhost", StringComparison.OrdinalIgnoreCase)
        || (IPAddress.TryParse(host, out var address) && IPAddress.IsLoopback(address));

    /// <summary>The last word: asked by the server for every end point that it is about to bind, wherever that was configured.</summary>
    /// <exception cref="NotLoopbackException">The end point can be reached from another machine.</exception>
    public static void Demand(ListenOptions endpoint)
    {
        ArgumentNullException.ThrowIfNull(endpoint);

        // "localhost" has no single address: the server then binds both loopback addresses and nothing else.
        if (endpoint.IPEndPoint is { } ip && !IPAddress.IsLoopback(ip.Address))
        {
            throw new NotLoopbackException(ip.ToString());
        }
    }
}

/// <summary>The server was told to listen where other machines could reach it.</summary>
public sealed class NotLoopbackException(string address) : Exception(
    $"Selector does not listen on {address}: there are no accounts yet, so whoever reaches the server owns it. "
    + "Give a loopback address, for example --urls http://127.0.0.1:5080")
{
    public string Address { get; } = address;
}
