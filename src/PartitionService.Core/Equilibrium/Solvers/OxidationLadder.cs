namespace PartitionService.Core.Equilibrium.Solvers;

/// <summary>The order of oxidation (or chlorination) as a first guess: elements take the component from the most stable compound down.</summary>
/// <remarks>
/// Every element steps from its reduced form to its first compound, and from there to a richer one where it has one. A step sits at the
/// potential at which both sides hold equal amounts. With a given amount of the component the step that is reached last sets
/// the potential; with a given potential every step below it is taken. What each element has become gives the phase amounts.
/// </remarks>
internal static class OxidationLadder
{
    private const int StepsPerElement = 2;

    /// <summary>Climbs the ladder of one link.</summary>
    /// <param name="problem">The problem.</param>
    /// <param name="link">The component.</param>
    /// <param name="work">Phase amounts in: guess; out: refined for metal and slag (phases whose elements the ladder moves).</param>
    /// <returns>The potential; the fixed one where it is fixed.</returns>
    public static double Climb(EquilibriumProblem problem, int link, SolverWorkspace work)
    {
        var count = problem.ElementCount;
        var steps = work.LadderSteps;
        var total = 0;
        for (var element = 0; element < count; element++)
        {
            total = AddSteps(problem, link, element, work, total);
        }

        Span<double> added = stackalloc double[EquilibriumProblem.MaximumPhases];
        added.Clear();
        var isFixed = problem.LinkFixed[link];
        var rest = isFixed ? double.PositiveInfinity : problem.LinkAmount[link];
        var potential = isFixed ? problem.LinkPotential[link] : double.NaN;
        var taken = 0;
        for (; taken < total; taken++)
        {
            SwapLowest(steps, taken, total);
            ref var step = ref steps[taken];
            if (isFixed && step.Potential > potential)
            {
                break;
            }

            var share = isFixed ? 1 : Math.Min(1, rest / step.Demand);
            if (step.From >= 0)
            {
                added[step.From] -= share * step.Amount;
            }

            added[step.To] += share * step.Amount;
            rest -= step.Demand;
            if (rest <= 0)
            {
                var split = Math.Clamp(share, 0.02, 0.98);
                potential = step.Potential + (Math.Log(split / (1 - split)) / step.Atoms);
                break;
            }
        }

        if (double.IsNaN(potential))
        {
            potential = total > 0 ? steps[total - 1].Potential + 2 : -20;
        }

        var last = Math.Min(taken, total - 1);
        for (var phase = 0; phase < problem.PhaseCount; phase++)
        {
            // A phase that loses nearly everything keeps a share of its guess, so that no amount starts at zero.
            work.PhaseAmount[phase] = Math.Max(work.PhaseAmount[phase] + added[phase], 0.02 * work.PhaseAmount[phase]);
        }

        if (!isFixed && last >= 0 && steps[last].From >= 0)
        {
            // The step's potential was taken at the first guess of the amounts; move it to the refined ones.
            potential += (Math.Log(work.PhaseAmount[steps[last].From]) - work.LnPhaseGuess[steps[last].From]
                - Math.Log(work.PhaseAmount[steps[last].To]) + work.LnPhaseGuess[steps[last].To]) / steps[last].Atoms;
        }

        return Math.Clamp(potential, -60, 20);
    }

    /// <summary>A step of one element.</summary>
    internal struct Step
    {
        /// <summary>Potential at which both sides hold equal amounts.</summary>
        public double Potential;

        /// <summary>Amount of the component that the step takes, mol.</summary>
        public double Demand;

        /// <summary>Amount of the element, mol.</summary>
        public double Amount;

        /// <summary>Atoms of the component taken per atom of the element.</summary>
        public double Atoms;

        /// <summary>Phase that the element leaves; -1 where it stays in its phase.</summary>
        public int From;

        /// <summary>Phase that the element goes to.</summary>
        public int To;
    }

