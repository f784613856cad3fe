using System.Runtime.CompilerServices;
using Grpc.Core;
using Grpc.Net.Client;
using Microsoft.Extensions.DependencyInjection;
using Microsoft.Extensions.Options;
using PartitionService.Client.Errors;
using PartitionService.Contracts.V1;

namespace PartitionService.Client;

/// <summary>Asks PartitionService where the elements of a vessel go and what its catalogue knows.</summary>
/// <remarks>
/// <para>Safe for use by several threads at once. Every call carries the default deadline, is repeated on UNAVAILABLE and fails
/// with a <see cref="PartitionException"/>; a cancelled token gives an <see cref="OperationCanceledException"/>.</para>
/// <para>Answers are equilibrium estimates for engineering work, not a permit to operate: read their remarks and cautions.</para>
/// </remarks>
public sealed class PartitionClient : IDisposable
{
    private readonly GrpcChannel? ownedChannel;
    private readonly TimeSpan deadline;
    private readonly EquilibriumService.EquilibriumServiceClient equilibrium;
    private readonly CatalogueService.CatalogueServiceClient catalogue;
    private readonly ActivityService.ActivityServiceClient activity;

    /// <summary>Makes a client on a call invoker that somebody else owns; dependency injection uses this constructor.</summary>
    /// <param name="callInvoker">Carries the calls; retries are its own affair.</param>
    /// <param name="options">Options; only <see cref="PartitionClientOptions.DefaultDeadline"/> matters here.</param>
    [ActivatorUtilitiesConstructor]
    public PartitionClient(CallInvoker callInvoker, IOptions<PartitionClientOptions> options)
        : this(callInvoker, (options ?? throw new ArgumentNullException(nameof(options))).Value.DefaultDeadline, null)
    {
    }

    private PartitionClient(CallInvoker callInvoker, TimeSpan deadline, GrpcChannel? ownedChannel)
    {
        ArgumentNullException.ThrowIfNull(callInvoker);
        this.deadline = deadline;
        this.ownedChannel = ownedChannel;
        equilibrium = new EquilibriumService.EquilibriumServiceClient(callInvoker);
        catalogue = new CatalogueService.CatalogueServiceClient(callInvoker);
        activity = new ActivityService.ActivityServiceClient(callInvoker);
    }

    /// <summary>Makes a client with a channel of its own. The connection is made by the first call.</summary>
    /// <param name="options">Address, deadline and attempts.</param>
    /// <returns>A client; dispose it to close the channel.</returns>
    /// <exception cref="ArgumentException">The options are not valid; the message lists every fault.</exception>
    public static PartitionClient Connect(PartitionClientOptions options)
    {
        ArgumentNullException.ThrowIfNull(options);
        var faults = options.FindFaults();
        if (faults.Count > 0)
            throw new ArgumentException(string.Join(" ", faults), nameof(options));
        var channel = GrpcChannel.ForAddress(
            options.Address!,
            new GrpcChannelOptions { ServiceConfig = RetryConfiguration.Create(options.MaximumAttempts) });
        return new PartitionClient(channel.CreateCallInvoker(), options.DefaultDeadline, channel);
    }

    /// <summary>Solves one vessel.</summary>
    /// <param name="vesselCase">The case; <see cref="Cases.VesselCaseBuilder"/> states one in a few lines.</param>
    /// <param name="cancellation">Gives the call up, also on the server.</param>
    /// <returns>Where every element goes, with remarks, cautions and the data used.</returns>
    /// <exception cref="InvalidCaseException">Fields are out of range or contradict; all violations are listed.</exception>
    /// <exception cref="UnsolvableCaseException">The case is valid but a condition cannot hold.</exception>
    /// <exception cref="PartitionException">Any other failure.</exception>
    public async Task<ChargeAnswer> SolveAsync(VesselCase vesselCase, CancellationToken cancellation = default)
    {
        ArgumentNullException.ThrowIfNull(vesselCase);
        var request = new SolveChargeRequest { VesselCase = vesselCase };
        var response = await CallAsync(options => equilibrium.SolveChargeAsync(request, options), cancellation).ConfigureAwait(false);
        return response.Answer;
    }

