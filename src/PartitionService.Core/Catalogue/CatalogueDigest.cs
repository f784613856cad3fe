using System.Security.Cryptography;
using System.Text;

namespace PartitionService.Core.Catalogue;

/// <summary>SHA-256 of the catalogue's content.</summary>
internal static class CatalogueDigest
{
    /// <summary>
    /// Digest over the files in ordinal order of their names: name, zero byte, UTF-8 content with LF line ends, zero byte.
    /// </summary>
    /// <returns>64 lower-case hexadecimal digits.</returns>
    public static string Compute(IReadOnlyDictionary<string, string> filesByName)
    {
        using var hash = IncrementalHash.CreateHash(HashAlgorithmName.SHA256);
        foreach (var (name, content) in filesByName.OrderBy(f => f.Key, StringComparer.Ordinal))
        {
            hash.AppendData(Encoding.UTF8.GetBytes(name));
            hash.AppendData([0]);
            hash.AppendData(Encoding.UTF8.GetBytes(content.ReplaceLineEndings("\n")));
            hash.AppendData([0]);
        }

        return Convert.ToHexStringLower(hash.GetHashAndReset());
    }
}
