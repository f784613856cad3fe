using PartitionService.Core.Catalogue;

namespace PartitionService.Core.Tests.Catalogue;

public sealed class CatalogueDigestTests
{
    [Fact]
    public void Digest_is_64_lower_case_hexadecimal_digits_and_stable()
    {
        var digest = CatalogueLoader.LoadEmbedded().Digest;
        Assert.Matches("^[0-9a-f]{64}$", digest);
        Assert.Equal(digest, CatalogueLoader.Load(CatalogueFiles.Embedded()).Digest);
    }

    [Fact]
    public void Order_of_files_and_kind_of_line_ends_do_not_matter()
    {
        var files = CatalogueFiles.Embedded();
        var turned = files.Reverse().ToDictionary(f => f.Key, f => f.Value.ReplaceLineEndings("\r\n"));
        Assert.Equal(CatalogueDigest.Compute(files), CatalogueDigest.Compute(turned));
        Assert.Equal(CatalogueLoader.LoadEmbedded().Digest, CatalogueLoader.Load(turned).Digest);
    }

    [Fact]
    public void One_changed_digit_or_a_moved_name_changes_the_digest()
    {
        var files = CatalogueFiles.Embedded();
        var before = CatalogueDigest.Compute(files);
        files["chlorides.csv"] = files["chlorides.csv"].Replace("-595909", "-595908", StringComparison.Ordinal);
        Assert.NotEqual(before, CatalogueDigest.Compute(files));
        Assert.NotEqual(
            CatalogueDigest.Compute(new Dictionary<string, string> { ["a"] = "b" }),
            CatalogueDigest.Compute(new Dictionary<string, string> { ["ab"] = "" }));
    }
}
