using PartitionService.Server.Paging;

namespace PartitionService.Server.Tests.Paging;

public sealed class PageTokenTests
{
    private static readonly string Digest = new('a', 64);

    [Theory]
    [InlineData(1)]
    [InlineData(100)]
    [InlineData(int.MaxValue)]
    public void Offset_comes_back(int offset)
    {
        Assert.True(PageToken.TryRead(PageToken.Write(Digest, "list", offset), Digest, "list", out var read));
        Assert.Equal(offset, read);
    }

    [Fact]
    public void Token_of_another_catalogue_list_or_filter_is_refused()
    {
        var token = PageToken.Write(Digest, "list\nCu", 5);
        Assert.False(PageToken.TryRead(token, new string('b', 64), "list\nCu", out _));
        Assert.False(PageToken.TryRead(token, Digest, "list\nPb", out _));
        Assert.False(PageToken.TryRead(token, Digest, "other\nCu", out _));
    }

    [Theory]
    [InlineData(0)]
    [InlineData(-1)]
    public void Offset_that_no_next_page_has_is_refused(int offset) =>
        Assert.False(PageToken.TryRead(PageToken.Write(Digest, "list", offset), Digest, "list", out _));

    [Theory]
    [InlineData("x")]
    [InlineData("not base64url!")]
    [InlineData("AAAAAAAAAAAAAAAAAAAAAAAAAAAAAAAA")]
    [InlineData("\U0001D54F")]
    public void Nonsense_is_refused(string token) => Assert.False(PageToken.TryRead(token, Digest, "list", out _));

    [Fact]
    public void Every_changed_character_is_noticed()
    {
        var token = PageToken.Write(Digest, "list", 7);
        for (var i = 0; i < token.Length; i++)
        {
            var changed = token[..i] + (token[i] == 'A' ? 'B' : 'A') + token[(i + 1)..];
            Assert.False(PageToken.TryRead(changed, Digest, "list", out _));
        }
    }

    [Fact]
    public void Very_long_text_is_refused() => Assert.False(PageToken.TryRead(new string('A', 1_000_000), Digest, "list", out _));
}
