using Grpc.Core;
using Grpc.Reflection.V1Alpha;
using PartitionService.Server.Tests.Support;

namespace PartitionService.Server.Tests.Hosting;

public sealed class ReflectionTests
{
    [Fact]
    public async Task Services_are_listed_on_loopback()
    {
        await using var server = await RunningServer.StartAsync();
        var names = await ListAsync(server);
        Assert.Superset(
            new HashSet<string>
            {
                "partition.v1.EquilibriumService", "partition.v1.CatalogueService", "partition.v1.ActivityService", "grpc.health.v1.Health",
            },
            names.ToHashSet());
    }

    [Fact]
    public async Task Reflection_can_be_switched_off()
    {
        await using var server = await RunningServer.StartAsync(configure: options => options.Reflection = false);
        var exception = await Assert.ThrowsAsync<RpcException>(() => ListAsync(server));
        Assert.Equal(StatusCode.Unimplemented, exception.StatusCode);
    }

    private static async Task<List<string>> ListAsync(RunningServer server)
    {
        using var call = new ServerReflection.ServerReflectionClient(server.Channel).ServerReflectionInfo();
        await call.RequestStream.WriteAsync(new ServerReflectionRequest { ListServices = "" });
        await call.RequestStream.CompleteAsync();
        Assert.True(await call.ResponseStream.MoveNext(CancellationToken.None));
        return [.. call.ResponseStream.Current.ListServicesResponse.Service.Select(s => s.Name)];
    }
}
