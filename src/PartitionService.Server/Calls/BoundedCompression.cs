using System.IO.Compression;
using Grpc.Core;
using Grpc.Net.Compression;

namespace PartitionService.Server.Calls;

/// <summary>Compression whose unpacked messages are bounded like plain ones.</summary>
/// <remarks>The framework compares only the packed size with the limit, and a thousand bytes unpack from one.</remarks>
/// <param name="name">Name on the wire, gzip or deflate.</param>
/// <param name="maximumBytes">Largest unpacked message.</param>
internal sealed class BoundedCompression(string name, int maximumBytes) : ICompressionProvider
{
    /// <summary>Name of the gzip format on the wire.</summary>
    public const string Gzip = "gzip";

    /// <summary>Name of the zlib format on the wire.</summary>
    public const string Deflate = "deflate";

    /// <inheritdoc/>
    public string EncodingName => name;

    /// <inheritdoc/>
    public Stream CreateCompressionStream(Stream stream, CompressionLevel? compressionLevel)
    {
        var level = compressionLevel ?? CompressionLevel.Fastest;
        return name == Gzip ? new GZipStream(stream, level, leaveOpen: true) : new ZLibStream(stream, level, leaveOpen: true);
    }

    /// <inheritdoc/>
    public Stream CreateDecompressionStream(Stream stream) => new BoundedReadStream(
        name == Gzip
            ? new GZipStream(stream, CompressionMode.Decompress, leaveOpen: true)
            : new ZLibStream(stream, CompressionMode.Decompress, leaveOpen: true),
        maximumBytes);

    /// <summary>Reads a stream and refuses more than so many bytes of it.</summary>
    private sealed class BoundedReadStream(Stream inner, int maximumBytes) : Stream
    {
        private long read;

        public override bool CanRead => true;

        public override bool CanSeek => false;

        public override bool CanWrite => false;

        public override long Length => throw new NotSupportedException();

        public override long Position
        {
            get => read;
            set => throw new NotSupportedException();
        }

        public override int Read(byte[] buffer, int offset, int count) => Read(buffer.AsSpan(offset, count));

        public override int Read(Span<byte> buffer)
        {
            var count = inner.Read(buffer);
            read += count;
            return read <= maximumBytes
                ? count
                : throw new RpcException(new Status(StatusCode.ResourceExhausted, "The unpacked message is larger than the limit of the server."));
        }

        public override void Flush()
        {
        }

        public override long Seek(long offset, SeekOrigin origin) => throw new NotSupportedException();

        public override void SetLength(long value) => throw new NotSupportedException();

        public override void Write(byte[] buffer, int offset, int count) => throw new NotSupportedException();

        protected override void Dispose(bool disposing)
        {
            if (disposing)
                inner.Dispose();
            base.Dispose(disposing);
        }
    }
}
