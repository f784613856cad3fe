namespace PartitionService.Core.Equilibrium.Solvers;

/// <summary>The slower method that always converges, for what Newton's method does not finish.</summary>
/// <remarks>
/// At fixed amounts the Lagrangian is concave in the linking potentials; its maximum, as a function of the amounts, is
/// convex (multiphase Rachford-Rice: Michelsen 1994). A barrier -mu sum ln N keeps the amounts positive while mu goes to
/// zero, so no phase has to be switched. Both levels are damped Newton methods whose steps are accepted on the sign of the
/// directional derivative, which unlike the function value does not cancel.
/// </remarks>
internal static class BarrierMethod
{
    private const int Stride = SolverWorkspace.MaximumBorder;

    /// <summary>Factor from one mu to the next.</summary>
    private const double BarrierFactor = 0.03;

    /// <summary>Share of all atoms below which the barrier decides nothing any more.</summary>
    private const double NearEnough = 1e-8;

    /// <summary>Why the method ended.</summary>
    public enum Stop
    {
        /// <summary>Amounts and potentials are near the solution; polish with <see cref="ReducedNewton"/>.</summary>
        Converged,

        /// <summary>A linking potential grows without bound: the component has no home.</summary>
        PotentialUnbounded,

        /// <summary>A phase amount grows without bound: the fixed potentials ask for more than the phase can hold.</summary>
        AmountUnbounded,

        /// <summary>An iteration limit was reached.</summary>
        Stalled,
    }

    /// <summary>Follows the barrier from the state of <paramref name="work"/> to a small mu.</summary>
    /// <param name="problem">The problem.</param>
    /// <param name="work">State and buffers.</param>
    /// <param name="culprit">Link or phase that grows without bound; -1 otherwise.</param>
    /// <param name="iterations">Receives the number of steps, added to its value.</param>
    /// <param name="cancellation">Stops the iteration.</param>
    public static Stop Run(
        EquilibriumProblem problem, SolverWorkspace work, out int culprit, ref int iterations, CancellationToken cancellation)
    {
        culprit = -1;
        var total = 0.0;
        for (var phase = 0; phase < problem.PhaseCount; phase++)
        {
            work.Present[phase] = true;
            work.PhaseAmount[phase] = problem.PhaseGuess[phase];
            total += work.PhaseAmount[phase];
        }

        ReducedSystem.SetReferences(problem, work);
        Span<double> before = stackalloc double[EquilibriumProblem.MaximumPhases];
        Span<double> after = stackalloc double[EquilibriumProblem.MaximumPhases];
        for (var mu = 0.1 * total; mu > 1e-16 * total; mu *= BarrierFactor)
        {
            after.CopyTo(before);
            work.PhaseAmount.CopyTo(after);
            var stop = MinimiseAmounts(problem, work, mu, 1e12 * total, out culprit, ref iterations, cancellation);
            if (stop == Stop.Stalled && mu < NearEnough * total)
            {
                // Rounding of the sums ends the path; Newton's method takes it from here.
                break;
            }

            if (stop != Stop.Converged)
            {
                return stop;
            }
        }

        for (var phase = 0; phase < problem.PhaseCount; phase++)
        {
            // On the path N (1 - sum x) = mu: of a phase that is absent the amount follows mu, of one that is present the deficit does.
            if (after[phase] < 3 * BarrierFactor * before[phase])
            {
                work.Present[phase] = false;
                work.PhaseAmount[phase] = 0;
            }
        }

        return Stop.Converged;
    }

