using PartitionService.Cli.CaseFiles;

namespace PartitionService.Cli.Tests.CaseFiles;

public sealed class NearestWordTests
{
    private static readonly string[] Words = ["mass_kg", "formula", "volume_normal_cubic_metre"];

    [Theory]
    [InlineData("masskg", "mass_kg")]
    [InlineData("MASS_KG", "mass_kg")]
    [InlineData("formel", "formula")]
    [InlineData("volume_normal_cubic_meter", "volume_normal_cubic_metre")]
    [InlineData("temperature", null)]
    [InlineData("", null)]
    public void Finds_what_was_meant(string word, string? expected) => Assert.Equal(expected, NearestWord.Find(word, Words));

    [Fact]
    public void Does_not_labour_over_a_word_of_a_megabyte() => Assert.Null(NearestWord.Find(new string('x', 1_000_000), Words));
}
