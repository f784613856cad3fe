using Grpc.Core;
using Grpc.Net.Client.Configuration;

namespace PartitionService.Client;

/// <summary>The gRPC service config of the client: what is repeated, how often and after which wait.</summary>
public static class RetryConfiguration
{
    /// <summary>Wait before the first repetition; gRPC draws the actual wait at random around it.</summary>
    public static TimeSpan InitialBackoff { get; } = TimeSpan.FromSeconds(0.1);

    /// <summary>Longest wait before a repetition.</summary>
    public static TimeSpan MaximumBackoff { get; } = TimeSpan.FromSeconds(2);

    /// <summary>Factor by which each wait exceeds the one before.</summary>
    public static double BackoffFactor => 2;

    /// <summary>Makes the service config for a number of attempts.</summary>
    /// <param name="maximumAttempts">Attempts in all, in [1, 5]; 1 gives a config without retries.</param>
    /// <returns>A config that applies to every method of every service.</returns>
    public static ServiceConfig Create(int maximumAttempts)
    {
        var everyMethod = new MethodConfig { Names = { MethodName.Default } };
        // gRPC refuses a policy with one attempt, so that "no retries" is the absence of a policy.
        if (maximumAttempts > 1)
        {
            everyMethod.RetryPolicy = new RetryPolicy
            {
                MaxAttempts = maximumAttempts,
                InitialBackoff = InitialBackoff,
                MaxBackoff = MaximumBackoff,
                BackoffMultiplier = BackoffFactor,
                // Only UNAVAILABLE says that nothing was computed; any other failure would fail again at the same cost.
                RetryableStatusCodes = { StatusCode.Unavailable },
            };
        }

        return new ServiceConfig { MethodConfigs = { everyMethod } };
    }
}
