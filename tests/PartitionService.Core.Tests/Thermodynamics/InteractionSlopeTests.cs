using PartitionService.Core.Thermodynamics;

namespace PartitionService.Core.Tests.Thermodynamics;

public sealed class InteractionSlopeTests
{
    private static readonly double[] Fractions = [0.02, 0.11, 3e-4];

    /// <summary>Weak, strong enough to be bounded, and far beyond the bound; both signs, with self-interactions.</summary>
    [Theory]
    [InlineData(1)]
    [InlineData(30)]
    [InlineData(1e4)]
    public void Slopes_of_the_coefficients_agree_with_differences(double scale)
    {
        var model = Model(scale);
        var size = Fractions.Length;
        var curvature = new double[size * size];
        model.Curvature(Fractions, curvature);
        for (var j = 0; j < size; j++)
        {
            var h = 1e-5 * Fractions[j];
            var (high, solventHigh) = Evaluate(model, j, h);
            var (low, solventLow) = Evaluate(model, j, -h);
            var solvent = 0.0;
            for (var m = 0; m < size; m++)
            {
                solvent -= Fractions[m] * curvature[(m * size) + j];
            }

            var gross = Enumerable.Range(0, size).Sum(i => Math.Abs(curvature[(i * size) + j])) + 1;
            Assert.Equal((solventHigh - solventLow) / (2 * h), solvent, 1e-6 * gross);
            for (var i = 0; i < size; i++)
            {
                Assert.Equal((high[i] - low[i]) / (2 * h), curvature[(i * size) + j] + solvent, 1e-6 * gross);
            }
        }
    }

    [Theory]
    [InlineData(0.02, 0.1, 3, false)]
    [InlineData(0.02, 0.1, -40, false)]
    [InlineData(0.02, 0.1, 4000, false)]
    [InlineData(0.05, 0.05, 25, true)]
    [InlineData(0.05, 0.05, -900, true)]
    public void Slopes_with_a_parameter_agree_with_differences(double first, double second, double epsilon, bool same)
    {
        var (energy, slopeFirst, slopeSecond) = InteractionModel.PerEpsilon(first, second, epsilon, same);
        double[] At(double eps)
        {
            var excess = new double[2];
            new InteractionModel([(0, same ? 0 : 1, eps)]).Evaluate([first, second], excess, out var solvent);
            return [solvent, excess[0] - solvent, excess[1] - solvent];
        }

        var h = 1e-4 * Math.Abs(epsilon);
        double[] quotient = [.. At(epsilon + h).Zip(At(epsilon - h), (a, b) => (a - b) / (2 * h))];
        double[] exact = [energy - (first * slopeFirst) - (second * slopeSecond), slopeFirst, slopeSecond];
        for (var k = 0; k < exact.Length; k++)
        {
            Assert.Equal(exact[k], quotient[k], 1e-6 * (Math.Abs(exact[k]) + (0.001 * Math.Abs(energy))));
        }
    }

    private static InteractionModel Model(double scale) =>
        new([(0, 0, 4 * scale), (0, 1, -3 * scale), (1, 1, 2.5 * scale), (1, 2, 7 * scale), (0, 2, -90 * scale), (2, 2, 11)]);

    private static (double[] Excess, double Solvent) Evaluate(InteractionModel model, int moved, double by)
    {
        var fractions = Fractions.ToArray();
        fractions[moved] += by;
        var excess = new double[fractions.Length];
        model.Evaluate(fractions, excess, out var solvent);
        return (excess, solvent);
    }
}
