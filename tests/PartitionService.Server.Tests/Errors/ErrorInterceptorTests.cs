using Grpc.Core;
using PartitionService.Core.Equilibrium;
using PartitionService.Server.Tests.Support;

namespace PartitionService.Server.Tests.Errors;

public sealed class ErrorInterceptorTests
{
    private static readonly TimeSpan Long = TimeSpan.FromSeconds(20);

    [Fact]
    public async Task Unexpected_exception_reveals_only_the_request_id()
    {
        await using var server = await RunningServer.StartAsync((c, _, _) => throw new InvalidOperationException($"secret {c.Name}"));
        var error = await CallError.OfAsync(server.Equilibrium.SolveChargeAsync(WireCases.Request("hidden-melt")));
        Assert.Equal((StatusCode.Internal, "INTERNAL"), (error.Status, error.Reason));
        Assert.Contains(error.Info.Metadata["request_id"], error.Message, StringComparison.Ordinal);
        Assert.DoesNotContain("secret", error.Exception.ToString(), StringComparison.Ordinal);
        Assert.DoesNotContain("hidden-melt", error.Exception.ToString(), StringComparison.Ordinal);
    }

    [Fact]
    public async Task Default_deadline_stops_the_solution_and_says_so()
    {
        var stopped = new TaskCompletionSource();
        await using var server = await RunningServer.StartAsync(
            (_, _, cancellation) => WaitFor(stopped, cancellation), options => options.DefaultDeadlineSeconds = 0.05);
        var error = await CallError.OfAsync(server.Equilibrium.SolveChargeAsync(WireCases.Request()));
        Assert.Equal((StatusCode.DeadlineExceeded, "DEADLINE_EXCEEDED"), (error.Status, error.Reason));
        await stopped.Task.WaitAsync(Long);
    }

    [Fact]
    public async Task Deadline_of_the_caller_stops_the_solution_even_where_it_is_longer_than_the_default()
    {
        var stopped = new TaskCompletionSource();
        await using var server = await RunningServer.StartAsync(
            (_, _, cancellation) => WaitFor(stopped, cancellation), options => options.DefaultDeadlineSeconds = 0.001);
        var start = DateTime.UtcNow;
        var call = server.Equilibrium.SolveChargeAsync(WireCases.Request(), Id("late"), start.AddSeconds(0.4));
        var exception = await Assert.ThrowsAsync<RpcException>(async () => await call);
        Assert.Equal(StatusCode.DeadlineExceeded, exception.StatusCode);
        await stopped.Task.WaitAsync(Long);
        Assert.True(DateTime.UtcNow - start > TimeSpan.FromSeconds(0.3), "the default must not cut a deadline that the caller sent");
        var logged = await server.CallEventAsync("late");
        Assert.Equal("DeadlineExceeded", LogText.Of(logged, "StatusCode"));
    }

    [Fact]
    public async Task Cancellation_by_the_caller_stops_the_solution()
    {
        var started = new TaskCompletionSource();
        var stopped = new TaskCompletionSource();
        await using var server = await RunningServer.StartAsync((_, _, cancellation) =>
        {
            started.SetResult();
            return WaitFor(stopped, cancellation);
        });
        using var cancel = new CancellationTokenSource();
        var call = server.Equilibrium.SolveChargeAsync(WireCases.Request(), Id("hung-up"), cancellationToken: cancel.Token);
        await started.Task.WaitAsync(Long);
        await cancel.CancelAsync();
        var exception = await Assert.ThrowsAsync<RpcException>(async () => await call);
        Assert.Equal(StatusCode.Cancelled, exception.StatusCode);
        await stopped.Task.WaitAsync(Long);
        var logged = await server.CallEventAsync("hung-up");
        Assert.Equal(("Cancelled", "CANCELLED"), (LogText.Of(logged, "StatusCode"), LogText.Of(logged, "Reason")));
    }

    [Fact]
    public async Task Deadline_counts_while_a_call_waits_for_its_turn()
    {
        using var release = new ManualResetEventSlim();
        var started = new TaskCompletionSource();
        await using var server = await RunningServer.StartAsync(
            (c, _, _) =>
            {
                started.TrySetResult();
                release.Wait(Long, CancellationToken.None);
                return new SolveOutcome.Solved(CoreAnswers.Full(c.Name));
            },
            options => options.ParallelSolutions = 1);
        var first = server.Equilibrium.SolveChargeAsync(WireCases.Request(), deadline: DateTime.UtcNow + Long);
        await started.Task.WaitAsync(Long);
        var second = server.Equilibrium.SolveChargeAsync(WireCases.Request(), deadline: DateTime.UtcNow.AddMilliseconds(200));
        var exception = await Assert.ThrowsAsync<RpcException>(async () => await second);
        Assert.Equal(StatusCode.DeadlineExceeded, exception.StatusCode);
        release.Set();
        Assert.Equal("black copper", (await first).Answer.Name);
    }

    [Fact]
    public async Task Message_above_the_limit_is_refused_with_a_reason()
    {
        await using var server = await RunningServer.StartAsync(configure: options => options.MaxReceiveMessageBytes = 1024);
        var request = WireCases.Request(new string('x', 2000));
        var call = server.Equilibrium.SolveChargeAsync(request, Id("large"));
        var error = await CallError.OfAsync(call);
        Assert.Equal((StatusCode.ResourceExhausted, "MESSAGE_TOO_LARGE"), (error.Status, error.Reason));
        Assert.Equal("large", error.Info.Metadata["request_id"]);
        var logged = await server.CallEventAsync("large");
        Assert.Equal("MESSAGE_TOO_LARGE", LogText.Of(logged, "Reason"));
    }

    [Fact]
    public async Task Default_limit_takes_a_message_just_below_4_MiB_and_refuses_one_above()
    {
        await using var server = await RunningServer.StartAsync();
        const int limit = 4 * 1024 * 1024;
        var below = await CallError.OfAsync(server.Equilibrium.SolveChargeAsync(WireCases.Request(new string('x', limit - 1000))));
        Assert.Equal("INVALID_CASE", below.Reason);
        var above = await CallError.OfAsync(server.Equilibrium.SolveChargeAsync(WireCases.Request(new string('x', limit + 1))));
        Assert.Equal("MESSAGE_TOO_LARGE", above.Reason);
    }

    private static SolveOutcome WaitFor(TaskCompletionSource stopped, CancellationToken cancellation)
    {
        Assert.True(cancellation.WaitHandle.WaitOne(Long), "the solution was not stopped");
        stopped.TrySetResult();
        throw new OperationCanceledException(cancellation);
    }

    private static Metadata Id(string requestId) => new() { { "x-request-id", requestId } };
}
