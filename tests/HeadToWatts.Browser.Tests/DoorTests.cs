using System.Net;
using System.Net.WebSockets;
using HeadToWatts.Browser.Tests.Running;

namespace HeadToWatts.Browser.Tests;

/// <summary>Who is let in, held against the running server. These need no browser.</summary>
public sealed class DoorTests : IClassFixture<DoorTests.Server>
{
    private readonly LocalApp _app;

    public DoorTests(Server server) => _app = server.App;

    [Theory]
    [InlineData("evil.example", HttpStatusCode.BadRequest)]
    [InlineData("127.0.0.1.evil.example", HttpStatusCode.BadRequest)]
    [InlineData("localhost", HttpStatusCode.OK)]
    [InlineData("127.0.0.1", HttpStatusCode.OK)]
    public async Task Only_requests_that_name_this_machine_are_answered(string host, HttpStatusCode expected)
    {
        using var client = new HttpClient();
        using var request = new HttpRequestMessage(HttpMethod.Get, _app.Address + "/");
        request.Headers.Host = host;
        using var response = await client.SendAsync(request);
        Assert.Equal(expected, response.StatusCode);
    }

    [Theory]
    [InlineData("http://evil.example")]
    [InlineData("null")]
    [InlineData("")]
    public async Task A_web_socket_from_another_origin_or_from_none_is_refused(string origin)
    {
        using var socket = new ClientWebSocket();
        if (origin.Length > 0)
            socket.Options.SetRequestHeader("Origin", origin);
        var refusal = await Assert.ThrowsAsync<WebSocketException>(() => socket.ConnectAsync(SocketAddress(), CancellationToken.None));
        Assert.Contains("403", refusal.Message, StringComparison.Ordinal);
    }

    [Fact]
    public async Task A_web_socket_from_the_apps_own_page_is_let_in()
    {
        using var socket = new ClientWebSocket();
        socket.Options.SetRequestHeader("Origin", _app.Address);
        await socket.ConnectAsync(SocketAddress(), CancellationToken.None);
        Assert.Equal(WebSocketState.Open, socket.State);
    }

    [Fact]
    public async Task What_another_site_sends_is_refused()
    {
        using var client = new HttpClient();
        using var request = new HttpRequestMessage(HttpMethod.Post, _app.Address + "/_blazor/negotiate?negotiateVersion=1");
        request.Headers.Add("Origin", "http://evil.example");
        using var response = await client.SendAsync(request);
        Assert.Equal(HttpStatusCode.Forbidden, response.StatusCode);
    }

    [Fact]
    public async Task Each_answer_carries_a_policy_with_a_nonce_of_its_own()
    {
        using var client = new HttpClient();
        var first = await PolicyAsync(client);
        var second = await PolicyAsync(client);
        Assert.StartsWith("default-src 'none'; script-src 'self' 'nonce-", first, StringComparison.Ordinal);
        Assert.Contains("frame-ancestors 'none'", first, StringComparison.Ordinal);
        Assert.DoesNotContain("unsafe-eval", first, StringComparison.Ordinal);
        Assert.NotEqual(first, second);
    }

    [Fact]
    public async Task An_unknown_address_is_answered_as_not_found_in_words()
    {
        using var client = new HttpClient();
        using var response = await client.GetAsync(new Uri(_app.Address + "/no-such-page"));
        Assert.Equal(HttpStatusCode.NotFound, response.StatusCode);
        Assert.Contains("There is nothing here", await response.Content.ReadAsStringAsync(), StringComparison.Ordinal);
    }

    private async Task<string> PolicyAsync(HttpClient client)
    {
        using var response = await client.GetAsync(new Uri(_app.Address + "/"));
        return Assert.Single(response.Headers.GetValues("Content-Security-Policy"));
    }

    private Uri SocketAddress() => new(_app.Address.Replace("http:", "ws:", StringComparison.Ordinal) + "/_blazor");

    public sealed class Server : IDisposable
    {
        public LocalApp App { get; } = new();

        public void Dispose() => App.Dispose();
    }
}
