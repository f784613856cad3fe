using CsCheck;
using PartitionService.Core.Thermodynamics;

namespace PartitionService.Core.Tests.Equilibrium;

public sealed class GibbsDuhemTests
{
    private const int Solutes = 5;

    private static readonly Gen<(int First, int Second, double Epsilon)[]> Pairs =
        Gen.Select(Gen.Int[0, Solutes - 1], Gen.Int[0, Solutes - 1], Gen.Double[-1, 1], Gen.Double[0, 3.5])
            .Select((i, j, sign, decades) => (Math.Min(i, j), Math.Max(i, j), sign * Math.Pow(10, decades))).Array[1, 10]
            .Select(pairs => pairs.DistinctBy(p => (p.Item1, p.Item2)).ToArray());

    private static readonly Gen<double[]> Fractions = Gen.Double[-4, -0.8].Select(x => Math.Pow(10, x)).Array[Solutes];

    /// <summary>Sum of x d ln gamma is zero for any change of composition, the solvent included.</summary>
    [Fact]
    public void Small_changes_obey_Gibbs_Duhem() => Gen.Select(Pairs, Fractions, Gen.Double[-1, 1].Array[Solutes]).Sample(
        (pairs, x, direction) =>
        {
            var model = new InteractionModel(pairs);
            const double width = 1e-5;
            var (up, down) = (At(model, x, direction, width), At(model, x, direction, -width));
            double sum = 0, gross = 0;
            for (var i = 0; i <= Solutes; i++)
            {
                var term = (i < Solutes ? x[i] : 1 - x.Sum()) * (up[i] - down[i]) / (2 * width);
                sum += term;
                gross += Math.Abs(term);
            }

            // The differences are of second order; beyond the bound the third derivatives are largest.
            return Math.Abs(sum) <= (1e-5 * gross) + 1e-9;
        },
        iter: 3000,
        seed: "0000001A2B3C");

    /// <summary>The integral of d(g)/dt from the pure solvent along a line is g at its end, g the sum of x ln gamma.</summary>
    [Fact]
    public void Integral_along_a_line_is_the_excess_energy() => Gen.Select(Pairs, Fractions).Sample(
        (pairs, x) =>
        {
            var model = new InteractionModel(pairs);
            const int steps = 4000;
            double integral = 0, gross = 0;
            for (var k = 0; k <= steps; k++)
            {
                // Simpson's rule in s with t = s^2, so that the bend near the solvent is resolved.
                var s = k / (double)steps;
                var ln = At(model, x, x, (s * s) - 1);
                var slope = 2 * s * Enumerable.Range(0, Solutes).Sum(i => x[i] * (ln[i] - ln[Solutes]));
                var weight = k is 0 or steps ? 1 : k % 2 == 1 ? 4 : 2;
                integral += weight * slope / (3 * steps);
                gross += weight * Math.Abs(slope) / (3 * steps);
            }

            var end = At(model, x, x, 0);
            var energy = Enumerable.Range(0, Solutes).Sum(i => x[i] * end[i]) + ((1 - x.Sum()) * end[Solutes]);
            return Math.Abs(integral - energy) <= (1e-6 * gross) + 1e-12;
        },
        iter: 300,
        seed: "0000001A2B3C");

    /// <summary>As all solutes vanish the solvent becomes Raoultian to second order and the solutes Henrian to first.</summary>
    [Fact]
    public void Pure_solvent_is_the_limit_of_Raoult_and_Henry() => Gen.Select(Pairs, Fractions).Sample(
        (pairs, x) =>
        {
            var model = new InteractionModel(pairs);
            var strength = pairs.Sum(p => Math.Abs(p.Epsilon));
            const double share = 1e-6;
            var ln = At(model, x, x, share - 1);
            var largest = share * x.Max();

            // A single cross pair of equal fractions reaches the bound itself: allow for rounding.
            return Math.Abs(ln[Solutes]) <= (1 + 1e-9) * strength * largest * largest
                && ln.Take(Solutes).All(value => Math.Abs(value) <= 1.01 * strength * largest);
        },
        iter: 1000,
        seed: "0000001A2B3C");

    /// <summary>ln gamma of all solutes, then of the solvent, at x + step direction.</summary>
    private static double[] At(InteractionModel model, double[] x, double[] direction, double step)
    {
        double[] moved = [.. x.Select((value, i) => value + (step * (ReferenceEquals(x, direction) ? value : value * direction[i])))];
        var ln = new double[Solutes + 1];
        model.Evaluate(moved, ln.AsSpan(0, Solutes), out ln[Solutes]);
        return ln;
    }
}
