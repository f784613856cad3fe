using Xunit.Abstractions;

namespace PartitionService.IndependentSolution;

public sealed class GibbsMinimumTests(ITestOutputHelper output)
{
    private const double SmallestMol = 1e-9;
    private const double SmallestGasFraction = 1e-12;
    private const double Tolerance = 1e-6;

    public static TheoryData<string> Names => [.. Cases.All.Keys];

    [Theory]
    [MemberData(nameof(Names))]
    public void Every_amount_is_that_of_the_independent_minimum(string name)
    {
        var mine = Answers.Independent(name);
        var answer = Answers.Service(name);
        var listed = Answers.Listed(answer).ToDictionary(s => (s.Phase, s.Species), s => s.Mol);
        var own = mine.Amounts().ToDictionary(a => (a.Species.Phase.ToString(), a.Species.Name), a => a.Mol);
        var gas = answer.Gas?.AmountMol ?? 0;
        var (worst, where) = (0.0, "");
        foreach (var key in listed.Keys.Union(own.Keys))
        {
            var (theirs, ours) = (listed.GetValueOrDefault(key), own.GetValueOrDefault(key));
            var reported = key.Item1 != "Gas" || ours > 1.001 * SmallestGasFraction * gas;
            if (Math.Max(theirs, ours) >= SmallestMol && reported)
            {
                var difference = Math.Abs(theirs - ours) / Math.Max(theirs, ours);
                if (difference > worst)
                {
                    (worst, where) = (difference, FormattableString.Invariant($"{key}: service {theirs:R} mol, here {ours:R} mol"));
                }
            }
        }

        output.WriteLine(FormattableString.Invariant($"worst relative difference {worst:E2}, {where}; {mine.Rounds} rounds"));
        Assert.True(worst <= Tolerance, FormattableString.Invariant($"{worst:E2} at {where}"));
        Assert.NotEmpty(listed);
    }

    [Theory]
    [MemberData(nameof(Names))]
    public void Potentials_of_the_answer_reproduce_every_species_of_the_answer(string name)
    {
        var answer = Answers.Service(name);
        var check = new PotentialCheck(name, answer);
        foreach (var (phase, species, difference) in check.Differences())
        {
            Assert.True(
                Math.Abs(difference) <= 1e-9,
                FormattableString.Invariant($"{phase} {species}: ln x differs by {difference:E2} from what the potentials give"));
        }

        foreach (var (phase, sum) in check.AbsentPhases())
        {
            Assert.True(sum <= 1 + 1e-9, FormattableString.Invariant($"{phase} is absent, but its mole fractions would add up to {sum:R}"));
        }
    }
}
