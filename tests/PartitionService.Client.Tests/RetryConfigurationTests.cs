using Grpc.Core;
using Grpc.Net.Client.Configuration;

namespace PartitionService.Client.Tests;

public sealed class RetryConfigurationTests
{
    [Fact]
    public void Repeats_every_method_on_unavailable_only()
    {
        var method = Assert.Single(RetryConfiguration.Create(4).MethodConfigs);

        Assert.Equal(MethodName.Default, Assert.Single(method.Names));
        Assert.Equal(4, method.RetryPolicy!.MaxAttempts);
        Assert.Equal(TimeSpan.FromSeconds(0.1), method.RetryPolicy.InitialBackoff);
        Assert.Equal(TimeSpan.FromSeconds(2), method.RetryPolicy.MaxBackoff);
        Assert.Equal(2, method.RetryPolicy.BackoffMultiplier);
        Assert.Equal(StatusCode.Unavailable, Assert.Single(method.RetryPolicy.RetryableStatusCodes));
    }

    [Fact]
    public void One_attempt_means_no_policy() => Assert.Null(Assert.Single(RetryConfiguration.Create(1).MethodConfigs).RetryPolicy);
}
