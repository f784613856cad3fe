using Grpc.Core;

namespace PartitionService.Server.Calls;

/// <summary>Stops a computation when the caller cancels, when the caller's deadline passes, or after the default where none was sent.</summary>
internal sealed class CallDeadline : IDisposable
{
    /// <summary>A timer may fire this much before the wall clock reaches its time.</summary>
    private static readonly TimeSpan TimerSlack = TimeSpan.FromMilliseconds(20);

    private readonly CancellationTokenSource source;
    private readonly CancellationToken caller;
    private readonly DateTime deadline;

    /// <summary>Starts the clock.</summary>
    /// <param name="context">The call.</param>
    /// <param name="defaultSeconds">Limit in seconds where the caller sent no deadline.</param>
    public CallDeadline(ServerCallContext context, double defaultSeconds)
    {
        caller = context.CancellationToken;
        source = CancellationTokenSource.CreateLinkedTokenSource(caller);
        deadline = context.Deadline;
        if (deadline == DateTime.MaxValue)
            source.CancelAfter(TimeSpan.FromSeconds(defaultSeconds));
    }

    /// <summary>Token for the computation.</summary>
    public CancellationToken Token => source.Token;

    /// <summary>True where time ran out, false where the caller hung up.</summary>
    /// <remarks>The framework cancels the caller's token at the deadline too, so that the clock must be read.</remarks>
    public bool TimeRanOut =>
        !caller.IsCancellationRequested || (deadline < DateTime.MaxValue && DateTime.UtcNow + TimerSlack >= deadline);

    /// <inheritdoc/>
    public void Dispose() => source.Dispose();
}
