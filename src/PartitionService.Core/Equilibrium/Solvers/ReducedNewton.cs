namespace PartitionService.Core.Equilibrium.Solvers;

/// <summary>Newton's method on the reduced saddle: the fast method, from a cold or a warm start.</summary>
/// <remarks>
/// Steps are limited to 2.5 in each potential and in the logarithm of each amount. A phase that keeps shrinking is taken away;
/// it comes back when the sum of its mole fractions exceeds 1 at the solution without it, so phases appear and vanish without a jump.
/// </remarks>
internal static class ReducedNewton
{
    private const int Stride = SolverWorkspace.MaximumBorder;
    private const double LargestPotentialStep = 2.5;
    private const double LargestAmountStep = 2.5;

    /// <summary>
    /// Relative addition to the diagonal of the amounts. With fewer components than phases (one metal under slag and gas at a fixed
    /// oxygen potential) the amounts' block is singular; this much above rounding makes the step shrink the phases whose sum is below 1.
    /// </summary>
    private const double PhaseRegularisation = 1e-12;

    /// <summary>Iterates from the state of <paramref name="work"/>.</summary>
    /// <param name="problem">The problem.</param>
    /// <param name="work">State and buffers; references must be set.</param>
    /// <param name="iterations">Receives the number of steps, added to its value.</param>
    /// <param name="cancellation">Stops the iteration.</param>
    /// <returns>True where every stopping rule is met.</returns>
    public static bool TrySolve(EquilibriumProblem problem, SolverWorkspace work, ref int iterations, CancellationToken cancellation)
    {
        Span<int> shrinking = stackalloc int[EquilibriumProblem.MaximumPhases];
        Span<int> formed = stackalloc int[EquilibriumProblem.MaximumPhases];
        shrinking.Clear();
        formed.Clear();
        StrandedComponents.Rescue(problem, work);
        var lastStep = double.PositiveInfinity;
        for (var step = 0; step < Convergence.NewtonLimit; step++)
        {
            cancellation.ThrowIfCancellationRequested();
            if (!ReducedSystem.Evaluate(problem, work))
            {
                ReducedSystem.SetReferences(problem, work);
                if (!ReducedSystem.Evaluate(problem, work))
                {
                    return false;
                }
            }

            if (Residual(problem, work) <= Convergence.Tolerance || lastStep <= Convergence.StepTolerance)
            {
                if (!FormMissingPhase(problem, work, formed))
                {
                    return Residual(problem, work) <= 1e3 * Convergence.Tolerance;
                }

                lastStep = double.PositiveInfinity;
                shrinking.Clear();
                continue;
            }

            iterations++;
            var size = Assemble(problem, work);
            if (size == 0 || !BorderSystem.Solve(work.Matrix, work.Step, size, Stride))
            {
                return false;
            }

            lastStep = Move(problem, work, size, shrinking);
            if (!double.IsFinite(lastStep))
            {
                return false;
            }
        }

        return false;
    }

    /// <summary>Largest relative residual over unknown links and present phases.</summary>
    public static double Residual(EquilibriumProblem problem, SolverWorkspace work)
    {
        var residual = 0.0;
        for (var j = 0; j < problem.LinkCount; j++)
        {
            if (!problem.LinkFixed[j])
            {
                residual = Math.Max(residual, Math.Abs(work.Gradient[j]) / work.LinkGross[j]);
            }
        }

        for (var phase = 0; phase < problem.PhaseCount; phase++)
        {
            if (work.Present[phase])
            {
                residual = Math.Max(residual, Math.Abs(work.Gradient[problem.LinkCount + phase]));
            }
        }

        return residual;
    }

    private static bool FormMissingPhase(EquilibriumProblem problem, SolverWorkspace work, Span<int> formed)
    {
        var total = 0.0;
        for (var phase = 0; phase < problem.PhaseCount; phase++)
        {
            total += work.PhaseAmount[phase];
        }

        var any = false;
        for (var phase = 0; phase < problem.PhaseCount; phase++)
        {
            if (!work.Present[phase] && work.PhaseSum[phase] > 1 + Convergence.FormationTolerance)
            {
                work.Present[phase] = true;

                // A phase that was taken away too soon holds very little: seed it with less each time.
                work.PhaseAmount[phase] = Math.Min(1e-4 * total, 0.1 * problem.PhaseGuess[phase]) * Math.Pow(1e-3, formed[phase]++);
                any = true;
            }
        }

        return any;
    }

