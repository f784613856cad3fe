using System.Buffers;
using System.Buffers.Binary;
using System.Buffers.Text;
using System.Security.Cryptography;
using System.Text;

namespace PartitionService.Server.Paging;

/// <summary>Opaque token of the next page: says where to go on and for which list, filter and catalogue it holds.</summary>
/// <remarks>
/// 24 bytes in base64url: eight of the catalogue's digest, eight of the hash of list and filter, an offset, four of a hash
/// over all of these. Nothing is kept on the server, so that any replica with the same catalogue can go on. The hash is no
/// protection against forgery, which would gain nothing; it tells a mistyped token from a valid one.
/// </remarks>
internal static class PageToken
{
    private const int Length = 24;

    /// <summary>Writes a token.</summary>
    /// <param name="catalogueDigest">Digest of the catalogue, hexadecimal.</param>
    /// <param name="list">List and filter as text; the same text is needed to read the token.</param>
    /// <param name="offset">Number of entries before the next page.</param>
    public static string Write(string catalogueDigest, string list, int offset)
    {
        var bytes = new byte[Length];
        Convert.FromHexString(catalogueDigest).AsSpan(0, 8).CopyTo(bytes);
        SHA256.HashData(Encoding.UTF8.GetBytes(list)).AsSpan(0, 8).CopyTo(bytes.AsSpan(8));
        BinaryPrimitives.WriteInt32BigEndian(bytes.AsSpan(16), offset);
        SHA256.HashData(bytes.AsSpan(0, 20)).AsSpan(0, 4).CopyTo(bytes.AsSpan(20));
        return Base64Url.EncodeToString(bytes);
    }

    /// <summary>Reads a token.</summary>
    /// <returns>False where it was not written for this list, filter and catalogue.</returns>
    public static bool TryRead(string token, string catalogueDigest, string list, out int offset)
    {
        offset = 0;
        var bytes = new byte[Length];
        if (Base64Url.DecodeFromChars(token, bytes, out _, out var written) != OperationStatus.Done || written != Length)
            return false;
        offset = BinaryPrimitives.ReadInt32BigEndian(bytes.AsSpan(16));
        return offset > 0 && string.Equals(token, Write(catalogueDigest, list, offset), StringComparison.Ordinal);
    }
}
