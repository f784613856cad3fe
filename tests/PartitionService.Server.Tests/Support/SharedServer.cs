namespace PartitionService.Server.Tests.Support;

/// <summary>One server for the tests of a class that only read.</summary>
public sealed class SharedServer : IAsyncLifetime
{
    public RunningServer Server { get; private set; } = null!;

    public async Task InitializeAsync() => Server = await RunningServer.StartAsync();

    public async Task DisposeAsync() => await Server.DisposeAsync();
}
