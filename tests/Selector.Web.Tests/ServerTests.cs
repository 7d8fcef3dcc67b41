using System.Net;
using Microsoft.AspNetCore.Builder;
using Microsoft.AspNetCore.Hosting.Server;
using Microsoft.AspNetCore.Hosting.Server.Features;
using Microsoft.Data.Sqlite;
using Microsoft.Extensions.DependencyInjection;
using Selector.Web.Composition;

namespace Selector.Web.Tests;

/// <summary>The whole server on a free loopback port.</summary>
public sealed class ServerTests : IAsyncLifetime
{
    private readonly string _folder = Directory.CreateTempSubdirectory("selector-server-").FullName;
    private readonly HttpClient _client = new(new HttpClientHandler { AllowAutoRedirect = false });
    private WebApplication _app = null!;

    public async Task InitializeAsync()
    {
        _app = Server.Build(["--urls", "http://127.0.0.1:0", .. Store]);
        await Server.Prepare(_app);
        await _app.StartAsync();
        var addresses = _app.Services.GetRequiredService<IServer>().Features.Get<IServerAddressesFeature>()!;
        _client.BaseAddress = new Uri(addresses.Addresses.Single());
    }

    public async Task DisposeAsync()
    {
        _client.Dispose();
        await _app.DisposeAsync();
        SqliteConnection.ClearAllPools();
        Directory.Delete(_folder, recursive: true);
    }

    [Theory]
    [InlineData("http://0.0.0.0:0")]
    [InlineData("http://[::]:0")]
    [InlineData("http://*:0")]
    [InlineData("http://some-name:0")]
    [InlineData("http://127.0.0.1:0;http://0.0.0.0:0")]
    public async Task It_refuses_to_listen_where_other_machines_reach_it(string urls)
    {
        await using var app = Server.Build(["--urls", urls, .. Store]);

        var refusal = await Assert.ThrowsAsync<NotLoopbackException>(() => app.StartAsync());

        Assert.Contains("does not listen on", refusal.Message, StringComparison.Ordinal);
    }

    [Fact]
    public async Task It_refuses_before_anything_is_started()
    {
        await using var app = Server.Build(["--urls", "http://192.0.2.1:5080", .. Store]);

        await Assert.ThrowsAsync<NotLoopbackException>(() => Server.Prepare(app));
    }

    [Theory]
    [InlineData("/health/live")]
    [InlineData("/health/ready")]
    [InlineData("/")]
    [InlineData("/catalogue")]
    [InlineData("/catalogue/inductor")]
    [InlineData("/catalogue/inductor.csv")]
    public async Task It_answers(string path) => Assert.Equal(HttpStatusCode.OK, (await _client.GetAsync(path)).StatusCode);

    [Theory]
    [InlineData("/supply/4711")]
    [InlineData("/supply/4711/papers")]
    [InlineData("/supply/4711/papers.pdf")]
    [InlineData("/catalogue/no-such-family")]
    [InlineData("/catalogue/no-such-family.csv")]
    [InlineData("/no/such/page")]
    public async Task It_says_when_there_is_nothing(string path) => Assert.Equal(HttpStatusCode.NotFound, (await _client.GetAsync(path)).StatusCode);

    [Theory]
    [InlineData("/")]
    [InlineData("/health/live")]
    [InlineData("/sheet.css")]
    [InlineData("/no/such/page")]
    public async Task Every_answer_carries_the_headers(string path)
    {
        var headers = (await _client.GetAsync(path)).Headers;

        var policy = Assert.Single(headers.GetValues("Content-Security-Policy"));
        Assert.Contains("script-src 'self';", policy, StringComparison.Ordinal);
        Assert.Contains("frame-ancestors 'none'", policy, StringComparison.Ordinal);
        Assert.DoesNotContain("unsafe", policy, StringComparison.Ordinal);
        Assert.Equal("nosniff", Assert.Single(headers.GetValues("X-Content-Type-Options")));
        Assert.Equal("no-referrer", Assert.Single(headers.GetValues("Referrer-Policy")));
    }

    [Theory]
    [InlineData("Host", "shop.example", HttpStatusCode.BadRequest)]
    [InlineData("Origin", "http://shop.example", HttpStatusCode.Forbidden)]
    [InlineData("Origin", "null", HttpStatusCode.Forbidden)]
    public async Task It_refuses_what_comes_from_elsewhere(string header, string value, HttpStatusCode status)
    {
        using var request = new HttpRequestMessage(HttpMethod.Get, "/_blazor");
        request.Headers.TryAddWithoutValidation(header, value);

        Assert.Equal(status, (await _client.SendAsync(request)).StatusCode);
    }

    private string[] Store => ["--Selector:Store", Path.Combine(_folder, "selector.db")];
}