    private static int Assemble(EquilibriumProblem problem, SolverWorkspace work)
    {
        var size = 0;
        for (var j = 0; j < problem.LinkCount; j++)
        {
            if (!problem.LinkFixed[j])
            {
                work.Unknown[size++] = j;
            }
        }

        for (var phase = 0; phase < problem.PhaseCount; phase++)
        {
            if (work.Present[phase])
            {
                work.Unknown[size++] = problem.LinkCount + phase;
            }
        }

        for (var row = 0; row < size; row++)
        {
            var border = work.Unknown[row];
            for (var column = 0; column < size; column++)
            {
                work.Matrix[(row * Stride) + column] = work.Hessian[(border * Stride) + work.Unknown[column]];
            }

            if (border >= problem.LinkCount)
            {
                work.Matrix[(row * Stride) + row] *= 1 + PhaseRegularisation;
            }

            work.Step[row] = RightSide(problem, work, border);
        }

        return size;
    }

    /// <summary>Right side of Newton's method on the logarithms of the sums and balances.</summary>
    /// <remarks>
    /// Sums and balances are exponentials of the unknowns, so ln(sum) = 0 and ln(held/amount) = 0 are nearly linear where the plain
    /// residuals are not. The rows of the Jacobian only gain a common factor, so the change is one of the right side:
    /// S ln S for 1 - S, h ln(h/b) for b - h.
    /// </remarks>
    private static double RightSide(EquilibriumProblem problem, SolverWorkspace work, int border)
    {
        var gradient = work.Gradient[border];
        if (border >= problem.LinkCount)
        {
            var sum = work.PhaseSum[border - problem.LinkCount];
            return sum > 1e-300 ? sum * Math.Log(sum) : -gradient;
        }

        var held = problem.LinkAmount[border] - gradient;
        return held > 0 ? held * Math.Log(held / problem.LinkAmount[border]) : -gradient;
    }

    private static double Move(
        EquilibriumProblem problem, SolverWorkspace work, int size, Span<int> shrinking)
    {
        var scale = 1.0;
        for (var row = 0; row < size; row++)
        {
            if (work.Unknown[row] < problem.LinkCount)
            {
                scale = Math.Min(scale, LargestPotentialStep / Math.Abs(work.Step[row]));
            }
        }

        var largest = 0.0;
        for (var row = 0; row < size; row++)
        {
            var border = work.Unknown[row];
            var move = scale * work.Step[row];
            if (border < problem.LinkCount)
            {
                work.Link[border] += move;
                largest = Math.Max(largest, Math.Abs(move) / Math.Max(1, Math.Abs(work.Link[border])));
                continue;
            }

            var phase = border - problem.LinkCount;
            var amount = work.PhaseAmount[phase];
            var exponent = Math.Clamp(move / amount, -LargestAmountStep, LargestAmountStep);
            var next = amount * Math.Exp(exponent);
            largest = Math.Max(largest, Math.Abs(exponent));
            shrinking[phase] = exponent <= -LargestAmountStep && work.PhaseSum[phase] < 1 ? shrinking[phase] + 1 : 0;
            if (shrinking[phase] >= 2 && !IsOnly(problem, work, phase) && !StrandedComponents.WouldStrand(problem, work, phase))
            {
                work.Present[phase] = false;
                next = 0;
            }

            work.PhaseAmount[phase] = next;
        }

        return largest;
    }

    /// <summary>True where no other phase is present: something has to hold the elements.</summary>
    private static bool IsOnly(EquilibriumProblem problem, SolverWorkspace work, int phase)
    {
        for (var other = 0; other < problem.PhaseCount; other++)
        {
            if (other != phase && work.Present[other])
            {
                return false;
            }
        }

        return true;
    }
}
