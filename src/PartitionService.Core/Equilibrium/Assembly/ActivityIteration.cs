using PartitionService.Core.Catalogue;
using PartitionService.Core.Equilibrium.Solvers;

namespace PartitionService.Core.Equilibrium.Assembly;

/// <summary>Solves an assembled case, with passes over activity coefficients that depend on composition.</summary>
/// <remarks>
/// At fixed coefficients the problem has one solution. A pass solves it and moves the coefficients towards those of the new
/// composition, by a step that follows from the last two distances.
/// </remarks>
internal static class ActivityIteration
{
    private const double LargestMove = 3;

    /// <summary>Solves the case.</summary>
    /// <param name="assembly">The case; its ln K of metal and slag species are updated.</param>
    /// <param name="dissolvedOxygenMassFraction">Stated oxygen of the metal as a mass fraction; null with any other statement.</param>
    /// <param name="elements">Atomic masses.</param>
    /// <param name="work">Buffers; hold the solution afterwards.</param>
    /// <param name="cancellation">Stops the iteration.</param>
    public static EquilibriumState Solve(
        VesselAssembly assembly,
        double? dissolvedOxygenMassFraction,
        IReadOnlyDictionary<string, Element> elements,
        SolverWorkspace work,
        CancellationToken cancellation)
    {
        var assembled = assembly.Assembled;
        var slag = assembly.Terms is null ? null : new SlagIteration(assembly, elements);
        slag = slag is { IsEmpty: false } ? slag : null;
        slag?.Start();
        var problem = assembled.Problem;
        var metal = assembled.SolventSpecies < 0 ? [] : assembled.MetalSolutes;
        var lnGamma = new double[metal.Length];
        var fraction = new double[metal.Length];
        var excess = new double[metal.Length];
        var solventLnGamma = 0.0;
        for (var i = 0; i < metal.Length; i++)
        {
            lnGamma[i] = assembled.Species[metal[i]].LnGamma ?? 0;
        }

        var result = SaddleSolver.Solve(problem, work, cancellation);
        var iterations = result.Iterations;
        var barrier = result.UsedBarrier;
        var passes = 0;
        var settled = assembled.Interactions.IsEmpty && dissolvedOxygenMassFraction is null && slag is null;

        // Distances of all coefficients from those of the new composition: solutes, solvent, oxygen potential, slag constants.
        var residual = new double[metal.Length + 2 + (slag?.Count ?? 0)];
        var relaxation = new RelaxationFactor();
        while (result.Stop == SaddleSolver.Stop.Converged && !settled)
        {
            if (++passes > Convergence.ActivityPassLimit)
            {
                return new EquilibriumState(
                    assembled, work, result with { Stop = SaddleSolver.Stop.NotConverged }, iterations, passes, barrier, solventLnGamma);
            }

            for (var i = 0; i < metal.Length; i++)
            {
                fraction[i] = Math.Min(work.MoleFraction[metal[i]], 1);
            }

            assembled.Interactions.Evaluate(fraction, excess, out var solventTarget);
            for (var i = 0; i < metal.Length; i++)
            {
                residual[i] = (assembled.Species[metal[i]].LnGamma ?? 0) + excess[i] - lnGamma[i];
            }

            residual[metal.Length] = solventTarget - solventLnGamma;
            residual[metal.Length + 1] = dissolvedOxygenMassFraction is { } mass
                ? DissolvedPotential(assembled, mass, elements, work, excess) - problem.LinkPotential[assembled.OxygenLink]
                : 0;
            slag?.Measure(work, residual.AsSpan(metal.Length + 2));
            settled = Largest(residual) <= Convergence.ActivityTolerance;
            if (settled)
            {
                break;
            }

            relaxation.Update(residual);
            Bound(residual, relaxation.Value);
            for (var i = 0; i < metal.Length; i++)
            {
                lnGamma[i] += residual[i];
                problem.LnK[metal[i]] = -lnGamma[i];
            }

            solventLnGamma += residual[metal.Length];
            if (assembled.SolventSpecies >= 0)
            {
                problem.LnK[assembled.SolventSpecies] = -solventLnGamma;
            }

            if (dissolvedOxygenMassFraction is not null)
            {
                problem.LinkPotential[assembled.OxygenLink] += residual[metal.Length + 1];
                work.Link[assembled.OxygenLink] = problem.LinkPotential[assembled.OxygenLink];
            }

            slag?.Move(residual.AsSpan(metal.Length + 2));
            ReducedSystem.Shift(problem, work);
            result = SaddleSolver.Continue(problem, work, cancellation);
            iterations += result.Iterations;
            barrier |= result.UsedBarrier;
        }

        return new EquilibriumState(assembled, work, result, iterations, passes, barrier, solventLnGamma);
    }

    /// <summary>Turns distances into moves: times the relaxation factor, at most 3 in any logarithm.</summary>
    private static void Bound(Span<double> residual, double factor)
    {
        for (var i = 0; i < residual.Length; i++)
        {
            residual[i] = Math.Clamp(factor * residual[i], -LargestMove, LargestMove);
        }
    }

    private static double Largest(ReadOnlySpan<double> residual)
    {
        var largest = 0.0;
        foreach (var value in residual)
        {
            largest = Math.Max(largest, Math.Abs(value));
        }

        return largest;
    }

    /// <summary>1/2 ln pO2 at which the metal holds the stated mass fraction of oxygen: ln x_O + ln gamma_O.</summary>
    private static double DissolvedPotential(
        AssembledCase assembled,
        double massFraction,
        IReadOnlyDictionary<string, Element> elements,
        SolverWorkspace work,
        double[] excess)
    {
        double mass = 0, sum = 0;
        var oxygenIndex = -1;
        void Add(int s)
        {
            var record = assembled.Species[s];
            mass += work.MoleFraction[s] * elements[record.Name].AtomicMassGramPerMol;
            sum += work.MoleFraction[s];
        }

        Add(assembled.SolventSpecies);
        for (var i = 0; i < assembled.MetalSolutes.Length; i++)
        {
            var s = assembled.MetalSolutes[i];
            if (assembled.Species[s].Name == "O")
            {
                oxygenIndex = i;
            }
            else
            {
                Add(s);
            }
        }

        // Oxygen itself is left out of the mean and added exactly: w = x M_O / ((1 - x) M + x M_O).
        var others = mass / sum;
        var oxygenMass = elements["O"].AtomicMassGramPerMol;
        var x = massFraction * others / (oxygenMass - (massFraction * (oxygenMass - others)));
        return Math.Log(x) + (assembled.Species[assembled.MetalSolutes[oxygenIndex]].LnGamma ?? 0) + excess[oxygenIndex];
    }
}