    private static Stop MinimiseAmounts(
        EquilibriumProblem problem,
        SolverWorkspace work,
        double mu,
        double bound,
        out int culprit,
        ref int iterations,
        CancellationToken cancellation)
    {
        var links = problem.LinkCount;
        var phases = problem.PhaseCount;
        Span<double> amounts = stackalloc double[EquilibriumProblem.MaximumPhases];
        Span<double> step = stackalloc double[EquilibriumProblem.MaximumPhases];
        Span<double> gradient = stackalloc double[EquilibriumProblem.MaximumPhases];
        var inner = MaximisePotentials(problem, work, out culprit, ref iterations, cancellation);
        if (inner != Stop.Converged)
        {
            return inner;
        }

        for (var iteration = 0; iteration < 200; iteration++)
        {
            var largest = 0.0;
            for (var phase = 0; phase < phases; phase++)
            {
                gradient[phase] = work.Gradient[links + phase] - (mu / work.PhaseAmount[phase]);
                largest = Math.Max(largest, Math.Abs(gradient[phase]) * work.PhaseAmount[phase]);
                if (work.PhaseAmount[phase] > bound)
                {
                    culprit = phase;
                    return Stop.AmountUnbounded;
                }
            }

            if (largest <= 0.01 * mu)
            {
                return Stop.Converged;
            }

            if (!SchurStep(problem, work, mu, gradient, step))
            {
                return Stop.Stalled;
            }

            var slope = 0.0;
            var length = 1.0;
            for (var phase = 0; phase < phases; phase++)
            {
                amounts[phase] = work.PhaseAmount[phase];
                slope += gradient[phase] * step[phase];
                if (step[phase] < 0)
                {
                    length = Math.Min(length, -0.95 * amounts[phase] / step[phase]);
                }
            }

            for (var trial = 0; trial < 60; trial++, length *= 0.4)
            {
                for (var phase = 0; phase < phases; phase++)
                {
                    work.PhaseAmount[phase] = amounts[phase] + (length * step[phase]);
                }

                inner = MaximisePotentials(problem, work, out culprit, ref iterations, cancellation);
                if (inner != Stop.Converged)
                {
                    return inner;
                }

                var derivative = 0.0;
                for (var phase = 0; phase < phases; phase++)
                {
                    derivative += (work.Gradient[links + phase] - (mu / work.PhaseAmount[phase])) * step[phase];
                }

                if (derivative <= 0.5 * Math.Abs(slope))
                {
                    break;
                }
            }
        }

        return Stop.Stalled;
    }

    /// <summary>Newton step in the amounts with the potentials following their maximum.</summary>
    private static bool SchurStep(
        EquilibriumProblem problem, SolverWorkspace work, double mu, ReadOnlySpan<double> gradient, Span<double> step)
    {
        var links = problem.LinkCount;
        var size = 0;
        for (var j = 0; j < links; j++)
        {
            if (!problem.LinkFixed[j])
            {
                work.Unknown[size++] = j;
            }
        }

        var free = size;
        for (var phase = 0; phase < problem.PhaseCount; phase++)
        {
            work.Unknown[size++] = links + phase;
        }

        for (var row = 0; row < size; row++)
        {
            for (var column = 0; column < size; column++)
            {
                work.Matrix[(row * Stride) + column] = work.Hessian[(work.Unknown[row] * Stride) + work.Unknown[column]];
            }

            if (row < free)
            {
                work.Step[row] = 0;
            }
            else
            {
                var amount = work.PhaseAmount[row - free];
                work.Matrix[(row * Stride) + row] += mu / (amount * amount);
                work.Step[row] = -gradient[row - free];
            }
        }

        if (!BorderSystem.Solve(work.Matrix, work.Step, size, Stride))
        {
            return false;
        }

        var descent = 0.0;
        for (var phase = 0; phase < problem.PhaseCount; phase++)
        {
            step[phase] = work.Step[free + phase];
            descent += step[phase] * gradient[phase];
        }

        if (!(descent < 0))
        {
            // Rounding spoiled the Schur complement; scaled steepest descent always goes down.
            for (var phase = 0; phase < problem.PhaseCount; phase++)
            {
                var amount = work.PhaseAmount[phase];
                step[phase] = -gradient[phase] * amount * amount / (mu + amount);
            }
        }

        return true;
    }

