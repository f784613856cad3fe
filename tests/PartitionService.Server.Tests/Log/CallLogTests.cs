using System.Reflection;
using Grpc.Core;
using Grpc.Health.V1;
using Microsoft.Extensions.Logging;
using PartitionService.Contracts.V1;
using PartitionService.Core.Equilibrium;
using PartitionService.Server.Hosting;
using PartitionService.Server.Log;
using PartitionService.Server.Tests.Support;
using Serilog.Events;

namespace PartitionService.Server.Tests.Log;

public sealed class CallLogTests
{
    private const string Secret = "hunter2-alloy";

    /// <summary>Ids and names are relied on by alerts: a change here is a change of the interface.</summary>
    [Fact]
    public void Events_have_stable_ids_and_names()
    {
        var events = new[] { typeof(CallLog), typeof(ServerLog) }
            .SelectMany(t => t.GetMethods(BindingFlags.Public | BindingFlags.Static))
            .Select(m => m.GetCustomAttribute<LoggerMessageAttribute>()!)
            .Select(a => $"{a.EventId} {a.EventName} {a.Level}")
            .Order(StringComparer.Ordinal);
        Assert.Equal(
            [
                "1001 Listening Information",
                "1002 Stopping Information",
                "1003 UnexpectedException Error",
                "2001 CallEnded Information",
                "2002 CallFailed Error",
                "2003 InfrastructureCallEnded Debug",
            ],
            events);
    }

    [Fact]
    public async Task Solved_call_is_one_event_with_its_figures()
    {
        await using var server = await RunningServer.StartAsync((c, _, _) => new SolveOutcome.Solved(CoreAnswers.Full(c.Name)));
        await server.Equilibrium.SolveChargeAsync(WireCases.Request(), Headers("one"));
        var logged = await server.CallEventAsync("one");
        Assert.Equal(LogEventLevel.Information, logged.Level);
        Assert.Equal("/partition.v1.EquilibriumService/SolveCharge", LogText.Of(logged, "Method"));
        Assert.Equal(("OK", ""), (LogText.Of(logged, "StatusCode"), LogText.Of(logged, "Reason")));
        Assert.Equal(("1", "37"), (LogText.Of(logged, "ElementCount"), LogText.Of(logged, "Iterations")));
        Assert.NotEmpty(LogText.Of(logged, "DurationMilliseconds"));
        Assert.Single(server.Logs, e => LogText.Id(e) is 2001 or 2002);
    }

    [Fact]
    public async Task Fault_is_an_error_with_its_trace()
    {
        await using var server = await RunningServer.StartAsync((_, _, _) => throw new InvalidOperationException(Secret));
        await CallError.OfAsync(server.Equilibrium.SolveChargeAsync(WireCases.Request(), Headers("two")));
        var logged = await server.CallEventAsync("two");
        Assert.Equal((LogEventLevel.Error, "INTERNAL"), (logged.Level, LogText.Of(logged, "Reason")));
        var fault = Assert.Single(server.Logs, e => LogText.Id(e) == 1003);
        Assert.Equal("two", LogText.Of(fault, "RequestId"));
        Assert.Contains("System.InvalidOperationException", LogText.Of(fault, "ExceptionTrace"), StringComparison.Ordinal);
    }

    [Fact]
    public async Task Nothing_of_a_payload_reaches_the_log()
    {
        VesselSolve solve = (c, _, _) => c.Charge.Count switch
        {
            6 => new SolveOutcome.Solved(CoreAnswers.Full(c.Name)),
            1 => throw new InvalidOperationException(c.Name, new ArgumentException(c.Name)),
            _ => new SolveOutcome.Failed(SolveFailure.NoSolvent, c.Name, [c.Name]),
        };
        await using var server = await RunningServer.StartAsync(solve, options => options.LogLevel = LogLevel.Trace);
        await server.Equilibrium.SolveChargeAsync(WireCases.Request(Secret), Headers("p1"));

        var fault = WireCases.Request(Secret);
        fault.VesselCase.Charge.Clear();
        fault.VesselCase.Charge.Add(new Contracts.V1.ChargeItem { Formula = "Cu", MassKg = 1 });
        await CallError.OfAsync(server.Equilibrium.SolveChargeAsync(fault, Headers("p2")));

        var failure = WireCases.Request(Secret);
        failure.VesselCase.Charge.Clear();
        await CallError.OfAsync(server.Equilibrium.SolveChargeAsync(failure, Headers("p3")));

        var invalid = WireCases.Request(Secret);
        invalid.VesselCase.Slag.Family = "";
        invalid.VesselCase.Metal.Solvent = Secret;
        await CallError.OfAsync(server.Equilibrium.SolveChargeAsync(invalid, Headers("p4")));

        foreach (var id in new[] { "p1", "p2", "p3", "p4" })
            await server.CallEventAsync(id);
        Assert.DoesNotContain(server.Logs, e => LogText.Json(e).Contains(Secret, StringComparison.Ordinal));
    }

    [Fact]
    public async Task Probes_and_unknown_methods_stay_below_information()
    {
        await using var server = await RunningServer.StartAsync();
        await new Health.HealthClient(server.Channel).CheckAsync(new HealthCheckRequest());
        var method = new Method<ListSolventsRequest, ListSolventsResponse>(
            MethodType.Unary, "partition.v1.Nothing", Secret, Marshallers.Create(_ => Array.Empty<byte>(), _ => new ListSolventsRequest()), Marshallers.Create(_ => Array.Empty<byte>(), _ => new ListSolventsResponse()));
        using var call = server.Channel.CreateCallInvoker().AsyncUnaryCall(method, null, default, new ListSolventsRequest());
        var exception = await Assert.ThrowsAsync<RpcException>(async () => await call);
        Assert.Equal(StatusCode.Unimplemented, exception.StatusCode);
        Assert.DoesNotContain(server.Logs, e => LogText.Id(e) >= 2000);
    }

    [Fact]
    public async Task Start_and_stop_are_logged()
    {
        var server = await RunningServer.StartAsync();
        await server.App.StopAsync();
        Assert.Equal([1001, 1002], server.Logs.Select(LogText.Id).Where(id => id is > 1000 and < 2000));
        await server.DisposeAsync();
    }

    /// <summary>Once the events of a server went to whichever server of the process was built last.</summary>
    [Fact]
    public async Task Servers_of_one_process_keep_their_logs_apart()
    {
        await using var first = await RunningServer.StartAsync();
        await using var second = await RunningServer.StartAsync();
        await first.Catalogue.ListSolventsAsync(new ListSolventsRequest(), Headers("first"));
        await first.CallEventAsync("first");
        Assert.DoesNotContain(second.Logs, e => LogText.Of(e, "RequestId") == "first");
    }

    private static Metadata Headers(string id) => new() { { "x-request-id", id } };
}
