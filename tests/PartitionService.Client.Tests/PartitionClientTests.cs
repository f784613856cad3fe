using Google.Protobuf;
using Grpc.Core;
using PartitionService.Client.Cases;
using PartitionService.Client.Errors;
using PartitionService.Client.Tests.Serving;
using PartitionService.Contracts.V1;

namespace PartitionService.Client.Tests;

public sealed class PartitionClientTests
{
    private static readonly VesselCase AnyCase = VesselCaseBuilder.Named("a case").At(1500).Charge("Cu", 1).ClosedOxygenBalance().Build();

    [Fact]
    public async Task Sends_the_case_and_returns_the_answer()
    {
        VesselCase? received = null;
        var script = new LoopbackService.Script
        {
            Solve = (request, _, _) =>
            {
                received = request.VesselCase;
                return Task.FromResult(new ChargeAnswer { Name = request.VesselCase.Name });
            },
        };
        await using var service = await LoopbackService.StartAsync(script);
        using var client = Connect(service);

        var answer = await client.SolveAsync(AnyCase);

        Assert.Equal("a case", answer.Name);
        Assert.Equal(AnyCase, received);
    }

    [Fact]
    public async Task Repeats_a_call_that_fails_twice_as_unavailable()
    {
        var script = Failing(StatusCode.Unavailable, failures: 2);
        await using var service = await LoopbackService.StartAsync(script);
        using var client = Connect(service);

        Assert.Equal("third", (await client.SolveAsync(AnyCase)).Name);
        Assert.Equal(3, script.Calls);
    }

    [Fact]
    public async Task Gives_up_after_four_attempts()
    {
        var script = Failing(StatusCode.Unavailable, failures: int.MaxValue);
        await using var service = await LoopbackService.StartAsync(script);
        using var client = Connect(service);

        await Assert.ThrowsAsync<PartitionUnavailableException>(() => client.SolveAsync(AnyCase));
        Assert.Equal(4, script.Calls);
    }

    [Theory]
    [InlineData(StatusCode.Internal)]
    [InlineData(StatusCode.InvalidArgument)]
    [InlineData(StatusCode.ResourceExhausted)]
    public async Task Does_not_repeat_what_would_fail_again(StatusCode status)
    {
        var script = Failing(status, failures: int.MaxValue);
        await using var service = await LoopbackService.StartAsync(script);
        using var client = Connect(service);

        await Assert.ThrowsAnyAsync<PartitionException>(() => client.SolveAsync(AnyCase));
        Assert.Equal(1, script.Calls);
    }

    [Fact]
    public async Task A_service_that_is_not_there_is_unavailable()
    {
        Uri address;
        await using (var service = await LoopbackService.StartAsync(new LoopbackService.Script()))
            address = service.Address;
        using var client = PartitionClient.Connect(new PartitionClientOptions { Address = address, MaximumAttempts = 1 });

        var fault = await Assert.ThrowsAsync<PartitionUnavailableException>(() => client.SolveAsync(AnyCase));

        Assert.Equal(StatusCode.Unavailable, fault.StatusCode);
    }

    [Fact]
    public async Task Gives_every_call_the_default_deadline()
    {
        var remaining = TimeSpan.Zero;
        var script = new LoopbackService.Script
        {
            Solve = (_, _, context) =>
            {
                remaining = context.Deadline - DateTime.UtcNow;
                return Task.FromResult(new ChargeAnswer());
            },
        };
        await using var service = await LoopbackService.StartAsync(script);
        using var client = Connect(service);

        await client.SolveAsync(AnyCase);

        Assert.InRange(remaining, TimeSpan.FromSeconds(10), TimeSpan.FromSeconds(30));
    }

    [Fact]
    public async Task A_deadline_that_passes_is_told_as_such()
    {
        await using var service = await LoopbackService.StartAsync(NeverAnswering());
        using var client = PartitionClient.Connect(new PartitionClientOptions { Address = service.Address, DefaultDeadline = TimeSpan.FromSeconds(0.2) });

        var fault = await Assert.ThrowsAsync<PartitionTimeoutException>(() => client.SolveAsync(AnyCase));

        Assert.Equal(StatusCode.DeadlineExceeded, fault.StatusCode);
    }

    [Fact]
    public async Task A_cancelled_token_is_not_an_error_of_the_service()
    {
        await using var service = await LoopbackService.StartAsync(NeverAnswering());
        using var client = Connect(service);
        using var cancel = new CancellationTokenSource(TimeSpan.FromSeconds(0.2));

        await Assert.ThrowsAnyAsync<OperationCanceledException>(() => client.SolveAsync(AnyCase, cancel.Token));
    }

