using PartitionService.Server.Options;

namespace PartitionService.Server.Calls;

/// <summary>Lets a bounded number of solutions run at a time.</summary>
/// <remarks>
/// A solution keeps a thread busy from start to end. It runs on a thread of its own, which costs little beside a solution, so
/// that the thread pool stays free for health checks and for the calls that wait.
/// </remarks>
internal sealed class SolutionGate(ServerOptions options) : IDisposable
{
    private readonly SemaphoreSlim free = new(options.ParallelSolutionsOrProcessors);

    /// <summary>Waits for a free place, then computes.</summary>
    /// <exception cref="OperationCanceledException">Cancelled while waiting or computing.</exception>
    public async Task<T> RunAsync<T>(Func<CancellationToken, T> compute, CancellationToken cancellation)
    {
        await free.WaitAsync(cancellation);
        try
        {
            return await Task.Factory.StartNew(
                () => compute(cancellation),
                cancellation,
                TaskCreationOptions.LongRunning | TaskCreationOptions.DenyChildAttach,
                TaskScheduler.Default);
        }
        finally
        {
            free.Release();
        }
    }

    /// <inheritdoc/>
    public void Dispose() => free.Dispose();
}
