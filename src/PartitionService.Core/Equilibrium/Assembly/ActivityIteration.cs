using PartitionService.Core.Catalogue;
using PartitionService.Core.Equilibrium.Solvers;

namespace PartitionService.Core.Equilibrium.Assembly;

/// <summary>Solves an assembled case, with passes over activity coefficients that depend on composition.</summary>
/// <remarks>
/// At fixed coefficients the problem has one solution. A pass solves it and moves the coefficients towards those of the new
/// composition; the move is halved whenever the passes stop coming closer.
/// </remarks>
internal static class ActivityIteration
{
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
        var damping = 1.0;
        var lastChange = double.PositiveInfinity;
        var settled = assembled.Interactions.IsEmpty && dissolvedOxygenMassFraction is null && slag is null;
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
            var change = Math.Abs(solventTarget - solventLnGamma);
            for (var i = 0; i < metal.Length; i++)
            {
                change = Math.Max(change, Math.Abs((assembled.Species[metal[i]].LnGamma ?? 0) + excess[i] - lnGamma[i]));
            }

            double? potential = dissolvedOxygenMassFraction is { } mass
                ? DissolvedPotential(assembled, mass, elements, work, excess)
                : null;
            if (potential is { } target)
            {
                change = Math.Max(change, Math.Abs(target - problem.LinkPotential[assembled.OxygenLink]));
            }

            if (slag is not null)
            {
                change = Math.Max(change, slag.Move(work, damping));
                if (slag.SulfideIsFull)
                {
                    var sulfur = Array.IndexOf(assembled.Links, "S");
                    return new EquilibriumState(
                        assembled, work, result with { Stop = SaddleSolver.Stop.PotentialUnbounded, Culprit = sulfur }, iterations, passes, barrier, solventLnGamma);
                }
            }

            settled = change <= Convergence.ActivityTolerance;

            // A pass that came as near as its damping lets it asks for a longer step; one that came no nearer for a shorter.
            damping = change > 0.98 * lastChange ? Math.Max(0.02, 0.6 * damping)
                : change < (1 - (0.5 * damping)) * lastChange ? Math.Min(1, 1.3 * damping)
                : damping;
            lastChange = change;
            solventLnGamma += damping * (solventTarget - solventLnGamma);
            for (var i = 0; i < metal.Length; i++)
            {
                lnGamma[i] += damping * ((assembled.Species[metal[i]].LnGamma ?? 0) + excess[i] - lnGamma[i]);
                problem.LnK[metal[i]] = -lnGamma[i];
            }

            if (assembled.SolventSpecies >= 0)
            {
                problem.LnK[assembled.SolventSpecies] = -solventLnGamma;
            }

            if (potential is { } next)
            {
                problem.LinkPotential[assembled.OxygenLink] += damping * (next - problem.LinkPotential[assembled.OxygenLink]);
                work.Link[assembled.OxygenLink] = problem.LinkPotential[assembled.OxygenLink];
            }

            if (!settled)
            {
                ReducedSystem.Shift(problem, work);
                result = SaddleSolver.Continue(problem, work, cancellation);
                iterations += result.Iterations;
                barrier |= result.UsedBarrier;
            }
        }

        return new EquilibriumState(assembled, work, result, iterations, passes, barrier, solventLnGamma);
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