    private static Stop MaximisePotentials(
        EquilibriumProblem problem, SolverWorkspace work, out int culprit, ref int iterations, CancellationToken cancellation)
    {
        culprit = -1;
        Span<double> start = stackalloc double[EquilibriumProblem.MaximumLinks];
        Span<double> step = stackalloc double[EquilibriumProblem.MaximumLinks];
        ReducedSystem.SetReferences(problem, work);
        for (var iteration = 0; iteration < 400; iteration++)
        {
            cancellation.ThrowIfCancellationRequested();
            if (!EvaluateAnywhere(problem, work))
            {
                return Stop.Stalled;
            }

            iterations++;
            var largest = 0.0;
            var size = 0;
            for (var j = 0; j < problem.LinkCount; j++)
            {
                if (problem.LinkFixed[j])
                {
                    continue;
                }

                largest = Math.Max(largest, Math.Abs(work.Gradient[j]) / work.LinkGross[j]);
                work.Unknown[size++] = j;
                if (Math.Abs(work.Link[j]) > Convergence.UnboundedPotential)
                {
                    culprit = j;
                    return Stop.PotentialUnbounded;
                }
            }

            if (largest <= 1e-12)
            {
                return Stop.Converged;
            }

            NewtonDirection(problem, work, size, step);
            var limit = 1.0;
            var slope = 0.0;
            for (var j = 0; j < problem.LinkCount; j++)
            {
                start[j] = work.Link[j];
                slope += work.Gradient[j] * step[j];
                limit = Math.Min(limit, 5 / Math.Max(1e-300, Math.Abs(step[j])));
            }

            var length = limit;
            var tiny = true;
            for (var trial = 0; trial < 40; trial++, length *= 0.4)
            {
                for (var j = 0; j < problem.LinkCount; j++)
                {
                    work.Link[j] = start[j] + (length * step[j]);
                    tiny &= Math.Abs(length * step[j]) < 1e-15 * Math.Max(1, Math.Abs(start[j]));
                }

                if (!EvaluateAnywhere(problem, work))
                {
                    continue;
                }

                var derivative = 0.0;
                for (var j = 0; j < problem.LinkCount; j++)
                {
                    derivative += problem.LinkFixed[j] ? 0 : work.Gradient[j] * step[j];
                }

                if (derivative >= -0.5 * Math.Abs(slope))
                {
                    break;
                }
            }

            if (tiny)
            {
                return Stop.Converged;
            }
        }

        return Stop.Stalled;
    }

    private static void NewtonDirection(EquilibriumProblem problem, SolverWorkspace work, int size, Span<double> step)
    {
        step.Clear();
        for (var row = 0; row < size; row++)
        {
            var j = work.Unknown[row];
            for (var column = 0; column < size; column++)
            {
                work.Matrix[(row * Stride) + column] = work.Hessian[(j * Stride) + work.Unknown[column]];
            }

            // A component that nothing holds at this potential has no curvature; a small one keeps the step finite.
            work.Matrix[(row * Stride) + row] -= (1e-14 * work.LinkGross[j]) + 1e-290;
            work.Step[row] = -work.Gradient[j];
        }

        var solved = BorderSystem.Solve(work.Matrix, work.Step, size, Stride);
        var ascent = 0.0;
        for (var row = 0; row < size; row++)
        {
            ascent += work.Step[row] * work.Gradient[work.Unknown[row]];
        }

        for (var row = 0; row < size; row++)
        {
            var j = work.Unknown[row];
            step[j] = solved && ascent > 0 ? work.Step[row] : work.Gradient[j] / work.LinkGross[j];
        }
    }

    private static bool EvaluateAnywhere(EquilibriumProblem problem, SolverWorkspace work)
    {
        if (ReducedSystem.Evaluate(problem, work))
        {
            return true;
        }

        ReducedSystem.SetReferences(problem, work);
        return ReducedSystem.Evaluate(problem, work);
    }
}
