using PartitionService.Server.Options;

namespace PartitionService.Server.Calls;

/// <summary>Lets a bounded number of solutions run at a time.</summary>
/// <remarks>A solution keeps a thread busy; without a bound a burst would starve the thread pool and with it the health checks.</remarks>
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
            return compute(cancellation);
        }
        finally
        {
            free.Release();
        }
    }

    /// <inheritdoc/>
    public void Dispose() => free.Dispose();
}
