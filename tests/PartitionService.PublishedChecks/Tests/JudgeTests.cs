using PartitionService.PublishedChecks.Judging;
using PartitionService.PublishedChecks.Rows;

namespace PartitionService.PublishedChecks.Tests;

/// <summary>The judge itself: inside, outside and on the edge of each relation.</summary>
public sealed class JudgeTests
{
    [Theory]
    [InlineData("=", "log10", "10", "", "", "0.3", 19.9, true)]
    [InlineData("=", "log10", "10", "", "", "0.3", 20.1, false)]
    [InlineData("=", "log10", "10", "", "", "0.3", 4.9, false)]
    [InlineData("=", "absolute", "0.75", "", "", "0.05", 0.81, false)]
    [InlineData("=", "relative", "0.367879", "", "", "1e-06", 0.36787944, true)]
    [InlineData("=", "relative", "0.367879", "", "", "1e-06", 0.367881, false)]
    [InlineData(">=", "log10", "10", "", "", "0.3", 5.1, true)]
    [InlineData(">=", "log10", "10", "", "", "0.3", 4.9, false)]
    [InlineData("<=", "log10", "1", "", "", "0.3", 2.1, false)]
    [InlineData(">", "log10", "1", "", "", "0", 1.0, false)]
    [InlineData(">", "log10", "1", "", "", "0", 1.01, true)]
    [InlineData("<", "absolute", "0.5", "", "", "0", 0.5, false)]
    [InlineData("between", "log10", "", "100", "400", "0.3", 60, true)]
    [InlineData("between", "log10", "", "100", "400", "0.3", 45, false)]
    [InlineData("between", "log10", "", "100", "400", "0.3", 900, false)]
    [InlineData("between", "absolute", "", "0", "1", "0", 1.0001, false)]
    [InlineData("increases", "", "", "", "", "", 0.01, true)]
    [InlineData("increases", "", "", "", "", "", 0.0, false)]
    [InlineData("decreases", "", "", "", "", "", 0.01, false)]
    [InlineData("decreases", "", "", "", "", "", -0.01, true)]
    [InlineData("=", "log10", "10", "", "", "0.3", double.NaN, false)]
    public void A_statement_holds_within_its_tolerance_only(
        string relation, string scale, string value, string low, string high, string tolerance, double computed, bool holds) =>
        Assert.Equal(holds, Judge.Holds(Row(relation, scale, value, low, high, tolerance), computed));

    [Fact]
    public void The_worst_of_several_conditions_counts() =>
        Assert.Equal(3, Judge.Worst(Row("<=", "log10", "1", "", "", "0.3"), [0.1, 3, 0.5]));

    [Theory]
    [InlineData("=", "10", "", "", 100, 1)]
    [InlineData(">=", "10", "", "", 100, 1)]
    [InlineData("between", "", "100", "400", 200, 0)]
    [InlineData("between", "", "100", "400", 4000, 1)]
    [InlineData("between", "", "100", "400", 10, -1)]
    public void The_difference_is_a_logarithm(string relation, string value, string low, string high, double computed, double expected) =>
        Assert.Equal(expected, Judge.DifferenceLog10(Row(relation, "log10", value, low, high, "0.3"), computed)!.Value, 1e-12);

    private static PublishedRow Row(string relation, string scale, string value, string low, string high, string tolerance) =>
        new("test", new Dictionary<string, string>
        {
            ["id"] = "test",
            ["unit"] = "1",
            ["relation"] = relation,
            ["tolerance_scale"] = scale,
            ["value"] = value,
            ["value_low"] = low,
            ["value_high"] = high,
            ["tolerance"] = tolerance,
        });
}
