using System.Diagnostics;
using Grpc.Core;
using PartitionService.HostileInput.Running;
using Xunit.Abstractions;

namespace PartitionService.HostileInput;

/// <summary>The classes of the service against messages that nobody would send in good faith.</summary>
public sealed class ServiceFuzzTests(ITestOutputHelper log)
{
    private const int Messages = 100_000;
    private const int Stages = 5;

    /// <summary>Measured: three in a hundred thousand.</summary>
    private const int MessagesPerEndlessSearch = 10_000;

    [Fact]
    public async Task A_hundred_thousand_hostile_messages_get_a_finite_answer_or_a_refusal_that_helps()
    {
        using var service = new DirectService();
        var run = new FuzzRun(RunSize.Seed, await service.IssueTokensAsync(), request => service.CallAsync(request.Method, request.Bytes));
        var perStage = Math.Max(1, RunSize.Count(Messages) / Stages);
        var heap = new HeapMeter(perStage);
        var clock = Stopwatch.StartNew();
        for (var stage = 0; stage < Stages; stage++)
        {
            await run.SendAsync(RunSize.First + (stage * perStage), perStage);
            heap.Checkpoint();
        }

        log.WriteLine($"{Stages * perStage} messages in {clock.Elapsed.TotalSeconds:0.0} s; {run.Summary}; {run.EndlessSearches} endless searches; heap {string.Join(", ", heap.Heaps)}");
        Assert.True(run.Faults.Count == 0, $"{run.Faults.Count} faults\n{run.Report}");
        Assert.True(run.Codes.GetValueOrDefault(StatusCode.OK) > perStage / 2, $"too few answers to say much: {run.Summary}");
        Assert.InRange(run.EndlessSearches, 0, RunSize.Count(Messages) / MessagesPerEndlessSearch);
        heap.AssertNoGrowth();
    }
}
