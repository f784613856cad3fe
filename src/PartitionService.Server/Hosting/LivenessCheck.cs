using Microsoft.Extensions.Diagnostics.HealthChecks;

namespace PartitionService.Server.Hosting;

/// <summary>Alive as long as the process answers.</summary>
internal sealed class LivenessCheck : IHealthCheck
{
    /// <summary>Name of the check.</summary>
    public const string Name = "liveness";

    /// <inheritdoc/>
    public Task<HealthCheckResult> CheckHealthAsync(HealthCheckContext context, CancellationToken cancellationToken = default) =>
        Task.FromResult(HealthCheckResult.Healthy());
}
