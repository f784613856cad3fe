using System.Numerics;
using System.Runtime.InteropServices;

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

    /// <summary>Beyond this the species of an absent phase would overflow; the value only has to stay far above 1.</summary>
    private const double HighestExponent = 600;

    /// <summary>Mole fractions below this change no sum.</summary>
    private const double SmallestFraction = 1e-18;

    /// <summary>Chooses reference activities at which the most abundant species of every carried element is near its balance.</summary>
    public static void SetReferences(EquilibriumProblem problem, SolverWorkspace work)
    {
        Span<double> lnPhase = stackalloc double[EquilibriumProblem.MaximumPhases];
        for (var phase = 0; phase < problem.PhaseCount; phase++)
        {
            lnPhase[phase] = Math.Log(Math.Max(work.PhaseAmount[phase], 1e-300));
        }

        Shift(problem, work, zero: true);
        AddLinks(problem, work);
        var entries = problem.Entries;
        var exponent = work.MoleFraction;
        for (var element = 0; element < problem.ElementCount; element++)
        {
            var reference = double.PositiveInfinity;
            var lnAmount = problem.LnElementAmount[element];
            for (var s = problem.GroupStart[element]; s < problem.GroupStart[element + 1]; s++)
            {
                ref readonly var entry = ref entries[s];
                reference = Math.Min(reference, (lnAmount - lnPhase[entry.Phase] - exponent[s]) / entry.Multiplicity);
            }

            work.Reference[element] = reference;
            work.Relative[element] = 1;
        }

        Shift(problem, work);
    }

    /// <summary>Folds the reference activities into ln K. Call after ln K or the references change.</summary>
    public static void Shift(EquilibriumProblem problem, SolverWorkspace work, bool zero = false)
    {
        problem.LnK.AsSpan().CopyTo(work.Shifted);
        if (zero)
        {
            return;
        }

        var entries = problem.Entries;
        for (var element = 0; element < problem.ElementCount; element++)
        {
            var reference = work.Reference[element];
            for (var s = problem.GroupStart[element]; s < problem.GroupStart[element + 1]; s++)
            {
                work.Shifted[s] += entries[s].Multiplicity * reference;
            }
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
            if (!Eliminate(problem, work, element, out var last))
            {
                return false;
            }

            Accumulate(problem, work, element, last, border);
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

    /// <summary>Exponents of all species at the present links.</summary>
    private static void AddLinks(EquilibriumProblem problem, SolverWorkspace work)
    {
        var target = work.MoleFraction.AsSpan(0, problem.PaddedCount);
        work.Shifted.AsSpan(0, problem.PaddedCount).CopyTo(target);
        var vectors = MemoryMarshal.Cast<double, Vector<double>>(target);
        for (var link = 0; link < problem.LinkCount; link++)
        {
            var atoms = MemoryMarshal.Cast<double, Vector<double>>(problem.LinkAtoms[link].AsSpan());
            var potential = new Vector<double>(work.Link[link]);
            for (var v = 0; v < vectors.Length && v < atoms.Length; v++)
            {
                vectors[v] += atoms[v] * potential;
            }
        }
    }

    private static void Exponentials(EquilibriumProblem problem, SolverWorkspace work)
    {
        AddLinks(problem, work);
        var vectors = MemoryMarshal.Cast<double, Vector<double>>(work.MoleFraction.AsSpan(0, problem.PaddedCount));
        var highest = new Vector<double>(HighestExponent);
        for (var v = 0; v < vectors.Length; v++)
        {
            vectors[v] = Vector.Exp(Vector.Min(vectors[v], highest));
        }
    }

    /// <summary>
    /// Solves the balance of one element and scales its mole fractions. <paramref name="last"/> ends the species that count: the group
    /// without its polyatomic species where these hold nothing.
    /// </summary>
    private static bool Eliminate(EquilibriumProblem problem, SolverWorkspace work, int element, out int last)
    {
        var first = problem.GroupStart[element];
        var end = problem.GroupStart[element + 1];
        var mono = problem.PolyatomicStart[element] - first;
        var fractions = work.MoleFraction.AsSpan(first, end - first);
        var entries = problem.Entries.AsSpan(first, fractions.Length);
        var amounts = work.PhaseAmount;
        var amount = problem.ElementAmount[element];
        last = first + mono;
        var held = 0.0;
        for (var s = 0; s < mono; s++)
        {
            held += amounts[entries[s].Phase] * fractions[s];
        }

        var relative = amount / held;
        if (mono < fractions.Length && !HoldsNothing(entries[mono..], fractions[mono..], amounts, relative, problem.Negligible))
        {
            last = end;
            relative = SolvePolyatomic(entries, fractions, amounts, amount, Math.Min(relative, work.Relative[element]));
        }

        if (!(relative > 1e-250 && relative < 1e250))
        {
            return false;
        }

        work.Relative[element] = relative;
        for (var s = 0; s < mono; s++)
        {
            fractions[s] *= relative;
        }

        for (var s = mono; s < fractions.Length; s++)
        {
            fractions[s] *= Power(relative, entries[s].Multiplicity);
        }

        return true;
    }

    /// <summary>True where polyatomic species hold nothing even at the activity that the others alone would have, an upper bound.</summary>
    private static bool HoldsNothing(
        ReadOnlySpan<SpeciesEntry> entries, ReadOnlySpan<double> fractions, double[] amounts, double relative, double negligible)
    {
        for (var s = 0; s < fractions.Length; s++)
        {
            var fraction = fractions[s] * Power(relative, entries[s].Multiplicity);
            if (!(fraction < SmallestFraction) || !(amounts[entries[s].Phase] * fraction < negligible))
            {
                return false;
            }
        }

        return true;
    }

    /// <summary>Positive root y of sum m N w y^m = b.</summary>
    /// <remarks>
    /// ln of the left side is convex and increasing in ln y with a slope of at least 1, so Newton in ln y converges from
    /// everywhere: after one step it comes from the right and stays there.
    /// </remarks>
    private static double SolvePolyatomic(
        ReadOnlySpan<SpeciesEntry> entries, ReadOnlySpan<double> fractions, double[] amounts, double amount, double start)
    {
        var y = start;
        for (var iteration = 0; iteration < 100; iteration++)
        {
            double held = 0, slope = 0;
            for (var s = 0; s < fractions.Length; s++)
            {
                var m = entries[s].Multiplicity;
                var term = m * amounts[entries[s].Phase] * fractions[s] * Power(y, m);
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

    private static void Accumulate(EquilibriumProblem problem, SolverWorkspace work, int element, int last, int border)
    {
        var links = problem.LinkCount;
        var first = problem.GroupStart[element];
        var fractions = work.MoleFraction.AsSpan(first, last - first);
        var entries = problem.Entries.AsSpan(first, fractions.Length);
        var amounts = work.PhaseAmount;
        var negligible = problem.Negligible;
        var sums = work.PhaseSum;
        var row = work.Row.AsSpan(0, border);
        row.Clear();
        var square = 0.0;
        for (var s = 0; s < fractions.Length; s++)
        {
            ref readonly var entry = ref entries[s];
            var fraction = fractions[s];
            double m = entry.Multiplicity;
            var held = amounts[entry.Phase] * fraction;
            if (held < negligible && fraction < SmallestFraction)
            {
                continue;
            }

            square += m * m * held;
            row[links + entry.Phase] += m * fraction;
            sums[entry.Phase] += fraction;
            if (entry.Link >= 0)
            {
                row[entry.Link] += m * entry.LinkAtoms * held;
                AccumulateLink(work, links, entry.Link, entry.LinkAtoms, held, fraction, entry.Phase);
            }
            else if (entry.Link == SpeciesEntry.SeveralLinks)
            {
                AccumulateLinks(problem, work, first + s, m, held, fraction, entry.Phase, row);
            }
        }

        var inverse = 1 / square;
        var hessian = work.Hessian.AsSpan(0, border * Stride);
        for (var i = 0; i < border; i++)
        {
            if (row[i] == 0)
            {
                continue;
            }

            var scaled = row[i] * inverse;
            var target = hessian.Slice(i * Stride, border);
            for (var j = i; j < row.Length && j < target.Length; j++)
            {
                target[j] += scaled * row[j];
            }
        }
    }

    private static void AccumulateLinks(
        EquilibriumProblem problem, SolverWorkspace work, int s, double m, double held, double fraction, int phase, Span<double> row)
    {
        for (var j = 0; j < problem.LinkCount; j++)
        {
            var atoms = problem.LinkAtoms[j][s];
            if (atoms == 0)
            {
                continue;
            }

            row[j] += m * atoms * held;
            AccumulateLink(work, problem.LinkCount, j, atoms, held, fraction, phase);
            for (var k = j + 1; k < problem.LinkCount; k++)
            {
                work.Hessian[(j * Stride) + k] -= atoms * problem.LinkAtoms[k][s] * held;
            }
        }
    }

    private static void AccumulateLink(
        SolverWorkspace work, int links, int j, double atoms, double held, double fraction, int phase)
    {
        var taken = atoms * held;
        work.Gradient[j] -= taken;
        work.LinkGross[j] += Math.Abs(taken);
        work.Hessian[(j * Stride) + j] -= atoms * taken;
        work.Hessian[(j * Stride) + links + phase] -= atoms * fraction;
    }

    private static void AccumulateLinkOnly(EquilibriumProblem problem, SolverWorkspace work)
    {
        for (var s = problem.GroupStart[problem.ElementCount]; s < problem.SpeciesCount; s++)
        {
            ref readonly var entry = ref problem.Entries[s];
            var fraction = work.MoleFraction[s];
            work.PhaseSum[entry.Phase] += fraction;
            work.Row.AsSpan().Clear();
            AccumulateLinks(problem, work, s, 0, work.PhaseAmount[entry.Phase] * fraction, fraction, entry.Phase, work.Row);
        }
    }
}
