using PartitionService.Core.Equilibrium.Solvers;

namespace PartitionService.Core.Tests.Equilibrium.Solvers;

public class SaddleSolverTests
{
    private static readonly SolverWorkspace Work = new();

    [Theory]
    [InlineData(true, true)]
    [InlineData(true, false)]
    [InlineData(false, true)]
    [InlineData(false, false)]
    public void Random_problems_meet_the_conditions_of_the_minimum(bool fixedOxygen, bool gas)
    {
        var barrier = 0;
        var steps = 0L;
        for (var seed = 0; seed < 5000; seed++)
        {
            var problem = RandomProblem.Create(new Random(seed), fixedOxygen, gas);
            var result = SaddleSolver.Solve(problem, Work, CancellationToken.None);
            if (result.Stop == SaddleSolver.Stop.AmountUnbounded && fixedOxygen)
            {
                // The fixed potential alone fills a phase: no finite answer exists.
                continue;
            }

            Assert.True(result.Stop == SaddleSolver.Stop.Converged, $"seed {seed}: {result}");
            AssertConditions(problem, seed);
            barrier += result.UsedBarrier ? 1 : 0;
            steps += result.Iterations;
        }

        Assert.True(barrier < 250, $"the barrier method was needed {barrier} times; mean steps {steps / 5000.0}");
    }

    private static void AssertConditions(EquilibriumProblem problem, int seed)
    {
        var held = new double[problem.ElementCount];
        var link = new double[problem.LinkCount];
        for (var element = 0; element <= problem.ElementCount; element++)
        {
            for (var s = problem.GroupStart[element]; s < problem.GroupStart[element + 1]; s++)
            {
                var amount = Work.PhaseAmount[problem.Phase[s]] * Work.MoleFraction[s];
                if (element < problem.ElementCount)
                {
                    held[element] += problem.Multiplicity[s] * amount;
                }

                for (var j = 0; j < problem.LinkCount; j++)
                {
                    link[j] += problem.LinkAtoms[j][s] * amount;
                }
            }
        }

        for (var element = 0; element < problem.ElementCount; element++)
        {
            Assert.True(Math.Abs((held[element] / problem.ElementAmount[element]) - 1) < 1e-12, $"seed {seed}, element {element}");
        }

        for (var j = 0; j < problem.LinkCount; j++)
        {
            if (!problem.LinkFixed[j])
            {
                Assert.True(Math.Abs(link[j] - problem.LinkAmount[j]) < 1e-10 * problem.LinkAmount[j], $"seed {seed}, link {j}");
            }
        }

        for (var phase = 0; phase < problem.PhaseCount; phase++)
        {
            var sum = Work.PhaseSum[phase];
            Assert.True(
                Work.Present[phase] ? Math.Abs(sum - 1) < 1e-10 : sum < 1 + 1e-10, $"seed {seed}, phase {phase}: sum {sum}");
        }
    }
}
