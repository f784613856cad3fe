using Microsoft.Extensions.Diagnostics.HealthChecks;
using Microsoft.Extensions.Hosting;
using PartitionService.Core.Catalogue;
using PartitionService.Server.Hosting;

namespace PartitionService.Server.Tests.Hosting;

public sealed class ReadinessCheckTests
{
    [Fact]
    public async Task Ready_until_the_stop_begins()
    {
        using var lifetime = new Lifetime();
        var check = new ReadinessCheck(CatalogueLoader.LoadEmbedded(), lifetime);
        Assert.Equal(HealthStatus.Healthy, (await check.CheckHealthAsync(new HealthCheckContext())).Status);
        lifetime.StopApplication();
        Assert.Equal(HealthStatus.Unhealthy, (await check.CheckHealthAsync(new HealthCheckContext())).Status);
    }

    private sealed class Lifetime : IHostApplicationLifetime, IDisposable
    {
        private readonly CancellationTokenSource stopping = new();

        public CancellationToken ApplicationStarted => CancellationToken.None;

        public CancellationToken ApplicationStopping => stopping.Token;

        public CancellationToken ApplicationStopped => CancellationToken.None;

        public void StopApplication() => stopping.Cancel();

        public void Dispose() => stopping.Dispose();
    }
}
