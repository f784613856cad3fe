using PartitionService.Cli.Output;

namespace PartitionService.Cli.Tests.Output;

public sealed class NumberTextTests
{
    [Theory]
    [InlineData(0, "0")]
    [InlineData(1e-300, "<0.001")]
    [InlineData(9.99e-6, "<0.001")]
    [InlineData(1e-5, "0.001")]
    [InlineData(0.123456, "12.346")]
    [InlineData(0.99998, "99.998")]
    [InlineData(0.999995, ">99.999")]
    [InlineData(1 - 1e-9, ">99.999")]
    [InlineData(1 - 1e-14, "100")]
    [InlineData(1, "100")]
    public void A_share_reads_as_nothing_or_all_only_where_it_is(double fraction, string expected) => Assert.Equal(expected, NumberText.Percent(fraction));

    [Theory]
    [InlineData(0, 3, "0")]
    [InlineData(1, 3, "1.00")]
    [InlineData(9.996, 3, "10.0")]
    [InlineData(999.6, 3, "1000")]
    [InlineData(9999.6, 3, "1.00e4")]
    [InlineData(123456, 3, "1.23e5")]
    [InlineData(0.001, 3, "0.00100")]
    [InlineData(0.00099951, 3, "0.00100")]
    [InlineData(0.000999, 3, "9.99e-4")]
    [InlineData(-0.0123456, 4, "-0.01235")]
    [InlineData(-1.5e-12, 3, "-1.50e-12")]
    [InlineData(double.MaxValue, 3, "1.80e308")]
    [InlineData(double.Epsilon, 3, "4.94e-324")]
    public void Keeps_the_digits_that_count(double value, int digits, string expected) => Assert.Equal(expected, NumberText.Significant(value, digits));

    [Theory]
    [InlineData(1_000_000, "100", "%")]
    [InlineData(1000, "0.100", "%")]
    [InlineData(999, "999", "ppm")]
    [InlineData(0.05, "0.0500", "ppm")]
    [InlineData(1e-9, "1.00e-9", "ppm")]
    [InlineData(0, "0", "ppm")]
    public void Chooses_the_unit_of_a_content(double massPpm, string number, string unit) => Assert.Equal((number, unit), NumberText.Content(massPpm));

    [Fact]
    public void No_phase_is_not_no_content() => Assert.Equal(("-", ""), NumberText.Content(null));

    [Theory]
    [InlineData(97000, "97000")]
    [InlineData(0.25, "0.2500")]
    [InlineData(1e9, "1.000e9")]
    public void Quantities_stay_plain_over_a_wide_range(double value, string expected) => Assert.Equal(expected, NumberText.Quantity(value));

    [Fact]
    public void Is_the_same_under_a_culture_with_decimal_commas()
    {
        Assert.Equal("12.346", CommaCulture.Run(() => NumberText.Percent(0.123456)));
        Assert.Equal("-1.23e-5", CommaCulture.Run(() => NumberText.Significant(-1.234e-5)));
        Assert.Equal("-1.50", CommaCulture.Run(() => NumberText.Fixed(-1.5, 2)));
        Assert.Equal("-1.5E-12", CommaCulture.Run(() => Csv.Number(-1.5e-12)));
    }
}
