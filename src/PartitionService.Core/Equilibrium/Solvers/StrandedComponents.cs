namespace PartitionService.Core.Equilibrium.Solvers;

/// <summary>Components whose every phase is absent: a state that no equation can describe.</summary>
internal static class StrandedComponents
{
    /// <summary>True where taking a phase away would leave a component without any present phase.</summary>
    public static bool WouldStrand(EquilibriumProblem problem, SolverWorkspace work, int phase)
    {
        for (var element = 0; element < problem.ElementCount; element++)
        {
            if (!HasOther(problem, work, problem.GroupStart[element], problem.GroupStart[element + 1], null, phase))
            {
                return true;
            }
        }

        for (var j = 0; j < problem.LinkCount; j++)
        {
            if (!problem.LinkFixed[j] && !HasOther(problem, work, 0, problem.SpeciesCount, problem.LinkAtoms[j], phase))
            {
                return true;
            }
        }

        return false;
    }

    /// <summary>Brings back, for every stranded element, the phase that is nearest to forming, with just the element's amount.</summary>
    public static void Rescue(EquilibriumProblem problem, SolverWorkspace work)
    {
        for (var element = 0; element < problem.ElementCount; element++)
        {
            var first = problem.GroupStart[element];
            var last = problem.GroupStart[element + 1];
            if (HasOther(problem, work, first, last, null, -1))
            {
                continue;
            }

            var nearest = problem.Phase[first];
            for (var s = first + 1; s < last; s++)
            {
                nearest = work.PhaseSum[problem.Phase[s]] > work.PhaseSum[nearest] ? problem.Phase[s] : nearest;
            }

            work.Present[nearest] = true;
            work.PhaseAmount[nearest] = Math.Max(work.PhaseAmount[nearest], problem.ElementAmount[element]);
        }
    }

    private static bool HasOther(
        EquilibriumProblem problem, SolverWorkspace work, int first, int last, double[]? atoms, int phase)
    {
        for (var s = first; s < last; s++)
        {
            if (problem.Phase[s] != phase && work.Present[problem.Phase[s]] && (atoms is null || atoms[s] > 0))
            {
                return true;
            }
        }

        return false;
    }
}
