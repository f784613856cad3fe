using PartitionService.Core.Equilibrium.Solvers;

namespace PartitionService.Core.Tests.Equilibrium.Solvers;

public sealed class BorderSystemTests
{
    /// <summary>2x + y - z = 8, -3x - y + 2z = -11, -2x + y + 2z = -3 has the solution (2, 3, -1) (by substitution).</summary>
    [Fact]
    public void Three_unknowns_by_hand()
    {
        var right = new double[] { 8, -11, -3 };
        Assert.True(BorderSystem.Solve(new double[] { 2, 1, -1, -3, -1, 2, -2, 1, 2 }, right, 3, 3));
        Assert.Equal([2, 3, -1], right.Select(x => Math.Round(x, 12)));
    }

    [Fact]
    public void A_zero_on_the_diagonal_needs_a_row_swap()
    {
        var right = new double[] { 5, 7 };
        Assert.True(BorderSystem.Solve(new double[] { 0, 1, 1, 0 }, right, 2, 2));
        Assert.Equal([7, 5], right);
    }

    /// <summary>Rows 40 decades apart: without scaling the first row would be lost against the second.</summary>
    [Fact]
    public void Rows_of_very_different_size_are_scaled()
    {
        var right = new double[] { 3e-20, 1e20 };
        Assert.True(BorderSystem.Solve(new double[] { 1e-20, 1e-20, 1e20, -1e20 }, right, 2, 2));
        Assert.Equal(2, right[0], 12);
        Assert.Equal(1, right[1], 12);
    }

    [Fact]
    public void Columns_beyond_the_size_are_not_touched()
    {
        var matrix = new double[] { 2, 0, 99, 0, 4, 99 };
        var right = new double[] { 2, 8, 77 };
        Assert.True(BorderSystem.Solve(matrix, right, 2, 3));
        Assert.Equal([1, 2, 77], right);
        Assert.Equal(99, matrix[2]);
    }

    [Theory]
    [InlineData(0, 0, 1, 1)]
    [InlineData(1, 1, 1, 1)]
    [InlineData(double.NaN, double.NaN, 1, 1)]
    [InlineData(double.PositiveInfinity, 1, 1, 1)]
    public void Singular_and_not_finite_systems_are_refused(double a, double b, double c, double d) =>
        Assert.False(BorderSystem.Solve(new[] { a, b, c, d }, new double[] { 1, 2 }, 2, 2));
}
