using PartitionService.PublishedChecks.Judging;
using PartitionService.PublishedChecks.Report;
using PartitionService.PublishedChecks.Rows;

namespace PartitionService.PublishedChecks.Tests;

/// <summary>One test case per published row.</summary>
public sealed class PublishedRowTests
{
    public static TheoryData<string> ScoredIds { get; } = [.. RowFiles.All.Where(row => row.Scored).Select(row => row.Id)];

    public static TheoryData<string> OtherIds { get; } = [.. RowFiles.All.Where(row => !row.Scored).Select(row => row.Id)];

    [Theory]
    [MemberData(nameof(ScoredIds))]
    public void A_scored_row_holds_unless_it_is_a_known_miss(string id)
    {
        var result = CheckRun.Results.Single(entry => entry.Row.Id == id);
        var said = string.Join(" | ", ResultTable.Cells(result));
        if (KnownMisses.Reasons.TryGetValue(id, out var reason))
        {
            Assert.True(
                result.Verdict == Verdict.Missed, $"{id} holds now; take it off the list of known misses ({reason}) and out of README.md. {said}");
        }
        else
        {
            Assert.True(result.Verdict == Verdict.Held, $"{id} does not hold. {said}");
        }
    }

    [Theory]
    [MemberData(nameof(OtherIds))]
    public void A_row_that_is_not_scored_is_computed_or_says_why_it_cannot_be(string id)
    {
        var result = CheckRun.Results.Single(entry => entry.Row.Id == id);
        Assert.NotEqual(result.Computed.Length > 0, result.Row.Fields["reason"].Length > 0);
        Assert.Equal(result.Computed.Length > 0 ? Verdict.Context : Verdict.NotComputable, result.Verdict);
    }
}
