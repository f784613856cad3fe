namespace PartitionService.Core.Equilibrium.Solvers;

/// <summary>Solves a problem at fixed activity coefficients: the fast method first, the always convergent one where it stops short.</summary>
internal static class SaddleSolver
{
    /// <summary>Why a solve ended.</summary>
    public enum Stop
    {
        /// <summary>Every stopping rule is met.</summary>
        Converged,

        /// <summary>A linking component has no home in the phases present.</summary>
        PotentialUnbounded,

        /// <summary>The fixed potentials would take an unlimited amount of a phase.</summary>
        AmountUnbounded,

        /// <summary>No method converged.</summary>
        NotConverged,
    }

    /// <summary>Result of a solve; the state itself is in the workspace.</summary>
    /// <param name="Stop">Why it ended.</param>
    /// <param name="Culprit">Link (PotentialUnbounded) or phase (AmountUnbounded), otherwise -1.</param>
    /// <param name="Iterations">Newton steps.</param>
    /// <param name="UsedBarrier">True where the barrier method ran.</param>
    public readonly record struct Result(Stop Stop, int Culprit, int Iterations, bool UsedBarrier);

    /// <summary>Solves from a cold start.</summary>
    /// <param name="problem">The problem.</param>
    /// <param name="work">Buffers; hold the solution afterwards.</param>
    /// <param name="cancellation">Stops the iteration.</param>
    public static Result Solve(EquilibriumProblem problem, SolverWorkspace work, CancellationToken cancellation)
    {
        work.Reserve(problem);
        ColdStart.Set(problem, work);
        return Continue(problem, work, cancellation);
    }

    /// <summary>Solves from the state of the workspace, for example after activity coefficients have changed a little.</summary>
    public static Result Continue(EquilibriumProblem problem, SolverWorkspace work, CancellationToken cancellation)
    {
        var iterations = 0;
        if (ReducedNewton.TrySolve(problem, work, ref iterations, cancellation))
        {
            return new Result(Stop.Converged, -1, iterations, false);
        }

        ColdStart.Set(problem, work);
        var stop = BarrierMethod.Run(problem, work, out var culprit, ref iterations, cancellation);
        if (stop == BarrierMethod.Stop.PotentialUnbounded)
        {
            return new Result(Stop.PotentialUnbounded, culprit, iterations, true);
        }

        if (stop == BarrierMethod.Stop.AmountUnbounded)
        {
            return new Result(Stop.AmountUnbounded, culprit, iterations, true);
        }

        ReducedSystem.SetReferences(problem, work);
        var polished = ReducedNewton.TrySolve(problem, work, ref iterations, cancellation);
        return new Result(polished ? Stop.Converged : Stop.NotConverged, -1, iterations, true);
    }
}
