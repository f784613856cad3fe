using PartitionService.Core.Equilibrium.Solvers;

namespace PartitionService.Core.Tests.Equilibrium.Solvers;

/// <summary>Two metals with one oxide each; the first step is reached at 1/2 ln pO2 = -20, the second at -10, at equal amounts of the phases.</summary>
public sealed class OxidationLadderTests
{
    /// <summary>
    /// Oxygen goes to the most stable oxide first. Where half of an element has gone over, K pO2^(1/2) N_slag = N_metal: the potential is
    /// -ln K + ln(N_metal/N_slag) at the amounts that result, by hand 1.5 and 1.5, then 0.5 and 2.5.
    /// </summary>
    [Theory]
    [InlineData(0.5, 20, 1.5, 1.5)]
    [InlineData(1.5, 10, 0.5, 2.5)]
    public void Half_a_step_by_hand(double oxygen, double lnK, double metal, double slag)
    {
        var potential = Climb(oxygen, null, out var work);
        Assert.Equal(metal, work.PhaseAmount[0], 12);
        Assert.Equal(slag, work.PhaseAmount[1], 12);
        Assert.Equal(-lnK + Math.Log(metal / slag), potential, 12);
    }

    [Theory]
    [InlineData(-30, 2, 1)]
    [InlineData(-15, 1, 2)]
    [InlineData(-1, 0.04, 3)]
    public void A_fixed_potential_takes_every_step_below_it(double fixedPotential, double metal, double slag)
    {
        Assert.Equal(fixedPotential, Climb(0, fixedPotential, out var work));
        Assert.Equal(metal, work.PhaseAmount[0], 12);
        Assert.Equal(slag, work.PhaseAmount[1], 12);
    }

    /// <summary>All steps are taken; the metal keeps 2 % of its guess and the potential is 2 above the last step.</summary>
    [Fact]
    public void More_oxygen_than_all_steps_ends_above_the_last()
    {
        var potential = Climb(5, null, out var work);
        Assert.Equal(0.04, work.PhaseAmount[0], 12);
        Assert.Equal(3, work.PhaseAmount[1], 12);
        Assert.Equal(-10 + Math.Log(0.04 / 3) + 2, potential, 12);
    }

    private static double Climb(double oxygen, double? fixedPotential, out SolverWorkspace work)
    {
        double[] Pad(params double[] values) => [.. values, .. Enumerable.Repeat(0.0, 8 - values.Length)];
        var lnK = Pad(0, 20, 0, 10);
        Array.Fill(lnK, EquilibriumProblem.LnZero, 4, 4);
        var problem = new EquilibriumProblem
        {
            ElementCount = 2,
            LinkCount = 1,
            PhaseCount = 2,
            GroupStart = [0, 2, 4, 4],
            LnK = lnK,
            Phase = [0, 1, 0, 1, 0, 0, 0, 0],
            Multiplicity = [1, 1, 1, 1, 0, 0, 0, 0],
            LinkAtoms = [Pad(0, 1, 0, 1)],
            ElementAmount = [1, 1],
            LinkAmount = [oxygen],
            LinkFixed = [fixedPotential is not null],
            LinkPotential = [fixedPotential ?? 0],
            SlagPhase = 1,
            CarbonPhase = -1,
            CarbonIsGasified = false,
            LinkHasLadder = [true],
            PhaseGuess = [2, 1],
        };
        work = new SolverWorkspace();
        work.Reserve(problem);
        for (var phase = 0; phase < 2; phase++)
        {
            work.PhaseAmount[phase] = problem.PhaseGuess[phase];
            work.LnPhaseGuess[phase] = Math.Log(problem.PhaseGuess[phase]);
        }

        return OxidationLadder.Climb(problem, 0, work);
    }
}
