using Grpc.Core;
using Grpc.Health.V1;
using PartitionService.Server.Tests.Support;
using Serving = Grpc.Health.V1.HealthCheckResponse.Types.ServingStatus;

namespace PartitionService.Server.Tests.Hosting;

public sealed class HealthTests
{
    [Theory]
    [InlineData("")]
    [InlineData("liveness")]
    [InlineData("readiness")]
    [InlineData("partition.v1.EquilibriumService")]
    [InlineData("partition.v1.CatalogueService")]
    [InlineData("partition.v1.ActivityService")]
    public async Task Started_server_is_healthy(string name)
    {
        await using var server = await RunningServer.StartAsync();
        var response = await new Health.HealthClient(server.Channel).CheckAsync(new HealthCheckRequest { Service = name });
        Assert.Equal(Serving.Serving, response.Status);
    }

    [Fact]
    public async Task Unknown_name_is_not_found()
    {
        await using var server = await RunningServer.StartAsync();
        var client = new Health.HealthClient(server.Channel);
        var exception = await Assert.ThrowsAsync<RpcException>(async () => await client.CheckAsync(new HealthCheckRequest { Service = "nothing" }));
        Assert.Equal(StatusCode.NotFound, exception.StatusCode);
    }

    [Fact]
    public async Task Watcher_of_readiness_hears_that_the_server_stops()
    {
        await using var server = await RunningServer.StartAsync();
        using var limit = new CancellationTokenSource(TimeSpan.FromSeconds(20));
        using var watch = new Health.HealthClient(server.Channel).Watch(new HealthCheckRequest { Service = "readiness" }, cancellationToken: limit.Token);
        var seen = new List<Serving>();
        Task? stopping = null;
        await foreach (var message in watch.ResponseStream.ReadAllAsync(limit.Token))
        {
            seen.Add(message.Status);
            if (message.Status == Serving.Serving)
                stopping ??= server.App.StopAsync();
            if (message.Status == Serving.NotServing && stopping is not null)
                break;
        }

        Assert.NotNull(stopping);
        Assert.Equal(Serving.NotServing, seen[^1]);
        await stopping.WaitAsync(limit.Token);
    }
}