    /// <summary>Lists the liquid metals that may be a solvent, in ordinal order; pages are fetched as needed.</summary>
    /// <param name="cancellation">Ends the listing.</param>
    /// <returns>Solvents.</returns>
    /// <exception cref="PartitionException">A page could not be fetched.</exception>
    public IAsyncEnumerable<Solvent> ListSolventsAsync(CancellationToken cancellation = default) =>
        PageAsync(
            async (token, stop) =>
            {
                var request = new ListSolventsRequest { PageToken = token };
                var page = await CallAsync(options => catalogue.ListSolventsAsync(request, options), stop).ConfigureAwait(false);
                return (page.Solvents, page.NextPageToken);
            },
            cancellation);

    /// <summary>Lists the solutes of one solvent or of all; pages are fetched as needed.</summary>
    /// <param name="solvent">Element symbol of the solvent; null or empty: all solvents.</param>
    /// <param name="temperatureKelvin">Temperature for the values, in [500, 2500] K; null: the middle of each row's range.</param>
    /// <param name="cancellation">Ends the listing.</param>
    /// <returns>Solutes in ordinal order of solvent and element.</returns>
    /// <exception cref="PartitionException">A page could not be fetched.</exception>
    public IAsyncEnumerable<Solute> ListSolutesAsync(
        string? solvent = null, double? temperatureKelvin = null, CancellationToken cancellation = default) =>
        PageAsync(
            async (token, stop) =>
            {
                var request = new ListSolutesRequest { Solvent = solvent ?? "", PageToken = token };
                if (temperatureKelvin is { } kelvin)
                    request.TemperatureKelvin = kelvin;
                var page = await CallAsync(options => catalogue.ListSolutesAsync(request, options), stop).ConfigureAwait(false);
                return (page.Solutes, page.NextPageToken);
            },
            cancellation);

    /// <summary>Lists the slag families in ordinal order; pages are fetched as needed.</summary>
    /// <param name="cancellation">Ends the listing.</param>
    /// <returns>Slag families.</returns>
    /// <exception cref="PartitionException">A page could not be fetched.</exception>
    public IAsyncEnumerable<SlagFamily> ListSlagFamiliesAsync(CancellationToken cancellation = default) =>
        PageAsync(
            async (token, stop) =>
            {
                var request = new ListSlagFamiliesRequest { PageToken = token };
                var page = await CallAsync(options => catalogue.ListSlagFamiliesAsync(request, options), stop).ConfigureAwait(false);
                return (page.SlagFamilies, page.NextPageToken);
            },
            cancellation);

    /// <summary>Lists catalogue rows in the order of the catalogue; pages are fetched as needed.</summary>
    /// <param name="filter">Kind, slot prefix, element, temperature and page size; the page token is set here. Null: all rows.</param>
    /// <param name="cancellation">Ends the listing.</param>
    /// <returns>Rows with values, ranges and sources.</returns>
    /// <exception cref="PartitionException">A page could not be fetched.</exception>
    public IAsyncEnumerable<CatalogueDatum> ListDataAsync(ListDataRequest? filter = null, CancellationToken cancellation = default) =>
        PageAsync(
            async (token, stop) =>
            {
                var request = filter?.Clone() ?? new ListDataRequest();
                request.PageToken = token;
                var page = await CallAsync(options => catalogue.ListDataAsync(request, options), stop).ConfigureAwait(false);
                return (page.Data, page.NextPageToken);
            },
            cancellation);

