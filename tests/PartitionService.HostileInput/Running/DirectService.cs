using Google.Protobuf;
using Grpc.Core;
using Microsoft.Extensions.Logging.Abstractions;
using PartitionService.Contracts.V1;
using PartitionService.Core.Catalogue;
using PartitionService.Core.Equilibrium;
using PartitionService.Server.Calls;
using PartitionService.Server.Errors;
using PartitionService.Server.Options;
using PartitionService.Server.Services;

namespace PartitionService.HostileInput.Running;

/// <summary>The classes of the service behind the one place that turns exceptions into statuses, without a connection.</summary>
internal sealed class DirectService : IDisposable
{
    private readonly EquilibriumGrpcService equilibrium;
    private readonly CatalogueGrpcService catalogueService;
    private readonly ActivityGrpcService activity;
    private readonly ErrorInterceptor errors;
    private readonly SolutionGate gate;

    public DirectService()
    {
        var options = new ServerOptions();
        var catalogue = CatalogueLoader.LoadEmbedded();
        gate = new SolutionGate(options);
        equilibrium = new EquilibriumGrpcService(new EquilibriumSolver(catalogue).Solve, catalogue, gate);
        catalogueService = new CatalogueGrpcService(catalogue);
        activity = new ActivityGrpcService(catalogue);
        errors = new ErrorInterceptor(options, NullLogger<ErrorInterceptor>.Instance);
    }

    /// <summary>Sends bytes to a method; null where they are no message of that method, which never reaches the service.</summary>
    public async Task<Reply?> CallAsync(string method, byte[] bytes)
    {
        try
        {
            return await CallAsync(method, Methods.RequestParser(method).ParseFrom(bytes));
        }
        catch (InvalidProtocolBufferException)
        {
            return null;
        }
    }

    /// <summary>Page tokens that the service issues for some lists.</summary>
    public async Task<IReadOnlyList<string>> IssueTokensAsync()
    {
        var lists = new (string Method, IMessage Request)[]
        {
            ("ListSolvents", new ListSolventsRequest { PageSize = 1 }),
            ("ListSolutes", new ListSolutesRequest { Solvent = "Cu", TemperatureKelvin = 1500, PageSize = 10 }),
            ("ListData", new ListDataRequest { PageSize = 1 }),
            ("ListSlagFamilies", new ListSlagFamiliesRequest { PageSize = 2 }),
        };
        var tokens = new List<string>();
        foreach (var (method, request) in lists)
        {
            var answer = (await CallAsync(method, request)).Answer!;
            tokens.Add((string)answer.Descriptor.FindFieldByName("next_page_token").Accessor.GetValue(answer));
        }

        return tokens;
    }

    public void Dispose() => gate.Dispose();

    private Task<Reply> CallAsync(string method, IMessage request) => request switch
    {
        SolveChargeRequest sent => ThroughAsync(method, sent, equilibrium.SolveCharge),
        ListSolventsRequest sent => ThroughAsync(method, sent, catalogueService.ListSolvents),
        ListSolutesRequest sent => ThroughAsync(method, sent, catalogueService.ListSolutes),
        ListSlagFamiliesRequest sent => ThroughAsync(method, sent, catalogueService.ListSlagFamilies),
        ListDataRequest sent => ThroughAsync(method, sent, catalogueService.ListData),
        GetCoverageRequest sent => ThroughAsync(method, sent, catalogueService.GetCoverage),
        ExplainDatumRequest sent => ThroughAsync(method, sent, catalogueService.ExplainDatum),
        ConvertActivityCoefficientRequest sent => ThroughAsync(method, sent, activity.ConvertActivityCoefficient),
        _ => throw new ArgumentOutOfRangeException(nameof(method), method, "no such method here yet"),
    };

    private async Task<Reply> ThroughAsync<TRequest, TResponse>(
        string method, TRequest request, UnaryServerMethod<TRequest, TResponse> handler)
        where TRequest : class, IMessage
        where TResponse : class, IMessage
    {
        Exception? thrown = null;
        try
        {
            return Reply.Of(await errors.UnaryServerHandler(request, new DirectCallContext(Methods.Path(method)), Watched));
        }
        catch (RpcException refusal)
        {
            return Reply.Of(refusal, thrown is ServiceException or OperationCanceledException ? null : thrown);
        }

        async Task<TResponse> Watched(TRequest sent, ServerCallContext context)
        {
            try
            {
                return await handler(sent, context);
            }
            catch (Exception exception)
            {
                thrown = exception;
                throw;
            }
        }
    }
}