    [Fact]
    public async Task Lists_fetch_page_after_page()
    {
        var tokens = new List<string>();
        var script = new LoopbackService.Script
        {
            Other = request =>
            {
                var token = ((ListSolventsRequest)request).PageToken;
                tokens.Add(token);
                return token switch
                {
                    "" => new ListSolventsResponse { Solvents = { new Solvent { Element = "Ag" }, new Solvent { Element = "Al" } }, NextPageToken = "two" },
                    "two" => new ListSolventsResponse { NextPageToken = "three" },
                    _ => new ListSolventsResponse { Solvents = { new Solvent { Element = "Cu" } } },
                };
            },
        };
        await using var service = await LoopbackService.StartAsync(script);
        using var client = Connect(service);

        var elements = await client.ListSolventsAsync().Select(solvent => solvent.Element).ToListAsync();

        Assert.Equal(["Ag", "Al", "Cu"], elements);
        Assert.Equal(["", "two", "three"], tokens);
    }

    [Fact]
    public async Task Every_call_reaches_its_method_with_its_arguments()
    {
        var requests = new List<IMessage>();
        var script = new LoopbackService.Script
        {
            Other = request =>
            {
                requests.Add(request);
                return request switch
                {
                    ListSolutesRequest => new ListSolutesResponse { Solutes = { new Solute { Element = "Pb" } } },
                    ListSlagFamiliesRequest => new ListSlagFamiliesResponse { SlagFamilies = { new SlagFamily { Name = "lead-oxide" } } },
                    ListDataRequest => new ListDataResponse { Data = { new CatalogueDatum { Key = "metal/Cu/Pb#1" } } },
                    GetCoverageRequest => new GetCoverageResponse { CatalogueDigest = "digest" },
                    ExplainDatumRequest => new ExplainDatumResponse { Slot = "metal/Cu/Pb" },
                    _ => new ConvertActivityCoefficientResponse { Activity = 0.25 },
                };
            },
        };
        await using var service = await LoopbackService.StartAsync(script);
        using var client = Connect(service);
        var filter = new ListDataRequest { Kind = DatumKind.Oxidation, SlotPrefix = "oxidation/", Element = "Pb", PageToken = "ignored" };

        Assert.Equal("Pb", (await client.ListSolutesAsync("Cu", 1500).SingleAsync()).Element);
        Assert.Equal("lead-oxide", (await client.ListSlagFamiliesAsync().SingleAsync()).Name);
        Assert.Equal("metal/Cu/Pb#1", (await client.ListDataAsync(filter).SingleAsync()).Key);
        Assert.Equal("metal/Cu/Pb", (await client.ExplainDatumAsync("metal/Cu/Pb", 1400)).Slot);
        Assert.Equal("digest", (await client.GetCoverageAsync(CoverageKind.Slags)).CatalogueDigest);
        Assert.Equal(0.25, (await client.ConvertActivityCoefficientAsync(new ConvertActivityCoefficientRequest { Solvent = "Cu" })).Activity);

        IMessage[] expected =
        [
            new ListSolutesRequest { Solvent = "Cu", TemperatureKelvin = 1500 },
            new ListSlagFamiliesRequest(),
            new ListDataRequest { Kind = DatumKind.Oxidation, SlotPrefix = "oxidation/", Element = "Pb" },
            new ExplainDatumRequest { Slot = "metal/Cu/Pb", TemperatureKelvin = 1400 },
            new GetCoverageRequest { Kind = CoverageKind.Slags },
            new ConvertActivityCoefficientRequest { Solvent = "Cu" },
        ];
        Assert.Equal(expected, requests);
    }

    [Fact]
    public void Refuses_options_that_are_not_valid()
    {
        var fault = Assert.Throws<ArgumentException>(() => PartitionClient.Connect(new PartitionClientOptions()));

        Assert.StartsWith("Address is required", fault.Message, StringComparison.Ordinal);
    }

    private static PartitionClient Connect(LoopbackService service) => PartitionClient.Connect(new PartitionClientOptions { Address = service.Address });

    private static LoopbackService.Script Failing(StatusCode status, int failures) => new()
    {
        Solve = (_, call, _) => call <= failures
            ? throw new RpcException(new Status(status, "scripted"))
            : Task.FromResult(new ChargeAnswer { Name = call == 3 ? "third" : "other" }),
    };

    private static LoopbackService.Script NeverAnswering() => new()
    {
        Solve = async (_, _, context) =>
        {
            await Task.Delay(Timeout.Infinite, context.CancellationToken);
            return new ChargeAnswer();
        },
    };
}
