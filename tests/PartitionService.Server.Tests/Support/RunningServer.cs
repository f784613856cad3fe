using Grpc.Net.Client;
using Microsoft.AspNetCore.Builder;
using Microsoft.Extensions.DependencyInjection;
using PartitionService.Contracts.V1;
using PartitionService.Server.Hosting;
using PartitionService.Server.Options;
using Serilog.Core;
using Serilog.Events;

namespace PartitionService.Server.Tests.Support;

/// <summary>The real server on a free loopback port with a channel to it; its log events are kept.</summary>
public sealed class RunningServer : IAsyncDisposable
{
    private readonly LogKeeper keeper;

    private RunningServer(WebApplication app, LogKeeper keeper)
    {
        App = app;
        this.keeper = keeper;
        Address = PartitionServer.BoundAddress(app);
        Channel = GrpcChannel.ForAddress(Address);
    }

    public WebApplication App { get; }

    public Uri Address { get; }

    public GrpcChannel Channel { get; }

    public EquilibriumService.EquilibriumServiceClient Equilibrium => new(Channel);

    public CatalogueService.CatalogueServiceClient Catalogue => new(Channel);

    public ActivityService.ActivityServiceClient Activity => new(Channel);

    public IReadOnlyList<LogEvent> Logs => keeper.Events;

    /// <summary>Starts a server; a replaced solution stands in where a test needs an outcome that real cases reach only by a fault.</summary>
    public static async Task<RunningServer> StartAsync(VesselSolve? solve = null, Action<ServerOptions>? configure = null)
    {
        var keeper = new LogKeeper();
        var app = PartitionServer.Build(
            [],
            options =>
            {
                options.Port = 0;
                options.LogOutput = LogOutput.None;
                configure?.Invoke(options);
            },
            builder =>
            {
                builder.Services.AddSingleton<ILogEventSink>(keeper);
                if (solve is not null)
                    builder.Services.AddSingleton(solve);
            });
        await app.StartAsync();
        return new RunningServer(app, keeper);
    }

    /// <summary>The event of a call, which is written a moment after the caller has the answer.</summary>
    public async Task<LogEvent> CallEventAsync(string requestId)
    {
        for (var attempt = 0; attempt < 800; attempt++)
        {
            var found = Logs.SingleOrDefault(e => LogText.Id(e) is 2001 or 2002 && LogText.Of(e, "RequestId") == requestId);
            if (found is not null)
                return found;
            await Task.Delay(25);
        }

        throw new InvalidOperationException($"no event for {requestId} among: {string.Concat(Logs.Select(LogText.Json))}");
    }

    public async ValueTask DisposeAsync()
    {
        Channel.Dispose();
        await App.DisposeAsync();
    }

    private sealed class LogKeeper : ILogEventSink
    {
        private readonly List<LogEvent> events = [];

        public IReadOnlyList<LogEvent> Events
        {
            get
            {
                lock (events)
                    return [.. events];
            }
        }

        public void Emit(LogEvent logEvent)
        {
            lock (events)
                events.Add(logEvent);
        }
    }
}
