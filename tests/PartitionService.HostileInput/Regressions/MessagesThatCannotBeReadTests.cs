using System.IO.Compression;
using Google.Rpc;
using Grpc.Core;
using PartitionService.HostileInput.Running;

namespace PartitionService.HostileInput.Regressions;

/// <summary>The framework calls such messages faults of the server, without a word to the caller; they are the caller's.</summary>
public sealed class MessagesThatCannotBeReadTests : IAsyncLifetime
{
    private const int Limit = 4 * 1024 * 1024;

    private LoopbackServer server = null!;

    public async Task InitializeAsync() => server = await LoopbackServer.StartAsync();

    public async Task DisposeAsync() => await server.DisposeAsync();

    [Fact]
    public async Task Bytes_that_are_no_message_were_answered_with_unknown()
    {
        var reply = await server.CallAsync("SolveCharge", [0x0A, 0xFF, 0xFF, 0xFF, 0xFF, 0x7F]);
        AssertUnreadable(reply.Code, reply.Refusal);
    }

    [Theory]
    [InlineData(10, 3)]
    [InlineData(3, 10)]
    [InlineData(0, 5)]
    public async Task Length_that_lies_was_answered_with_internal(int stated, int sent)
    {
        var (code, details) = await RawCall.SolveChargeAsync(server, RawCall.Frame(0, (uint)stated, new byte[sent]));
        AssertUnreadable(code, details);
    }

    [Fact]
    public async Task Rubbish_that_calls_itself_packed_was_answered_with_unknown()
    {
        var (code, details) = await RawCall.SolveChargeAsync(server, RawCall.Frame(1, 8, [1, 2, 3, 4, 5, 6, 7, 8]), "gzip");
        AssertUnreadable(code, details);
    }

    /// <summary>Only the packed size was compared with the limit: 64 MiB came in through 64 KiB.</summary>
    [Theory]
    [InlineData("gzip")]
    [InlineData("deflate")]
    public async Task Packed_message_was_unpacked_without_limit(string encoding)
    {
        var packed = Pack(new byte[16 * Limit], encoding);
        var before = GC.GetTotalAllocatedBytes();
        var (code, details) = await RawCall.SolveChargeAsync(server, RawCall.Frame(1, (uint)packed.Length, packed), encoding);
        Assert.Equal(StatusCode.ResourceExhausted, code);
        Assert.Equal("MESSAGE_TOO_LARGE", details!.GetDetail<ErrorInfo>().Reason);
        Assert.InRange(GC.GetTotalAllocatedBytes() - before, 0, 8 * Limit);
    }

    [Theory]
    [InlineData("gzip")]
    [InlineData("deflate")]
    public async Task Packed_message_within_the_limit_is_read(string encoding)
    {
        var packed = Pack([0x0A, 0x00], encoding);
        var (code, details) = await RawCall.SolveChargeAsync(server, RawCall.Frame(1, (uint)packed.Length, packed), encoding);
        Assert.Equal(StatusCode.InvalidArgument, code);
        Assert.Contains(details!.GetDetail<BadRequest>().FieldViolations, violation => violation.Field == "vessel_case.charge");
    }

    private static void AssertUnreadable(StatusCode code, Google.Rpc.Status? details)
    {
        Assert.Equal(StatusCode.InvalidArgument, code);
        Assert.Equal("UNREADABLE_MESSAGE", details!.GetDetail<ErrorInfo>().Reason);
        Assert.Contains("partition.v1.EquilibriumService/SolveCharge", details.Message, StringComparison.Ordinal);
    }

    private static byte[] Pack(byte[] message, string encoding)
    {
        using var packed = new MemoryStream();
        using (Stream packing = encoding == "gzip" ? new GZipStream(packed, CompressionLevel.Fastest) : new ZLibStream(packed, CompressionLevel.Fastest))
            packing.Write(message);
        return packed.ToArray();
    }
}
