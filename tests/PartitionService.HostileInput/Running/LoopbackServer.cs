using Grpc.Core;
using Grpc.Net.Client;
using Microsoft.AspNetCore.Builder;
using PartitionService.Server;
using PartitionService.Server.Options;

namespace PartitionService.HostileInput.Running;

/// <summary>The real server on a free loopback port, with a channel that sends bytes as they are.</summary>
public sealed class LoopbackServer : IAsyncDisposable
{
    private static readonly TimeSpan Limit = TimeSpan.FromSeconds(30);

    private readonly WebApplication app;
    private readonly GrpcChannel channel;

    private LoopbackServer(WebApplication app)
    {
        this.app = app;
        Address = PartitionServer.BoundAddress(app);
        channel = GrpcChannel.ForAddress(Address, new GrpcChannelOptions { MaxSendMessageSize = null });
    }

    /// <summary>Where it listens.</summary>
    public Uri Address { get; }

    /// <summary>Starts a server.</summary>
    public static async Task<LoopbackServer> StartAsync()
    {
        var app = PartitionServer.Build([], options =>
        {
            options.Port = 0;
            options.LogOutput = LogOutput.None;
        });
        await app.StartAsync();
        return new LoopbackServer(app);
    }

    /// <summary>Sends bytes to a method.</summary>
    public async Task<Reply> CallAsync(string method, byte[] bytes)
    {
        try
        {
            var options = new CallOptions(deadline: DateTime.UtcNow + Limit);
            using var call = channel.CreateCallInvoker().AsyncUnaryCall(Methods.OnBytes(method), null, options, bytes);
            return Reply.Of(Methods.ResponseParser(method).ParseFrom(await call));
        }
        catch (RpcException refusal)
        {
            return Reply.Of(refusal);
        }
    }

    public async ValueTask DisposeAsync()
    {
        channel.Dispose();
        await app.DisposeAsync();
    }
}
