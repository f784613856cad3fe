namespace PartitionService.Core.Equilibrium.Solvers;

/// <summary>First guess of the linking potentials and phase amounts, from the problem alone.</summary>
internal static class ColdStart
{
    /// <summary>Fills links, amounts, presence and references of <paramref name="work"/>.</summary>
    /// <param name="problem">The problem.</param>
    /// <param name="oxygen">Index of oxygen among the links, or -1.</param>
    /// <param name="work">Receives the guess.</param>
    public static void Set(EquilibriumProblem problem, int oxygen, SolverWorkspace work)
    {
        for (var phase = 0; phase < problem.PhaseCount; phase++)
        {
            work.PhaseAmount[phase] = problem.PhaseGuess[phase];
            work.Present[phase] = true;
        }

        for (var j = 0; j < problem.LinkCount; j++)
        {
            // Absent until guessed: far below any potential that matters, far above underflow.
            work.Link[j] = problem.LinkFixed[j] ? problem.LinkPotential[j] : -60;
        }

        if (oxygen >= 0 && !problem.LinkFixed[oxygen])
        {
            work.Link[oxygen] = OxygenLadder(problem, oxygen, work);
        }

        ReducedSystem.SetReferences(problem, work);
        for (var j = 0; j < problem.LinkCount; j++)
        {
            if (j != oxygen && !problem.LinkFixed[j])
            {
                work.Link[j] = Highest(problem, j, work);
            }
        }

        ReducedSystem.SetReferences(problem, work);
    }

    /// <summary>
    /// The order of oxidation: elements take oxygen from the most to the least stable oxide until the charge's oxygen is used up;
    /// the oxide that is reached last sets the potential.
    /// </summary>
    private static double OxygenLadder(EquilibriumProblem problem, int oxygen, SolverWorkspace work)
    {
        var count = problem.ElementCount;
        Span<double> half = stackalloc double[count];
        Span<double> demand = stackalloc double[count];
        var atoms = problem.LinkAtoms[oxygen];
        for (var element = 0; element < count; element++)
        {
            half[element] = double.PositiveInfinity;
            double reduced = double.NegativeInfinity;
            for (var s = problem.GroupStart[element]; s < problem.GroupStart[element + 1]; s++)
            {
                if (atoms[s] == 0 && problem.Multiplicity[s] == 1)
                {
                    reduced = Math.Max(reduced, problem.LnK[s] + Math.Log(work.PhaseAmount[problem.Phase[s]]));
                }
            }

            for (var s = problem.GroupStart[element]; s < problem.GroupStart[element + 1]; s++)
            {
                if (atoms[s] > 0 && problem.Multiplicity[s] == 1)
                {
                    var oxidised = problem.LnK[s] + Math.Log(work.PhaseAmount[problem.Phase[s]]);
                    var equal = double.IsNegativeInfinity(reduced) ? -40 : (reduced - oxidised) / atoms[s];
                    if (equal < half[element])
                    {
                        half[element] = equal;
                        demand[element] = atoms[s] * problem.ElementAmount[element];
                    }
                }
            }
        }

        var rest = problem.LinkAmount[oxygen];
        var level = -20.0;
        for (var taken = 0; taken < count; taken++)
        {
            var next = -1;
            for (var element = 0; element < count; element++)
            {
                if (double.IsFinite(half[element]) && (next < 0 || half[element] < half[next]))
                {
                    next = element;
                }
            }

            if (next < 0)
            {
                break;
            }

            level = half[next];
            half[next] = double.PositiveInfinity;
            if (demand[next] >= rest)
            {
                var share = Math.Clamp(rest / demand[next], 0.05, 0.95);
                return Math.Clamp(level + Math.Log(share / (1 - share)), -60, 20);
            }

            rest -= demand[next];
        }

        return Math.Clamp(Math.Max(level + 1, Highest(problem, oxygen, work)), -60, 20);
    }

    /// <summary>Highest potential of one link at which no species at the present references holds more than there is.</summary>
    private static double Highest(EquilibriumProblem problem, int link, SolverWorkspace work)
    {
        var highest = 60.0;
        var atoms = problem.LinkAtoms[link];
        var linkOnly = problem.GroupStart[problem.ElementCount];
        for (var element = 0; element <= problem.ElementCount; element++)
        {
            for (var s = problem.GroupStart[element]; s < problem.GroupStart[element + 1]; s++)
            {
                if (atoms[s] <= 0)
                {
                    continue;
                }

                var exponent = problem.LnK[s] + (s < linkOnly ? problem.Multiplicity[s] * work.Reference[element] : 0);
                for (var k = 0; k < problem.LinkCount; k++)
                {
                    if (k != link)
                    {
                        exponent += problem.LinkAtoms[k][s] * work.Link[k];
                    }
                }

                var limit = Math.Log(problem.LinkAmount[link] / (atoms[s] * work.PhaseAmount[problem.Phase[s]]));
                highest = Math.Min(highest, (limit - exponent) / atoms[s]);
            }
        }

        return Math.Clamp(highest, -60, 60);
    }
}
