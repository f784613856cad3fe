using PartitionService.HostileInput.Running;
using Xunit.Sdk;

namespace PartitionService.HostileInput;

/// <summary>Guards the guard: a leak that the meter does not see would pass every run.</summary>
public sealed class HeapMeterTests
{
    private const int Messages = 20_000;

    [Fact]
    public void Leak_of_a_kilobyte_per_message_is_seen()
    {
        var leak = new List<byte[]>();
        var meter = new HeapMeter(Messages);
        meter.Checkpoint();
        for (var message = 0; message < Messages; message++)
            leak.Add(new byte[1024]);
        meter.Checkpoint();
        Assert.Throws<TrueException>(meter.AssertNoGrowth);
        GC.KeepAlive(leak);
    }

    [Fact]
    public void Garbage_is_no_leak()
    {
        var meter = new HeapMeter(Messages);
        meter.Checkpoint();
        for (var message = 0; message < Messages; message++)
            GC.KeepAlive(new byte[1024]);
        meter.Checkpoint();
        meter.AssertNoGrowth();
    }
}
