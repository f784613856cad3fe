using System.Globalization;
using System.Text.Json;
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
    public void Defaults_are_those_that_the_service_publishes()
    {
        var options = new PartitionClientOptions();
        using var published = JsonDocument.Parse(File.ReadAllText(Path.Combine(AppContext.BaseDirectory, "service_config.json")));
        var method = published.RootElement.GetProperty("methodConfig")[0];
        var policy = method.GetProperty("retryPolicy");

        Assert.Equal(Seconds(method, "timeout"), options.DefaultDeadline);
        Assert.Equal(policy.GetProperty("maxAttempts").GetInt32(), options.MaximumAttempts);
        Assert.Equal(Seconds(policy, "initialBackoff"), RetryConfiguration.InitialBackoff);
        Assert.Equal(Seconds(policy, "maxBackoff"), RetryConfiguration.MaximumBackoff);
        Assert.Equal(policy.GetProperty("backoffMultiplier").GetDouble(), RetryConfiguration.BackoffFactor);
    }

    [Fact]
    public void One_attempt_means_no_policy() => Assert.Null(Assert.Single(RetryConfiguration.Create(1).MethodConfigs).RetryPolicy);

    private static TimeSpan Seconds(JsonElement parent, string name) =>
        TimeSpan.FromSeconds(double.Parse(parent.GetProperty(name).GetString()!.TrimEnd('s'), CultureInfo.InvariantCulture));
}
