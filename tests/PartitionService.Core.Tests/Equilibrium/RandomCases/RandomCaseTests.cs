using PartitionService.Core.Catalogue;
using PartitionService.Core.Equilibrium;
using Xunit.Abstractions;

namespace PartitionService.Core.Tests.Equilibrium.RandomCases;

public sealed class RandomCaseTests(ITestOutputHelper output)
{
    private static readonly EquilibriumSolver Solver = new(CatalogueLoader.LoadEmbedded());

    private static readonly int Cases =
        int.TryParse(Environment.GetEnvironmentVariable("PARTITION_RANDOM_CASES"), out var cases) ? cases : 10_000;

    [Fact]
    public void Random_cases_over_the_whole_domain_are_solved_or_refused_for_a_physical_reason()
    {
        var tally = new RandomCaseTally();
        Parallel.For(0, Cases, seed => tally.Add(seed, Inspect(seed, out var outcome), outcome));
        output.WriteLine(tally.Summary());
        Assert.True(tally.Faults.IsEmpty, tally.FaultText());
        Assert.True(tally.Solved > 0.5 * Cases, tally.Summary());
        Assert.True(tally.BarrierShare < 0.02, tally.Summary());
    }

    /// <summary>What is wrong with the outcome of a seed; null where nothing is.</summary>
    private static string? Inspect(int seed, out SolveOutcome? outcome)
    {
        outcome = null;
        try
        {
            outcome = Solver.Solve(RandomCase.Create(seed));
            return outcome switch
            {
                SolveOutcome.Solved solved => AnswerChecks.FirstFault(solved.Answer),
                SolveOutcome.Failed { Reason: SolveFailure.NotConverged } => "not converged",
                SolveOutcome.Failed failed => failed.Message.Length == 0 ? "a failure without words" : null,
                SolveOutcome.Invalid invalid => string.Join("; ", invalid.Violations.Select(v => v.Message)),
                _ => "unknown outcome",
            };
        }
#pragma warning disable CA1031 // Whatever is thrown is the finding of this test, with its seed.
        catch (Exception exception)
#pragma warning restore CA1031
        {
            return exception.ToString();
        }
    }
}
