using System.Net;
using PartitionService.Contracts.V1;
using PartitionService.Server.Options;
using PartitionService.Server.Tests.Support;

namespace PartitionService.Server.Tests;

public sealed class PartitionServerTests
{
    [Fact]
    public async Task Free_port_is_chosen_and_can_be_read()
    {
        await using var server = await RunningServer.StartAsync();
        Assert.Equal("127.0.0.1", server.Address.Host);
        Assert.InRange(server.Address.Port, 1025, 65535);
    }

    [Fact]
    public async Task Two_servers_live_side_by_side_in_one_process()
    {
        await using var first = await RunningServer.StartAsync();
        await using var second = await RunningServer.StartAsync();
        Assert.NotEqual(first.Address.Port, second.Address.Port);
        var digests = await Task.WhenAll(
            first.Catalogue.ListSolventsAsync(new ListSolventsRequest()).ResponseAsync,
            second.Catalogue.ListSolventsAsync(new ListSolventsRequest()).ResponseAsync);
        Assert.Equal(digests[0].CatalogueDigest, digests[1].CatalogueDigest);
    }

    [Fact]
    public async Task Address_of_a_server_that_was_not_started_is_refused()
    {
        await using var app = PartitionServer.Build([], options => options.LogOutput = LogOutput.None);
        Assert.Throws<InvalidOperationException>(() => PartitionServer.BoundAddress(app));
    }

    [Fact]
    public async Task Command_line_sets_options()
    {
        await using var app = PartitionServer.Build(["--Partition:Port=0", "--Partition:LogOutput=None"]);
        await app.StartAsync();
        Assert.NotEqual(5080, PartitionServer.BoundAddress(app).Port);
        await app.StopAsync();
    }

    [Fact]
    public async Task Old_http_is_not_spoken()
    {
        await using var server = await RunningServer.StartAsync();
        using var client = new HttpClient { DefaultRequestVersion = HttpVersion.Version11 };
        var spoken = await Record.ExceptionAsync(async () => (await client.GetAsync(server.Address)).EnsureSuccessStatusCode().Dispose());
        Assert.IsType<HttpRequestException>(spoken);
    }
}
