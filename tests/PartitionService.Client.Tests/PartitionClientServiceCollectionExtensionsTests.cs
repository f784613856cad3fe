using Grpc.Core;
using Microsoft.Extensions.DependencyInjection;
using Microsoft.Extensions.Options;
using PartitionService.Client.Cases;
using PartitionService.Client.Errors;
using PartitionService.Client.Tests.Serving;
using PartitionService.Contracts.V1;

namespace PartitionService.Client.Tests;

public sealed class PartitionClientServiceCollectionExtensionsTests
{
    private static readonly VesselCase AnyCase = VesselCaseBuilder.Named("a case").At(1500).Charge("Cu", 1).ClosedOxygenBalance().Build();

    [Fact]
    public async Task Injected_clients_retry_as_well()
    {
        var script = new LoopbackService.Script
        {
            Solve = (_, call, _) => call <= 2 ? throw new RpcException(new Status(StatusCode.Unavailable, "scripted")) : Task.FromResult(new ChargeAnswer { Name = "third" }),
        };
        await using var service = await LoopbackService.StartAsync(script);
        await using var provider = new ServiceCollection().AddPartitionClient(service.Address).BuildServiceProvider();

        Assert.Equal("third", (await provider.GetRequiredService<PartitionClient>().SolveAsync(AnyCase)).Name);
        Assert.Equal(3, script.Calls);
    }

    [Fact]
    public async Task Injected_clients_keep_to_the_configured_deadline()
    {
        var script = new LoopbackService.Script
        {
            Solve = async (_, _, context) =>
            {
                await Task.Delay(Timeout.Infinite, context.CancellationToken);
                return new ChargeAnswer();
            },
        };
        await using var service = await LoopbackService.StartAsync(script);
        await using var provider = new ServiceCollection()
            .AddPartitionClient(service.Address, options => options.DefaultDeadline = TimeSpan.FromSeconds(0.2)).BuildServiceProvider();

        await Assert.ThrowsAsync<PartitionTimeoutException>(() => provider.GetRequiredService<PartitionClient>().SolveAsync(AnyCase));
    }

    [Fact]
    public void Bad_options_are_told_on_first_use()
    {
        using var provider = new ServiceCollection().AddPartitionClient(null, options => options.MaximumAttempts = 9).BuildServiceProvider();

        var fault = Assert.Throws<OptionsValidationException>(() => provider.GetRequiredService<PartitionClient>());

        Assert.Equal(["Address is required, for example http://localhost:5080.", "MaximumAttempts must be in [1, 5], but is 9."], fault.Failures);
    }
}

file static class Registration
{
    public static IServiceCollection AddPartitionClient(this IServiceCollection services, Uri? address, Action<PartitionClientOptions>? more = null)
    {
        services.AddPartitionClient(options =>
        {
            options.Address = address;
            more?.Invoke(options);
        });
        return services;
    }
}
