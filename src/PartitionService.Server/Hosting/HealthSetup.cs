using Microsoft.Extensions.Diagnostics.HealthChecks;
using PartitionService.Contracts.V1;

namespace PartitionService.Server.Hosting;

/// <summary>The standard gRPC health protocol: "liveness", "readiness", the server as a whole ("") and each service by its full name.</summary>
internal static class HealthSetup
{
    /// <summary>Adds the checks and maps them to names.</summary>
    public static void Add(IServiceCollection services)
    {
        string[] readyNames =
        [
            "",
            ReadinessCheck.Name,
            EquilibriumService.Descriptor.FullName,
            CatalogueService.Descriptor.FullName,
            ActivityService.Descriptor.FullName,
        ];
        services
            .AddGrpcHealthChecks(options =>
            {
                options.Services.Clear();
                options.Services.Map(LivenessCheck.Name, context => context.Name == LivenessCheck.Name);
                foreach (var name in readyNames)
                    options.Services.Map(name, context => context.Name == ReadinessCheck.Name);
            })
            .AddCheck<LivenessCheck>(LivenessCheck.Name)
            .AddCheck<ReadinessCheck>(ReadinessCheck.Name);
        // Watchers hear of the first state at once and of changes within a few seconds; the defaults are 5 s and 30 s.
        services.Configure<HealthCheckPublisherOptions>(options =>
        {
            options.Delay = TimeSpan.Zero;
            options.Period = TimeSpan.FromSeconds(5);
        });
    }
}
