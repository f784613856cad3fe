using System.Text.Json;
using Google.Protobuf.Reflection;

namespace PartitionService.Contracts.Tests;

/// <summary>The published retry policy matches services that exist; a misspelt name would match nothing without any notice.</summary>
public sealed class ServiceConfigTests
{
    private static readonly JsonElement[] Methods =
        [.. JsonDocument.Parse(ProtoFiles.ServiceConfig).RootElement.GetProperty("methodConfig").EnumerateArray()];

    private static IEnumerable<ServiceDescriptor> Services => ProtoFiles.Descriptors.SelectMany(d => d.Services);

    [Fact]
    public void Every_name_resolves()
    {
        foreach (var name in Methods.SelectMany(m => m.GetProperty("name").EnumerateArray()))
        {
            var service = Assert.Single(Services, s => s.FullName == name.GetProperty("service").GetString());
            if (name.TryGetProperty("method", out var method))
                Assert.NotNull(service.FindMethodByName(method.GetString()));
        }
    }

    [Fact]
    public void Every_service_is_covered() =>
        Assert.Equal(
            Services.Select(s => s.FullName).Order(),
            Methods.SelectMany(m => m.GetProperty("name").EnumerateArray()).Select(n => n.GetProperty("service").GetString()!).Distinct().Order());

    /// <summary>All calls are pure computations or look-ups, so that repeating them after UNAVAILABLE is safe; other errors would only recur.</summary>
    [Fact]
    public void Only_unavailability_is_retried_within_bounds()
    {
        var method = Assert.Single(Methods);
        var policy = method.GetProperty("retryPolicy");
        Assert.Equal("30s", method.GetProperty("timeout").GetString());
        Assert.Equal(4, policy.GetProperty("maxAttempts").GetInt32());
        Assert.Equal("0.1s", policy.GetProperty("initialBackoff").GetString());
        Assert.Equal("2s", policy.GetProperty("maxBackoff").GetString());
        Assert.Equal(2, policy.GetProperty("backoffMultiplier").GetDouble());
        Assert.Equal(["UNAVAILABLE"], policy.GetProperty("retryableStatusCodes").EnumerateArray().Select(c => c.GetString()));
    }
}
