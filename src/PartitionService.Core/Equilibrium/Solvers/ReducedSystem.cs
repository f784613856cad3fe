using System.Numerics;

namespace PartitionService.Core.Equilibrium.Solvers;

/// <summary>Gradient and Hessian of the equilibrium after the carried elements have been eliminated.</summary>
/// <remarks>
/// <para>
/// The Lagrangian L(lambda, N) = sum b lambda - sum_phi N_phi (sum_s x_s - 1) is concave in the potentials and linear in
/// the amounts (dual of the Gibbs energy minimum: White, Johnson and Dantzig 1958; Smith and Missen 1982). At given linking
/// potentials and amounts every carried element is a scalar equation: closed form where all its species have one atom, a
/// monotone polynomial otherwise. What is left is a saddle in at most nine unknowns.
/// </para>
/// <para>
/// With A_i = sum m^2 N x, c_ij = sum m nu_j N x and c_i,phi = sum_(s in phi) m x the Schur complement of the
/// eliminated block is H = L_BB + sum_i c_i c_i^T / A_i.
/// </para>
/// </remarks>
internal static class ReducedSystem
{
    private const int Stride = SolverWorkspace.MaximumBorder;

    /// <summary>Chooses reference activities at which the most abundant species of every carried element is near its balance.</summary>
    public static void SetReferences(EquilibriumProblem problem, SolverWorkspace work)
    {
        for (var element = 0; element < problem.ElementCount; element++)
        {
            var reference = double.PositiveInfinity;
            var lnAmount = Math.Log(problem.ElementAmount[element]);
            for (var s = problem.GroupStart[element]; s < problem.GroupStart[element + 1]; s++)
            {
                var exponent = problem.LnK[s];
                for (var link = 0; link < problem.LinkCount; link++)
                {
                    exponent += problem.LinkAtoms[link][s] * work.Link[link];
                }

                var lnPhase = Math.Log(Math.Max(work.PhaseAmount[problem.Phase[s]], 1e-300));
                reference = Math.Min(reference, (lnAmount - lnPhase - exponent) / problem.Multiplicity[s]);
            }

            work.Reference[element] = reference;
            work.Relative[element] = 1;
        }

        Shift(problem, work);
    }

    /// <summary>Folds the reference activities into ln K. Call after ln K or the references change.</summary>
    public static void Shift(EquilibriumProblem problem, SolverWorkspace work)
    {
        for (var element = 0; element < problem.ElementCount; element++)
        {
            for (var s = problem.GroupStart[element]; s < problem.GroupStart[element + 1]; s++)
            {
                work.Shifted[s] = problem.LnK[s] + (problem.Multiplicity[s] * work.Reference[element]);
            }
        }

        for (var s = problem.GroupStart[problem.ElementCount]; s < problem.PaddedCount; s++)
        {
            work.Shifted[s] = problem.LnK[s];
        }
    }

    /// <summary>Solves every carried element at the links and amounts of <paramref name="work"/>; fills gradient and Hessian.</summary>
    /// <returns>False where an element's activity leaves the range of the reference (call <see cref="SetReferences"/> again).</returns>
    public static bool Evaluate(EquilibriumProblem problem, SolverWorkspace work)
    {
        Exponentials(problem, work);
        var links = problem.LinkCount;
        var border = links + problem.PhaseCount;
        var gradient = work.Gradient.AsSpan(0, border);
        var hessian = work.Hessian.AsSpan();
        for (var j = 0; j < links; j++)
        {
            gradient[j] = problem.LinkAmount[j];
            work.LinkGross[j] = Math.Abs(problem.LinkAmount[j]);
        }

        for (var phase = 0; phase < problem.PhaseCount; phase++)
        {
            work.PhaseSum[phase] = 0;
        }

        hessian[..(border * Stride)].Clear();
        for (var element = 0; element < problem.ElementCount; element++)
        {
            if (!Eliminate(problem, work, element))
            {
                return false;
            }

            Accumulate(problem, work, element, border);
        }

        AccumulateLinkOnly(problem, work);
        for (var phase = 0; phase < problem.PhaseCount; phase++)
        {
            gradient[links + phase] = 1 - work.PhaseSum[phase];
        }

        for (var row = 1; row < border; row++)
        {
            for (var column = 0; column < row; column++)
            {
                hessian[(row * Stride) + column] = hessian[(column * Stride) + row];
            }
        }

        return true;
    }

    private static void Exponentials(EquilibriumProblem problem, SolverWorkspace work)
    {
        var target = work.MoleFraction.AsSpan(0, problem.PaddedCount);
        var shifted = work.Shifted.AsSpan(0, problem.PaddedCount);
        var width = Vector<double>.Count;
        for (var s = 0; s < target.Length; s += width)
        {
            var exponent = new Vector<double>(shifted[s..]);
            for (var link = 0; link < problem.LinkCount; link++)
            {
                exponent += new Vector<double>(problem.LinkAtoms[link], s) * work.Link[link];
            }

            // Beyond this a phase that is absent would overflow; the value only has to stay "far above 1".
            exponent = Vector.Min(exponent, new Vector<double>(600.0));
            Vector.Exp(exponent).CopyTo(target[s..]);
        }
    }