    /// <summary>Explains one datum: every competing row with its sources, those that count first.</summary>
    /// <param name="slot">Slot or key, for example <c>metal/Cu/Pb</c> or <c>metal/Cu/Pb#2</c>.</param>
    /// <param name="temperatureKelvin">Temperature for the values, in [500, 2500] K; null: the middle of each row's range.</param>
    /// <param name="cancellation">Gives the call up.</param>
    /// <returns>The rows of the slot.</returns>
    /// <exception cref="UnknownDatumException">The catalogue has no such slot or key.</exception>
    /// <exception cref="PartitionException">Any other failure.</exception>
    public Task<ExplainDatumResponse> ExplainDatumAsync(
        string slot, double? temperatureKelvin = null, CancellationToken cancellation = default)
    {
        ArgumentNullException.ThrowIfNull(slot);
        var request = new ExplainDatumRequest { Slot = slot };
        if (temperatureKelvin is { } kelvin)
            request.TemperatureKelvin = kelvin;
        return CallAsync(options => catalogue.ExplainDatumAsync(request, options), cancellation);
    }

    /// <summary>Tells what the catalogue knows and how well: solutes in metals, oxides in slags, vapour species.</summary>
    /// <param name="kind">The table; unspecified: all tables.</param>
    /// <param name="cancellation">Gives the call up.</param>
    /// <returns>The tables with their counts by trust level.</returns>
    /// <exception cref="InvalidCaseException">There is no such table.</exception>
    /// <exception cref="PartitionException">Any other failure.</exception>
    public Task<GetCoverageResponse> GetCoverageAsync(
        CoverageKind kind = CoverageKind.Unspecified, CancellationToken cancellation = default)
    {
        var request = new GetCoverageRequest { Kind = kind };
        return CallAsync(options => catalogue.GetCoverageAsync(request, options), cancellation);
    }

    /// <summary>Converts an activity of a dilute solute between reference states.</summary>
    /// <param name="request">Solvent, solute, temperature in [500, 2500] K, activity in (0, 1e30] and both reference states.</param>
    /// <param name="cancellation">Gives the call up.</param>
    /// <returns>The activity in the other state, with the datum that was used.</returns>
    /// <exception cref="InvalidCaseException">Fields of the request are out of range; all violations are listed.</exception>
    /// <exception cref="UnknownDatumException">The catalogue lacks the pair and no ln gamma0 was sent.</exception>
    /// <exception cref="PartitionException">Any other failure.</exception>
    public Task<ConvertActivityCoefficientResponse> ConvertActivityCoefficientAsync(
        ConvertActivityCoefficientRequest request, CancellationToken cancellation = default)
    {
        ArgumentNullException.ThrowIfNull(request);
        return CallAsync(options => activity.ConvertActivityCoefficientAsync(request, options), cancellation);
    }

    /// <summary>Closes the channel where this client made it; a channel from dependency injection stays open.</summary>
    public void Dispose() => ownedChannel?.Dispose();

    private static async IAsyncEnumerable<TItem> PageAsync<TItem>(
        Func<string, CancellationToken, Task<(Google.Protobuf.Collections.RepeatedField<TItem> Items, string NextToken)>> fetch,
        [EnumeratorCancellation] CancellationToken cancellation)
    {
        var token = "";
        do
        {
            var (items, next) = await fetch(token, cancellation).ConfigureAwait(false);
            foreach (var item in items)
                yield return item;
            token = next;
        }
        while (token.Length > 0);
    }

    private async Task<TResponse> CallAsync<TResponse>(
        Func<CallOptions, AsyncUnaryCall<TResponse>> start, CancellationToken cancellation)
    {
        cancellation.ThrowIfCancellationRequested();
        var options = new CallOptions(deadline: DateTime.UtcNow + deadline, cancellationToken: cancellation);
        try
        {
            using var call = start(options);
            return await call.ResponseAsync.ConfigureAwait(false);
        }
        catch (RpcException failure) when (cancellation.IsCancellationRequested)
        {
            // The caller's own wish is not an error of the service, whichever status the race between both ended with.
            throw new OperationCanceledException("The call was cancelled by the caller.", failure, cancellation);
        }
        catch (RpcException failure)
        {
            throw PartitionErrorDecoder.Decode(failure);
        }
    }
}
