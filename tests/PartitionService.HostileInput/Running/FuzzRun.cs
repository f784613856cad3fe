using System.Collections.Concurrent;
using System.Diagnostics;
using System.Globalization;
using Grpc.Core;
using PartitionService.HostileInput.Checking;
using PartitionService.HostileInput.Mutation;

namespace PartitionService.HostileInput.Running;

/// <summary>Sends numbered hostile requests and collects what went wrong.</summary>
/// <param name="seed">Seed of the run.</param>
/// <param name="tokens">Page tokens that the service issued.</param>
/// <param name="call">Sends one request; null comes back where the bytes were no message.</param>
internal sealed class FuzzRun(int seed, IReadOnlyList<string> tokens, Func<HostileRequest, Task<Reply?>> call)
{
    /// <summary>Time that one message may take on a busy machine.</summary>
    private static readonly TimeSpan Limit = TimeSpan.FromSeconds(10);

    private const int ExamplesShown = 5;

    private readonly ConcurrentDictionary<StatusCode, int> codes = new();
    private readonly ConcurrentBag<string> faults = [];
    private readonly ConcurrentDictionary<int, long> running = new();
    private long slowest;
    private int endlessSearches;

    /// <summary>How many searches for a stated oxygen content of the metal came to no end; a solver that gets worse shows here.</summary>
    public int EndlessSearches => endlessSearches;

    /// <summary>How many replies of each code came.</summary>
    public IReadOnlyDictionary<StatusCode, int> Codes => codes;

    /// <summary>Everything that went wrong, each with seed and message.</summary>
    public IReadOnlyCollection<string> Faults => faults;

    /// <summary>A few examples of every kind of fault, for a message that can be read.</summary>
    public string Report => string.Join(
        '\n',
        faults.GroupBy(fault => string.Concat(fault.Take(50).Where(letter => !char.IsAsciiDigit(letter))))
            .Select(kind => $"{kind.Count()} times, such as\n{string.Join('\n', kind.Take(ExamplesShown))}"));

    /// <summary>Counts, for the log of the run.</summary>
    public string Summary => string.Create(
        CultureInfo.InvariantCulture,
        $"{string.Join(", ", codes.OrderBy(pair => pair.Key).Select(pair => $"{pair.Key} {pair.Value}"))}; slowest {TimeSpan.FromTicks(slowest).TotalMilliseconds:0} ms");

    /// <summary>Sends the messages of a range of numbers, as many at a time as there are processors.</summary>
    /// <exception cref="TimeoutException">A message hangs.</exception>
    public async Task SendAsync(int first, int count)
    {
        var all = Parallel.ForEachAsync(
            Enumerable.Range(first, count),
            new ParallelOptions { MaxDegreeOfParallelism = Math.Max(2, Environment.ProcessorCount) },
            async (number, _) => await SendAsync(number));
        while (!all.IsCompleted)
        {
            await Task.WhenAny(all, Task.Delay(TimeSpan.FromSeconds(1)));
            var oldest = running.OrderBy(pair => pair.Value).FirstOrDefault();
            if (!all.IsCompleted && oldest.Value != 0 && Stopwatch.GetElapsedTime(oldest.Value) > 3 * Limit)
                throw new TimeoutException($"hangs: {Describe(HostileRequest.Make(seed, oldest.Key, tokens), oldest.Key)}");
        }

        await all;
    }

    private async Task SendAsync(int number)
    {
        var request = HostileRequest.Make(seed, number, tokens);
        var start = Stopwatch.GetTimestamp();
        running[number] = start;
        string? fault;
        try
        {
            var reply = await call(request);
            codes.AddOrUpdate(reply?.Code ?? StatusCode.InvalidArgument, 1, (_, before) => before + 1);
            fault = reply is null ? null : FindFault(reply, request);
            if (reply?.Refusal?.Message.Contains("came to no end", StringComparison.Ordinal) == true)
                Interlocked.Increment(ref endlessSearches);
        }
        catch (Exception exception)
        {
            fault = $"the call ended with {exception}";
        }

        running.TryRemove(number, out _);
        var elapsed = Stopwatch.GetElapsedTime(start);
        Raise(ref slowest, elapsed.Ticks);
        if (fault is null && elapsed > Limit)
            fault = $"took {elapsed}";
        if (fault is not null)
            faults.Add($"{fault}\n  {Describe(request, number)}");
    }

    private static string? FindFault(Reply reply, HostileRequest request)
    {
        switch (reply.Code)
        {
            case StatusCode.OK:
                return FiniteNumbers.FindBad(reply.Answer!);
            case StatusCode.InvalidArgument or StatusCode.FailedPrecondition or StatusCode.NotFound:
                return RefusalShape.FindFault(reply.Code, reply.Refusal, Read(request));
            default:
                return $"ends with {reply.Code}: {reply.Refusal?.Message} {reply.Unforeseen}";
        }
    }

    private static Google.Protobuf.IMessage? Read(HostileRequest request)
    {
        try
        {
            return Methods.RequestParser(request.Method).ParseFrom(request.Bytes);
        }
        catch (Google.Protobuf.InvalidProtocolBufferException)
        {
            return null;
        }
    }

    private string Describe(HostileRequest request, int number) => request.Describe(seed, number, Methods.RequestParser(request.Method));

    private static void Raise(ref long highest, long value)
    {
        for (var seen = Volatile.Read(ref highest); value > seen; seen = Volatile.Read(ref highest))
        {
            if (Interlocked.CompareExchange(ref highest, value, seen) == seen)
                return;
        }
    }
}
