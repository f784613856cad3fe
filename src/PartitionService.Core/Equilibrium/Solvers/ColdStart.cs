namespace PartitionService.Core.Equilibrium.Solvers;

/// <summary>First guess of the linking potentials and phase amounts, from the problem alone.</summary>
internal static class ColdStart
{
    /// <summary>A potential so low that the component is absent, far above underflow.</summary>
    private const double Absent = -60;

    /// <summary>Fills links, amounts, presence and references of <paramref name="work"/>.</summary>
    /// <param name="problem">The problem.</param>
    /// <param name="work">Receives the guess.</param>
    public static void Set(EquilibriumProblem problem, SolverWorkspace work)
    {
        for (var phase = 0; phase < problem.PhaseCount; phase++)
        {
            work.PhaseAmount[phase] = problem.PhaseGuess[phase];
            work.LnPhaseGuess[phase] = Math.Log(problem.PhaseGuess[phase]);
            work.Present[phase] = true;
        }

        for (var j = 0; j < problem.LinkCount; j++)
        {
            work.Link[j] = problem.LinkFixed[j] ? problem.LinkPotential[j] : Absent;
        }

        for (var j = 0; j < problem.LinkCount; j++)
        {
            if (problem.LinkHasLadder[j])
            {
                work.Link[j] = OxidationLadder.Climb(problem, j, work);
            }
        }

        if (problem.CarbonPhase >= 0 && problem.CarbonIsGasified)
        {
            // Solid carbon is what is left over; starting with it would hold the potential at the carbon's for several steps.
            work.Present[problem.CarbonPhase] = false;
            work.PhaseAmount[problem.CarbonPhase] = 0;
        }

        ReducedSystem.SetReferences(problem, work);
        var guessed = false;
        for (var j = 0; j < problem.LinkCount; j++)
        {
            if (!problem.LinkFixed[j] && work.Link[j] <= Absent)
            {
                work.Link[j] = Highest(problem, j, work);
                guessed = true;
            }
        }

        if (guessed)
        {
            ReducedSystem.SetReferences(problem, work);
        }
    }

    /// <summary>Highest potential of one link at which no species at the present references holds more than there is.</summary>
    private static double Highest(EquilibriumProblem problem, int link, SolverWorkspace work)
    {
        var highest = 60.0;
        var atoms = problem.LinkAtoms[link];
        var lnAmount = Math.Log(problem.LinkAmount[link]);
        for (var element = 0; element <= problem.ElementCount; element++)
        {
            var reference = element < problem.ElementCount ? work.Reference[element] : 0;
            for (var s = problem.GroupStart[element]; s < problem.GroupStart[element + 1]; s++)
            {
                if (atoms[s] <= 0)
                {
                    continue;
                }

                var exponent = problem.LnK[s] + (problem.Multiplicity[s] * reference) + work.LnPhaseGuess[problem.Phase[s]];
                for (var k = 0; k < problem.LinkCount; k++)
                {
                    if (k != link)
                    {
                        exponent += problem.LinkAtoms[k][s] * work.Link[k];
                    }
                }

                // ln of the atoms per species is left out: a guess need not know it.
                highest = Math.Min(highest, (lnAmount - exponent) / atoms[s]);
            }
        }

        return Math.Clamp(highest, Absent, 60);
    }
}
