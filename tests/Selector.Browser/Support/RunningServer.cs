using System.Diagnostics;
using System.Net;
using System.Net.Sockets;

namespace Selector.Browser.Support;

/// <summary>The built server as its own process, with a store of its own in a temporary folder.</summary>
internal sealed class RunningServer : IDisposable
{
    private static readonly TimeSpan Patience = TimeSpan.FromSeconds(60);

    private readonly DirectoryInfo _folder = Directory.CreateTempSubdirectory("selector-browser");
    private Process? _process;

    private RunningServer()
    {
        Address = $"http://127.0.0.1:{FreePort()}";
    }

    public string Address { get; }

    public string Store => Path.Combine(_folder.FullName, "selector.db");

    /// <summary>From the start of the process to the first page, the last time it was started.</summary>
    public TimeSpan FirstPage { get; private set; }

    public static async Task<RunningServer> Start()
    {
        var server = new RunningServer();
        await server.Restart();
        return server;
    }

    /// <summary>Stops the server, if it runs, as a power cut would, and starts it on the same store.</summary>
    public async Task Restart()
    {
        Stop();
        var dll = typeof(Web.Composition.Server).Assembly.Location;
        var start = new ProcessStartInfo("dotnet", [dll, "--urls", Address]) { RedirectStandardOutput = true, RedirectStandardError = true };
        start.Environment["SELECTOR_STORE"] = Store;
        start.Environment["ASPNETCORE_ENVIRONMENT"] = "Production";
        var watch = Stopwatch.StartNew();
        _process = Process.Start(start)!;
        _process.OutputDataReceived += (_, _) => { };
        _process.ErrorDataReceived += (_, _) => { };
        _process.BeginOutputReadLine();
        _process.BeginErrorReadLine();
        using var client = new HttpClient();
        while (watch.Elapsed < Patience && !_process.HasExited)
        {
            try
            {
                using var answer = await client.GetAsync(new Uri(Address));
                if (answer.IsSuccessStatusCode)
                {
                    FirstPage = watch.Elapsed;
                    return;
                }
            }
            catch (HttpRequestException)
            {
                await Task.Delay(20);
            }
        }

        throw new InvalidOperationException("The server did not answer.");
    }

    public void Dispose()
    {
        Stop();
        _folder.Delete(true);
    }

    private void Stop()
    {
        if (_process is { HasExited: false })
        {
            _process.Kill(true);
            _process.WaitForExit();
        }

        _process?.Dispose();
        _process = null;
    }

    private static int FreePort()
    {
        using var listener = new TcpListener(IPAddress.Loopback, 0);
        listener.Start();
        return ((IPEndPoint)listener.LocalEndpoint).Port;
    }
}
