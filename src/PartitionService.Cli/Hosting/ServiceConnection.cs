using Microsoft.AspNetCore.Builder;
using Microsoft.Extensions.DependencyInjection;
using Microsoft.Extensions.Hosting;
using Microsoft.Extensions.Logging;
using PartitionService.Client;
using PartitionService.Server;
using PartitionService.Server.Options;

namespace PartitionService.Cli.Hosting;

/// <summary>A client with the service that it talks to, where that runs inside this process.</summary>
internal sealed class ServiceConnection : IAsyncDisposable
{
    private readonly WebApplication? ownedServer;

    private ServiceConnection(PartitionClient client, WebApplication? ownedServer)
    {
        Client = client;
        this.ownedServer = ownedServer;
    }

    /// <summary>The client.</summary>
    public PartitionClient Client { get; }

    /// <summary>Opens a connection.</summary>
    /// <param name="address">Address of a running service; null: start one inside this process, on loopback.</param>
    /// <param name="deadline">Deadline of each call.</param>
    /// <param name="cancellation">Stops the start.</param>
    /// <returns>The connection; dispose it to close the client and to stop the service.</returns>
    public static async Task<ServiceConnection> OpenAsync(Uri? address, TimeSpan deadline, CancellationToken cancellation)
    {
        var server = address is null ? await StartServerAsync(cancellation).ConfigureAwait(false) : null;
        var options = new PartitionClientOptions { Address = address ?? PartitionServer.BoundAddress(server!), DefaultDeadline = deadline };
        return new ServiceConnection(PartitionClient.Connect(options), server);
    }

    /// <summary>Closes the client and stops the service.</summary>
    public async ValueTask DisposeAsync()
    {
        Client.Dispose();
        if (ownedServer is not null)
            await ownedServer.DisposeAsync().ConfigureAwait(false);
    }

    private static async Task<WebApplication> StartServerAsync(CancellationToken cancellation)
    {
        var server = PartitionServer.Build([], Settings, host => host.Services.AddSingleton<IHostLifetime, NoLifetime>());
        await server.StartAsync(cancellation).ConfigureAwait(false);
        return server;
    }

    /// <summary>The last word on every setting that would open the service to others or write between the results.</summary>
    private static void Settings(ServerOptions settings)
    {
        settings.ListenAddress = "127.0.0.1";
        settings.Port = 0;
        settings.Reflection = false;
        settings.LogOutput = LogOutput.None;
        settings.LogLevel = LogLevel.None;
    }

    /// <summary>Leaves signals alone: Ctrl-C belongs to the tool, which ends the call and then the service.</summary>
    private sealed class NoLifetime : IHostLifetime
    {
        public Task WaitForStartAsync(CancellationToken cancellationToken) => Task.CompletedTask;

        public Task StopAsync(CancellationToken cancellationToken) => Task.CompletedTask;
    }
}
