using Grpc.Core;
using Microsoft.AspNetCore.Http;
using PartitionService.Server.Calls;

namespace PartitionService.HostileInput.Running;

/// <summary>The surroundings of a call that is made without a connection.</summary>
internal sealed class DirectCallContext : ServerCallContext
{
    private readonly Dictionary<object, object> userState = [];

    /// <summary>Makes the surroundings of one call of a method, by its path.</summary>
    public DirectCallContext(string path)
    {
        MethodCore = path;
        var http = new DefaultHttpContext();
        CallRecord.Start(http);
        // The key under which the framework looks for the request where a call has no connection.
        userState["__HttpContext"] = http;
    }

    protected override string MethodCore { get; }

    protected override string HostCore => "localhost";

    protected override string PeerCore => "ipv4:127.0.0.1:0";

    protected override DateTime DeadlineCore => DateTime.MaxValue;

    protected override Metadata RequestHeadersCore { get; } = [];

    protected override CancellationToken CancellationTokenCore => CancellationToken.None;

    protected override Metadata ResponseTrailersCore { get; } = [];

    protected override Status StatusCore { get; set; }

    protected override WriteOptions? WriteOptionsCore { get; set; }

    protected override AuthContext AuthContextCore { get; } = new(null, []);

    protected override IDictionary<object, object> UserStateCore => userState;

    protected override Task WriteResponseHeadersAsyncCore(Metadata responseHeaders) => Task.CompletedTask;

    protected override ContextPropagationToken CreatePropagationTokenCore(ContextPropagationOptions? options) =>
        throw new NotSupportedException();
}