    private static int AddSteps(EquilibriumProblem problem, int link, int element, SolverWorkspace work, int total)
    {
        var atoms = problem.LinkAtoms[link];
        if (!Holds(problem, element, problem.SlagPhase) && !Holds(problem, element, problem.CarbonPhase))
        {
            return total;
        }

        int reduced = -1, first = -1, second = -1;
        double reducedLevel = double.NegativeInfinity, firstPotential = double.PositiveInfinity, secondPotential = double.PositiveInfinity;
        for (var s = problem.GroupStart[element]; s < problem.GroupStart[element + 1]; s++)
        {
            if (atoms[s] == 0 && problem.Multiplicity[s] == 1 && Level(problem, work, link, s) is var level && level > reducedLevel)
            {
                reduced = s;
                reducedLevel = level;
            }
        }

        for (var s = problem.GroupStart[element]; s < problem.GroupStart[element + 1] && reduced >= 0; s++)
        {
            if (atoms[s] > 0 && problem.Multiplicity[s] == 1 && IsCompound(problem, element, s)
                && (reducedLevel - Level(problem, work, link, s)) / atoms[s] is var potential && potential < firstPotential)
            {
                first = s;
                firstPotential = potential;
            }
        }

        if (first < 0)
        {
            return total;
        }

        total = Add(problem, work, element, reduced, first, atoms[first], firstPotential, total);
        var firstLevel = Level(problem, work, link, first);
        for (var s = problem.GroupStart[element]; s < problem.GroupStart[element + 1]; s++)
        {
            if (atoms[s] > atoms[first] && problem.Multiplicity[s] == 1 && IsCompound(problem, element, s)
                && (firstLevel - Level(problem, work, link, s)) / (atoms[s] - atoms[first]) is var potential && potential < secondPotential)
            {
                second = s;
                secondPotential = potential;
            }
        }

        return second < 0
            ? total
            : Add(problem, work, element, first, second, atoms[second] - atoms[first], Math.Max(firstPotential, secondPotential), total);
    }

    private static int Add(
        EquilibriumProblem problem, SolverWorkspace work, int element, int from, int to, double atoms, double potential, int total)
    {
        work.LadderSteps[total] = new Step
        {
            Potential = potential,
            Demand = atoms * problem.ElementAmount[element],
            Amount = problem.ElementAmount[element],
            Atoms = atoms,
            From = problem.Phase[from] == problem.Phase[to] ? -1 : problem.Phase[from],
            To = problem.Phase[to],
        };
        if (problem.Phase[from] == problem.Phase[to])
        {
            work.LadderSteps[total].Amount = 0;
        }

        return total + 1;
    }

    /// <summary>Compounds that count: those in the slag, and for carbon its gases.</summary>
    private static bool IsCompound(EquilibriumProblem problem, int element, int species) =>
        problem.Phase[species] == problem.SlagPhase || Holds(problem, element, problem.CarbonPhase);

    private static bool Holds(EquilibriumProblem problem, int element, int phase)
    {
        for (var s = problem.GroupStart[element]; s < problem.GroupStart[element + 1]; s++)
        {
            if (problem.Phase[s] == phase)
            {
                return true;
            }
        }

        return false;
    }

    /// <summary>ln of the amount that a species would hold at unit activities of the element and of this link.</summary>
    private static double Level(EquilibriumProblem problem, SolverWorkspace work, int link, int species)
    {
        var level = problem.LnK[species] + work.LnPhaseGuess[problem.Phase[species]];
        for (var j = 0; j < problem.LinkCount; j++)
        {
            if (j != link)
            {
                level += problem.LinkAtoms[j][species] * work.Link[j];
            }
        }

        return level;
    }

    private static void SwapLowest(Step[] steps, int start, int end)
    {
        var lowest = start;
        for (var index = start + 1; index < end; index++)
        {
            if (steps[index].Potential < steps[lowest].Potential)
            {
                lowest = index;
            }
        }

        (steps[start], steps[lowest]) = (steps[lowest], steps[start]);
    }

    /// <summary>Room that the ladder of a problem needs.</summary>
    public static int Capacity(int elementCount) => StepsPerElement * elementCount;
}
