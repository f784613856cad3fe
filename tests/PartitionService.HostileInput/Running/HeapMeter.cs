namespace PartitionService.HostileInput.Running;

/// <summary>Watches the managed heap over a run; a leak of 1 KB per message shows.</summary>
/// <param name="messagesBetween">Messages between two checkpoints.</param>
public sealed class HeapMeter(int messagesBetween)
{
    /// <summary>Growth that is allowed per message, bytes: far below a leak of 1 KB, far above what caches and pools add late.</summary>
    public const double AllowedBytesPerMessage = 300;

    private readonly List<long> heaps = [];

    /// <summary>Heap at each checkpoint, bytes.</summary>
    public IReadOnlyList<long> Heaps => heaps;

    /// <summary>Measures after a full collection.</summary>
    public void Checkpoint()
    {
        for (var round = 0; round < 3; round++)
        {
            GC.Collect(GC.MaxGeneration, GCCollectionMode.Forced, blocking: true, compacting: true);
            GC.WaitForPendingFinalizers();
        }

        heaps.Add(GC.GetTotalMemory(forceFullCollection: true));
    }

    /// <summary>Fails where the heap grew from the first checkpoint, which is taken warm, to the last.</summary>
    public void AssertNoGrowth()
    {
        var messages = (double)messagesBetween * (heaps.Count - 1);
        var perMessage = (heaps[^1] - heaps[0]) / messages;
        Assert.True(
            perMessage <= AllowedBytesPerMessage,
            $"the heap grew by {perMessage:0} bytes per message; at the checkpoints it held {string.Join(", ", heaps)} bytes");
    }
}
