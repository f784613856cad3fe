using PartitionService.Core.Equilibrium;

namespace PartitionService.Core.Tests.Equilibrium;

public sealed class ViolationListTests
{
    [Theory]
    [InlineData(1)]
    [InlineData(1.5)]
    [InlineData(2)]
    public void Ends_and_inside_of_a_range_are_accepted(double value)
    {
        var list = new ViolationList();
        list.Range("x", value, 1, 2);
        Assert.Empty(list.Violations);
    }

    [Theory]
    [InlineData(0.99, "0.99")]
    [InlineData(2.01, "2.01")]
    [InlineData(double.NaN, "NaN")]
    [InlineData(double.PositiveInfinity, "Infinity")]
    [InlineData(double.NegativeInfinity, "-Infinity")]
    public void Outside_and_not_finite_are_worded_with_the_range(double value, string text)
    {
        var list = new ViolationList();
        list.Range("x", value, 1, 2);
        Assert.Equal(new CaseViolation("x", text, "must be a number in [1, 2]"), Assert.Single(list.Violations));
    }

    [Fact]
    public void Length_counts_characters()
    {
        var list = new ViolationList();
        list.Length("name", "abc", 3);
        Assert.Empty(list.Violations);
        list.Length("name", "abcd", 3);
        Assert.Equal(new CaseViolation("name", "4 characters long", "must have at most 3 characters"), Assert.Single(list.Violations));
    }

    [Theory]
    [InlineData(0.1)]
    [InlineData(1e-300)]
    [InlineData(123456789.123456789)]
    public void Text_reads_back_to_the_same_number(double value) =>
        Assert.Equal(value, double.Parse(ViolationList.Text(value), System.Globalization.CultureInfo.InvariantCulture));

    [Fact]
    public void Message_is_one_sentence_with_or_without_a_value()
    {
        Assert.Equal("oxygen: needs one", new CaseViolation("oxygen", "", "needs one").Message);
        Assert.Equal("x is 3; must be less", new CaseViolation("x", "3", "must be less").Message);
    }
}