    private static bool Eliminate(EquilibriumProblem problem, SolverWorkspace work, int element)
    {
        var first = problem.GroupStart[element];
        var last = problem.GroupStart[element + 1];
        var fractions = work.MoleFraction;
        var amount = problem.ElementAmount[element];
        var held = 0.0;
        var polyatomic = false;
        for (var s = first; s < last; s++)
        {
            held += work.PhaseAmount[problem.Phase[s]] * fractions[s];
            polyatomic |= problem.Multiplicity[s] != 1;
        }

        double relative;
        if (polyatomic)
        {
            relative = SolvePolyatomic(problem, work, first, last, amount, work.Relative[element]);
        }
        else
        {
            relative = amount / held;
        }

        if (!(relative > 1e-250 && relative < 1e250))
        {
            return false;
        }

        work.Relative[element] = relative;
        for (var s = first; s < last; s++)
        {
            fractions[s] *= polyatomic ? Power(relative, problem.Multiplicity[s]) : relative;
        }

        return true;
    }

    /// <summary>Positive root y of sum m N w y^m = b.</summary>
    /// <remarks>
    /// ln of the left side is convex and increasing in ln y with a slope of at least 1, so Newton in ln y converges from
    /// everywhere: after one step it comes from the right and stays there.
    /// </remarks>
    private static double SolvePolyatomic(
        EquilibriumProblem problem, SolverWorkspace work, int first, int last, double amount, double start)
    {
        var y = start;
        for (var iteration = 0; iteration < 100; iteration++)
        {
            double held = 0, slope = 0;
            for (var s = first; s < last; s++)
            {
                var m = problem.Multiplicity[s];
                var term = m * work.PhaseAmount[problem.Phase[s]] * work.MoleFraction[s] * Power(y, m);
                held += term;
                slope += m * term;
            }

            var step = Math.Log(amount / held) * held / slope;
            y *= Math.Exp(step);
            if (!(Math.Abs(step) > 1e-9))
            {
                // Newton is quadratic: after a step of 1e-9 the remaining error is at rounding.
                return y;
            }
        }

        return y;
    }

    private static double Power(double y, int m) => m switch
    {
        1 => y,
        2 => y * y,
        3 => y * y * y,
        4 => y * y * (y * y),
        _ => Math.Pow(y, m),
    };

    private static void Accumulate(EquilibriumProblem problem, SolverWorkspace work, int element, int border)
    {
        var links = problem.LinkCount;
        var row = work.Row.AsSpan(0, border);
        row.Clear();
        var square = 0.0;
        for (var s = problem.GroupStart[element]; s < problem.GroupStart[element + 1]; s++)
        {
            var phase = problem.Phase[s];
            var fraction = work.MoleFraction[s];
            var m = problem.Multiplicity[s];
            var held = work.PhaseAmount[phase] * fraction;
            square += m * m * held;
            row[links + phase] += m * fraction;
            work.PhaseSum[phase] += fraction;
            for (var j = 0; j < links; j++)
            {
                var atoms = problem.LinkAtoms[j][s];
                if (atoms != 0)
                {
                    row[j] += m * atoms * held;
                    AccumulateLink(problem, work, s, j, atoms, held, fraction, phase);
                }
            }
        }

        var inverse = 1 / square;
        var hessian = work.Hessian;
        for (var i = 0; i < border; i++)
        {
            if (row[i] == 0)
            {
                continue;
            }

            var scaled = row[i] * inverse;
            for (var j = i; j < border; j++)
            {
                hessian[(i * Stride) + j] += scaled * row[j];
            }
        }
    }

    private static void AccumulateLink(
        EquilibriumProblem problem, SolverWorkspace work, int s, int j, double atoms, double held, double fraction, int phase)
    {
        work.Gradient[j] -= atoms * held;
        work.LinkGross[j] += Math.Abs(atoms) * held;
        for (var k = j; k < problem.LinkCount; k++)
        {
            work.Hessian[(j * Stride) + k] -= atoms * problem.LinkAtoms[k][s] * held;
        }

        work.Hessian[(j * Stride) + problem.LinkCount + phase] -= atoms * fraction;
    }

    private static void AccumulateLinkOnly(EquilibriumProblem problem, SolverWorkspace work)
    {
        for (var s = problem.GroupStart[problem.ElementCount]; s < problem.SpeciesCount; s++)
        {
            var phase = problem.Phase[s];
            var fraction = work.MoleFraction[s];
            work.PhaseSum[phase] += fraction;
            var held = work.PhaseAmount[phase] * fraction;
            for (var j = 0; j < problem.LinkCount; j++)
            {
                var atoms = problem.LinkAtoms[j][s];
                if (atoms != 0)
                {
                    AccumulateLink(problem, work, s, j, atoms, held, fraction, phase);
                }
            }
        }
    }
}
