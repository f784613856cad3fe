using PartitionService.Cli.Output;
using PartitionService.Contracts.V1;

namespace PartitionService.Cli.Tests.Output;

public sealed class RemarkGroupsTests
{
    [Fact]
    public void Joins_three_that_end_alike()
    {
        var remarks = new[] { "SnO2", "CdO", "CaO" }.Select(oxide => Assumed($"ln gamma of {oxide} is assumed; do not use the figure."));

        Assert.Equal([(Severity.Warning, "3 times \"... is assumed; do not use the figure.\": ln gamma of SnO2 | ln gamma of CdO | ln gamma of CaO")], RemarkGroups.Of(remarks));
    }

    [Fact]
    public void Leaves_apart_what_differs_in_severity_or_words()
    {
        Remark[] remarks =
        [
            new() { Severity = Severity.Serious, Code = RemarkCode.DatumAssumed, Text = "a is assumed; do not use the figure." },
            Assumed("b is assumed; do not use the figure."),
            Assumed("c is assumed; do not use the figure."),
            Assumed("Something else."),
        ];

        Assert.Equal(remarks.Select(remark => (remark.Severity, remark.Text)), RemarkGroups.Of(remarks));
    }

    [Fact]
    public void Survives_remarks_that_are_equal_throughout()
    {
        var text = Assert.Single(RemarkGroups.Of(Enumerable.Repeat(Assumed("one two three four five"), 3))).Text;

        Assert.Equal("3 times \"... two three four five\": one | one | one", text);
    }

    private static Remark Assumed(string text) => new() { Severity = Severity.Warning, Code = RemarkCode.DatumAssumed, Text = text };
}
