using PartitionService.Client;

namespace PartitionService.Cli.Hosting;

/// <summary>A client with the service that it talks to, where that runs inside this process.</summary>
internal sealed class ServiceConnection : IAsyncDisposable
{
    private ServiceConnection(PartitionClient client) => Client = client;

    /// <summary>The client.</summary>
    public PartitionClient Client { get; }

    /// <summary>Opens a connection.</summary>
    /// <param name="address">Address of a running service; null: start one inside this process, on loopback.</param>
    /// <param name="deadline">Deadline of each call.</param>
    /// <param name="cancellation">Stops the start.</param>
    /// <returns>The connection; dispose it to close the client and to stop the service.</returns>
    public static Task<ServiceConnection> OpenAsync(Uri? address, TimeSpan deadline, CancellationToken cancellation)
    {
        cancellation.ThrowIfCancellationRequested();
        var options = new PartitionClientOptions { Address = address, DefaultDeadline = deadline };
        return Task.FromResult(new ServiceConnection(PartitionClient.Connect(options)));
    }

    /// <summary>Closes the client and stops the service.</summary>
    public ValueTask DisposeAsync()
    {
        Client.Dispose();
        return ValueTask.CompletedTask;
    }
}
