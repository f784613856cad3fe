using System.Collections.Concurrent;
using System.Diagnostics;
using Google.Protobuf;
using Google.Rpc;
using PartitionService.Cli.CaseFiles;
using PartitionService.Contracts.V1;
using PartitionService.HostileInput.Mutation;
using PartitionService.HostileInput.Running;
using Xunit.Abstractions;

namespace PartitionService.HostileInput;

/// <summary>The reader of case files against files that are damaged, malicious or of another kind.</summary>
public sealed class CaseFileFuzzTests(ITestOutputHelper log)
{
    private const int Files = 10_000;
    private const int LongestMessage = 1000;

    private static readonly TimeSpan Limit = TimeSpan.FromSeconds(10);

    [Fact]
    public async Task Ten_thousand_hostile_case_files_are_read_or_refused_line_by_line()
    {
        using var service = new DirectService();
        var faults = new ConcurrentBag<string>();
        var (read, refused) = (0, 0);
        var durations = new ConcurrentDictionary<int, TimeSpan>();
        var clock = Stopwatch.StartNew();
        await Parallel.ForEachAsync(Enumerable.Range(RunSize.First, RunSize.Count(Files)), async (number, _) =>
        {
            var dice = new Dice(RunSize.Seed + 2, number);
            var text = CaseFileMutator.Change(dice.Of(SeedMessages.CaseFiles), dice);
            var start = Stopwatch.GetTimestamp();
            try
            {
                var file = CaseFileReader.Read("case.yaml", text);
                Interlocked.Increment(ref read);
                // Every tenth goes on to the service: its refusals must come back to lines.
                if (number % 10 == 0)
                    await TranslateAsync(service, file, number, faults);
            }
            catch (CaseFileException refusal)
            {
                Interlocked.Increment(ref refused);
                foreach (var fault in refusal.Errors.Select(FaultOf).OfType<string>())
                    faults.Add($"file {number}: {fault}");
                if (refusal.Errors.Count is 0 or > CaseFileReader.MostErrors + 1)
                    faults.Add($"file {number}: {refusal.Errors.Count} errors");
            }
            catch (Exception unforeseen)
            {
                faults.Add($"file {number}: {unforeseen}");
            }

            var elapsed = Stopwatch.GetElapsedTime(start);
            if (elapsed > Limit)
                faults.Add($"file {number} took {elapsed}");
            durations[number] = elapsed;
        });

        var slowest = durations.MaxBy(pair => pair.Value);
        log.WriteLine($"{read} read, {refused} refused in {clock.Elapsed.TotalSeconds:0.0} s; file {slowest.Key} took {slowest.Value.TotalMilliseconds:0} ms");
        Assert.True(faults.IsEmpty, $"{faults.Count} faults with seed {RunSize.Seed}\n{string.Join("\n", faults.Take(12))}");
        Assert.True(read > 0 && refused > 0, "a run that reads all or nothing tests nothing");
    }

    private static string? FaultOf(CaseFileError error)
    {
        var line = error.Describe("case.yaml");
        if (error.Line < 0 || error.Column < 0 || error.Message.Length < 10)
            return $"no place or no words: {error}";
        if (line.Length > LongestMessage)
            return $"a message of {line.Length} characters: {line[..200]}";
        return line.Any(char.IsControl) ? $"control characters in: {line}" : null;
    }

    private static async Task TranslateAsync(DirectService service, CaseFile file, int number, ConcurrentBag<string> faults)
    {
        var reply = await service.CallAsync("SolveCharge", new SolveChargeRequest { VesselCase = file.Case }.ToByteArray());
        if (reply!.Refusal?.GetDetail<BadRequest>() is not { } bad)
            return;
        foreach (var violation in bad.FieldViolations)
        {
            var error = file.Places.Translate(violation.Field, violation.Description);
            if (error.Line < 1 || FaultOf(error) is not null)
                faults.Add($"file {number}: {violation.Field} comes back as {error}");
        }
    }
}
