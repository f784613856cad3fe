using Microsoft.Extensions.Diagnostics.HealthChecks;
using PartitionService.Core.Catalogue;

namespace PartitionService.Server.Hosting;

/// <summary>Ready while the catalogue is loaded and the server does not stop.</summary>
internal sealed class ReadinessCheck(ThermochemicalCatalogue catalogue, IHostApplicationLifetime lifetime) : IHealthCheck
{
    /// <summary>Name of the check.</summary>
    public const string Name = "readiness";

    /// <inheritdoc/>
    public Task<HealthCheckResult> CheckHealthAsync(HealthCheckContext context, CancellationToken cancellationToken = default) =>
        Task.FromResult(lifetime.ApplicationStopping.IsCancellationRequested
            ? HealthCheckResult.Unhealthy("stopping")
            : HealthCheckResult.Healthy($"catalogue {catalogue.Digest} loaded"));
}
