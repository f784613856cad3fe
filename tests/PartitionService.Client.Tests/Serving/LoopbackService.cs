using Grpc.Core;
using Microsoft.AspNetCore.Builder;
using Microsoft.AspNetCore.Hosting;
using Microsoft.AspNetCore.Hosting.Server;
using Microsoft.AspNetCore.Hosting.Server.Features;
using Microsoft.AspNetCore.Server.Kestrel.Core;
using Microsoft.Extensions.DependencyInjection;
using Microsoft.Extensions.Logging;
using PartitionService.Contracts.V1;

namespace PartitionService.Client.Tests.Serving;

/// <summary>A real gRPC server on loopback whose answers the test writes, so that retries and deadlines cross a real connection.</summary>
internal sealed class LoopbackService : IAsyncDisposable
{
    private readonly WebApplication app;

    private LoopbackService(WebApplication app) => this.app = app;

    public Uri Address => new(app.Services.GetRequiredService<IServer>().Features.Get<IServerAddressesFeature>()!.Addresses.Single());

    public static async Task<LoopbackService> StartAsync(Script script)
    {
        var builder = WebApplication.CreateSlimBuilder();
        builder.Logging.ClearProviders();
        builder.WebHost.ConfigureKestrel(kestrel => kestrel.Listen(System.Net.IPAddress.Loopback, 0, listen => listen.Protocols = HttpProtocols.Http2));
        builder.Services.AddSingleton(script);
        builder.Services.AddGrpc();
        var app = builder.Build();
        app.MapGrpcService<Equilibrium>();
        app.MapGrpcService<Catalogue>();
        app.MapGrpcService<Activity>();
        await app.StartAsync();
        return new LoopbackService(app);
    }

    public ValueTask DisposeAsync() => app.DisposeAsync();

    /// <summary>What the server answers, and how often it was asked.</summary>
    internal sealed class Script
    {
        private int calls;

        public int Calls => calls;

        public Func<SolveChargeRequest, int, ServerCallContext, Task<ChargeAnswer>>? Solve { get; init; }

        public Func<Google.Protobuf.IMessage, Google.Protobuf.IMessage>? Other { get; init; }

        public int Count() => Interlocked.Increment(ref calls);

        public Task<T> Answer<T>(Google.Protobuf.IMessage request)
        {
            Count();
            return Task.FromResult((T)Other!(request));
        }
    }

    internal sealed class Equilibrium(Script script) : EquilibriumService.EquilibriumServiceBase
    {
        public override async Task<SolveChargeResponse> SolveCharge(SolveChargeRequest request, ServerCallContext context) =>
            new() { Answer = await script.Solve!(request, script.Count(), context) };
    }

    internal sealed class Catalogue(Script script) : CatalogueService.CatalogueServiceBase
    {
        public override Task<ListSolventsResponse> ListSolvents(ListSolventsRequest request, ServerCallContext context) => script.Answer<ListSolventsResponse>(request);

        public override Task<ListSolutesResponse> ListSolutes(ListSolutesRequest request, ServerCallContext context) => script.Answer<ListSolutesResponse>(request);

        public override Task<ListSlagFamiliesResponse> ListSlagFamilies(ListSlagFamiliesRequest request, ServerCallContext context) => script.Answer<ListSlagFamiliesResponse>(request);

        public override Task<ListDataResponse> ListData(ListDataRequest request, ServerCallContext context) => script.Answer<ListDataResponse>(request);

        public override Task<GetCoverageResponse> GetCoverage(GetCoverageRequest request, ServerCallContext context) => script.Answer<GetCoverageResponse>(request);

        public override Task<ExplainDatumResponse> ExplainDatum(ExplainDatumRequest request, ServerCallContext context) => script.Answer<ExplainDatumResponse>(request);
    }

    internal sealed class Activity(Script script) : ActivityService.ActivityServiceBase
    {
        public override Task<ConvertActivityCoefficientResponse> ConvertActivityCoefficient(ConvertActivityCoefficientRequest request, ServerCallContext context) =>
            script.Answer<ConvertActivityCoefficientResponse>(request);
    }
}
