using Microsoft.Extensions.DependencyInjection;
using Microsoft.Extensions.Options;

namespace PartitionService.Client;

/// <summary>Registers <see cref="PartitionClient"/> for dependency injection.</summary>
public static class PartitionClientServiceCollectionExtensions
{
    /// <summary>Registers the client with the gRPC client factory, which shares and renews connections.</summary>
    /// <param name="services">Services of the host.</param>
    /// <param name="configure">Sets address, deadline and attempts; faults show at host start or first use.</param>
    /// <returns>A builder for further settings of the HTTP client, for example certificates.</returns>
    public static IHttpClientBuilder AddPartitionClient(this IServiceCollection services, Action<PartitionClientOptions> configure)
    {
        ArgumentNullException.ThrowIfNull(services);
        ArgumentNullException.ThrowIfNull(configure);
        services.AddSingleton<IValidateOptions<PartitionClientOptions>, OptionsFaults>();
        services.AddOptions<PartitionClientOptions>().Configure(configure).ValidateOnStart();
        return services
            .AddGrpcClient<PartitionClient>((provider, factory) =>
                factory.Address = provider.GetRequiredService<IOptions<PartitionClientOptions>>().Value.Address)
            .ConfigureChannel((provider, channel) => channel.ServiceConfig =
                RetryConfiguration.Create(provider.GetRequiredService<IOptions<PartitionClientOptions>>().Value.MaximumAttempts));
    }

    private sealed class OptionsFaults : IValidateOptions<PartitionClientOptions>
    {
        public ValidateOptionsResult Validate(string? name, PartitionClientOptions options)
        {
            var faults = options.FindFaults();
            return faults.Count == 0 ? ValidateOptionsResult.Success : ValidateOptionsResult.Fail(faults);
        }
    }
}
