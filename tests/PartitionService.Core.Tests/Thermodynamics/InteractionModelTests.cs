using PartitionService.Core.Thermodynamics;

namespace PartitionService.Core.Tests.Thermodynamics;

public sealed class InteractionModelTests
{
    /// <summary>
    /// By hand with the published formalism: eps_11 = 5, eps_12 = -10, x = (0.01, 0.02). ln gamma_solvent = -(1/2 5 1e-4 - 10 2e-4) =
    /// 0.00175, ln gamma_1 = 0.00175 + 0.05 - 0.2, ln gamma_2 = 0.00175 - 0.1. Up to |eps x| = 0.2 the bound is stated to change a term by
    /// less than 2e-4, here 0.25 x 2e-4.
    /// </summary>
    [Fact]
    public void Small_case_by_hand_is_reproduced()
    {
        var (solutes, solvent) = Evaluate([(0, 0, 5), (0, 1, -10)], [0.01, 0.02]);
        const double tolerance = 0.25 * 2e-4;
        Assert.Equal(0.00175, solvent, tolerance);
        Assert.Equal(0.00175 + 0.05 - 0.2, solutes[0], tolerance);
        Assert.Equal(0.00175 - 0.1, solutes[1], tolerance);
    }

    [Fact]
    public void Pure_solvent_is_ideal()
    {
        var (solutes, solvent) = Evaluate([(0, 1, -6300)], [0, 0]);
        Assert.Equal(0, solvent);
        Assert.Equal([0, 0], solutes);
    }

    [Fact]
    public void Only_the_partner_makes_a_trace_deviate()
    {
        var (solutes, _) = Evaluate([(0, 1, 8)], [0, 0.01]);
        Assert.Equal(8 * 0.01, solutes[0], 8 * 0.01 * 2e-4);
        Assert.Equal(0, solutes[1]);
    }

    /// <summary>Far beyond the bound phi is 2/|eps| with slope 0, so that g of one pair is eps (2/eps)^2 = 4/eps for any x.</summary>
    [Theory]
    [InlineData(1e5)]
    [InlineData(-1e5)]
    [InlineData(1e100)]
    public void Far_beyond_the_bound_the_energy_is_four_over_epsilon(double epsilon)
    {
        var (solutes, solvent) = Evaluate([(0, 1, epsilon)], [0.3, 0.4]);
        Assert.InRange(solvent * epsilon / 4, 1 - 1e-6, 1 + 1e-6);
        Assert.All(solutes, value => Assert.InRange(value * epsilon / 4, 1 - 1e-6, 1 + 1e-6));
    }

    /// <summary>g is even in the index: a pair given as (1, 0) is the pair (0, 1).</summary>
    [Fact]
    public void Order_within_a_pair_does_not_matter() =>
        Assert.Equal(Evaluate([(0, 1, 7)], [0.03, 0.2]).Solutes, Evaluate([(1, 0, 7)], [0.03, 0.2]).Solutes);

    [Fact]
    public void Empty_model_says_so()
    {
        Assert.True(new InteractionModel([]).IsEmpty);
        Assert.False(new InteractionModel([(0, 0, 1)]).IsEmpty);
    }

    [Fact]
    public void Bounded_pairs_are_those_beyond_half_the_bound()
    {
        var model = new InteractionModel([(0, 1, 10), (1, 1, -30), (0, 0, 9)]);
        var bounded = Assert.Single(model.BoundedPairs([0.1, 0.05]));
        Assert.Equal((1, 1), (bounded.First, bounded.Second));
        Assert.Equal(1.5, bounded.Strength, 12);
    }

    private static (double[] Solutes, double Solvent) Evaluate((int First, int Second, double Epsilon)[] pairs, double[] fractions)
    {
        var solutes = new double[fractions.Length];
        new InteractionModel(pairs).Evaluate(fractions, solutes, out var solvent);
        return (solutes, solvent);
    }
}
