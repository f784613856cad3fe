using System.Diagnostics;
using Grpc.Core;
using PartitionService.HostileInput.Running;
using Xunit.Abstractions;

namespace PartitionService.HostileInput;

/// <summary>The real server behind a real connection: what the framework does before and after the service counts too.</summary>
public sealed class LoopbackFuzzTests(ITestOutputHelper log)
{
    private const int Messages = 4_000;

    [Fact]
    public async Task Four_thousand_hostile_messages_over_a_connection_get_an_answer_or_a_refusal_that_helps()
    {
        await using var server = await LoopbackServer.StartAsync();
        using var service = new DirectService();
        // Another part of the sequence than the run without a connection takes.
        var run = new FuzzRun(RunSize.Seed + 1, await service.IssueTokensAsync(), async sent => await server.CallAsync(sent.Method, sent.Bytes));
        var clock = Stopwatch.StartNew();
        await run.SendAsync(RunSize.First, RunSize.Count(Messages));

        log.WriteLine($"{RunSize.Count(Messages)} messages in {clock.Elapsed.TotalSeconds:0.0} s; {run.Summary}");
        Assert.True(run.Faults.Count == 0, $"{run.Faults.Count} faults\n{run.Report}");
        Assert.True(run.Codes.ContainsKey(StatusCode.OK) && run.Codes.ContainsKey(StatusCode.InvalidArgument), run.Summary);
    }
}
