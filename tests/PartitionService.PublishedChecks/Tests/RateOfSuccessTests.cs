using PartitionService.PublishedChecks.Report;
using PartitionService.PublishedChecks.Rows;

namespace PartitionService.PublishedChecks.Tests;

/// <summary>The share of rows that hold, and that the list of rows is whole.</summary>
public sealed class RateOfSuccessTests
{
    private const double TargetPercent = 85;

    [Fact]
    public void At_least_85_per_cent_of_the_validation_rows_hold() =>
        Assert.InRange(Score.Of(CheckRun.Results.Where(result => result.Row.Kind != RowFiles.FurtherChecks)).Percent, TargetPercent, 100);

    [Fact]
    public void The_target_is_met_without_the_rows_that_share_a_paper_with_the_catalogue() =>
        Assert.InRange(
            Score.Of(CheckRun.Results.Where(result =>
                result.Row.Kind != RowFiles.FurtherChecks && result.Row.Fields["pack_overlap"].Length == 0)).Percent,
            TargetPercent,
            100);

    [Fact]
    public void The_target_is_met_without_worked_examples() =>
        Assert.InRange(
            Score.Of(CheckRun.Results.Where(result =>
                result.Row.Kind is not (RowFiles.FurtherChecks or "worked_examples"))).Percent,
            TargetPercent,
            100);

    [Theory]
    [InlineData("activity_coefficients", 30)]
    [InlineData("partition_ratios", 46)]
    [InlineData("volatilisation", 32)]
    [InlineData("deportment", 48)]
    [InlineData("facts_of_the_trade", 37)]
    [InlineData("worked_examples", 35)]
    [InlineData(RowFiles.FurtherChecks, 74)]
    public void No_row_was_dropped(string kind, int rows) => Assert.Equal(rows, RowFiles.All.Count(row => row.Kind == kind));

    [Fact]
    public void Ids_are_unique() => Assert.Equal(RowFiles.All.Count, RowFiles.All.DistinctBy(row => row.Id).Count());

    [Fact]
    public void Every_row_names_its_source_and_access() =>
        Assert.All(RowFiles.All, row =>
        {
            Assert.NotEqual("", row.Fields["citation"]);
            Assert.Contains(row.Fields["access"], new[] { "read", "abstract", "derived", "memory" });
            var locator = row.Fields["locator"];
            Assert.True(locator.Length == 0 || locator.StartsWith("https://", StringComparison.Ordinal) || locator.StartsWith("http://", StringComparison.Ordinal));
        });

    [Fact]
    public void Every_known_miss_is_a_scored_row_and_is_explained_in_the_read_me()
    {
        var readMe = File.ReadAllText(Path.Combine(AppContext.BaseDirectory, "README.md"));
        Assert.All(KnownMisses.Reasons.Keys, id =>
        {
            Assert.True(RowFiles.All.Single(row => row.Id == id).Scored);
            Assert.Contains($"| {id} |", readMe, StringComparison.Ordinal);
        });
    }
}
