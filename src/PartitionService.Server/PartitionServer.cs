using System.Net;
using Microsoft.AspNetCore.Hosting.Server;
using Microsoft.AspNetCore.Hosting.Server.Features;
using Microsoft.AspNetCore.Server.Kestrel.Core;
using Microsoft.Extensions.Options;
using PartitionService.Core.Catalogue;
using PartitionService.Core.Equilibrium;
using PartitionService.Server.Calls;
using PartitionService.Server.Errors;
using PartitionService.Server.Hosting;
using PartitionService.Server.Log;
using PartitionService.Server.Options;
using PartitionService.Server.Services;

namespace PartitionService.Server;

/// <summary>Builds the server: the same for the program, for a host in the same process and for tests.</summary>
public static class PartitionServer
{
    /// <summary>Builds a server that is ready to start.</summary>
    /// <param name="args">Command line in the form <c>--Partition:Port=5080</c>; overrides environment and files.</param>
    /// <param name="configure">Last word on the settings; null: none.</param>
    /// <param name="customise">Last word on services and logging, for tests and embedding hosts; null: none.</param>
    /// <returns>The server; call <c>StartAsync</c>, then <see cref="BoundAddress"/>.</returns>
    /// <exception cref="OptionsValidationException">A setting is bad; every bad one is named with its value and what is allowed.</exception>
    /// <exception cref="CatalogueException">The embedded catalogue is not acceptable.</exception>
    public static WebApplication Build(
        string[] args, Action<ServerOptions>? configure = null, Action<WebApplicationBuilder>? customise = null)
    {
        // Settings lie beside the program, not in whatever directory a host happens to run in.
        var builder = WebApplication.CreateBuilder(new WebApplicationOptions { Args = args, ContentRootPath = AppContext.BaseDirectory });
        var options = ServerOptionsReader.Read(builder.Configuration, configure);
        var catalogue = CatalogueLoader.LoadEmbedded();
        Listen(builder, options);
        AddServices(builder.Services, options, catalogue);
        customise?.Invoke(builder);

        var app = builder.Build();
        app.UseMiddleware<CallMiddleware>();
        app.MapGrpcService<EquilibriumGrpcService>();
        app.MapGrpcService<CatalogueGrpcService>();
        app.MapGrpcService<ActivityGrpcService>();
        app.MapGrpcHealthChecksService();
        var reflection = options.ServesReflection(app.Environment.IsDevelopment());
        if (reflection)
            app.MapGrpcReflectionService();
        LogLife(app, catalogue, reflection);
        return app;
    }

    /// <summary>Address that a started server listens on, with the port that the system chose where it was 0.</summary>
    /// <param name="app">A started server.</param>
    /// <returns>For example <c>http://127.0.0.1:5080</c>.</returns>
    /// <exception cref="InvalidOperationException">The server was not started.</exception>
    public static Uri BoundAddress(WebApplication app)
    {
        ArgumentNullException.ThrowIfNull(app);
        var addresses = app.Services.GetRequiredService<IServer>().Features.Get<IServerAddressesFeature>()?.Addresses;
        return addresses?.FirstOrDefault() is { } address && !address.EndsWith(":0", StringComparison.Ordinal)
            ? new Uri(address)
            : throw new InvalidOperationException("The server was not started.");
    }

    private static void Listen(WebApplicationBuilder builder, ServerOptions options) =>
        builder.WebHost.ConfigureKestrel(kestrel =>
        {
            kestrel.AddServerHeader = false;
            // Clear text without negotiation: HTTP/2 is the only protocol of the port.
            kestrel.Listen(new IPEndPoint(options.Address, options.Port), listen => listen.Protocols = HttpProtocols.Http2);
        });

    private static void AddServices(IServiceCollection services, ServerOptions options, ThermochemicalCatalogue catalogue)
    {
        LogSetup.Add(services, options);
        services.AddSingleton(options);
        services.AddSingleton(catalogue);
        services.AddSingleton<EquilibriumSolver>();
        services.AddSingleton<VesselSolve>(provider => provider.GetRequiredService<EquilibriumSolver>().Solve);
        services.AddSingleton<SolutionGate>();
        services.AddGrpc(grpc =>
        {
            grpc.MaxReceiveMessageSize = options.MaxReceiveMessageBytes;
            grpc.CompressionProviders =
            [
                new BoundedCompression(BoundedCompression.Gzip, options.MaxReceiveMessageBytes),
                new BoundedCompression(BoundedCompression.Deflate, options.MaxReceiveMessageBytes),
            ];
            grpc.EnableDetailedErrors = false;
            grpc.Interceptors.Add<ErrorInterceptor>();
        });
        services.AddGrpcReflection();
        HealthSetup.Add(services);
    }

    private static void LogLife(WebApplication app, ThermochemicalCatalogue catalogue, bool reflection)
    {
        app.Lifetime.ApplicationStarted.Register(() =>
        {
            var address = BoundAddress(app);
            ServerLog.Listening(app.Logger, address, catalogue.Digest, reflection);
        });
        app.Lifetime.ApplicationStopping.Register(() => ServerLog.Stopping(app.Logger));
    }
}
