using MathNet.Numerics.LinearAlgebra;

namespace PartitionService.IndependentSolution.Minimising;

/// <summary>Newton's method on the Lagrangian of the total Gibbs energy, in logarithms of all amounts, dense matrices throughout.</summary>
/// <remarks>
/// Unknowns are ln n of every species, ln N of every phase and the potential of every element; nothing is eliminated by its
/// chemistry. Equations: mu_s = sum of the potentials of its atoms; the constraints; N is the sum of its species. Steps are limited as is usual
/// for such methods: large species by a factor e^2, small ones so that they do not jump above a mole fraction of 1e-4.
/// </remarks>
internal static class GibbsMinimiser
{
    /// <summary>Potentials are near 100, so that rounding alone moves a step by 1e-13; the constraints are held to the same number.</summary>
    private const double Tolerance = 1e-11;

    /// <summary>Minimises from scratch; the state holds the minimum afterwards.</summary>
    /// <remarks>
    /// Every phase holds a little of an inert diluent of its own, so that all phases exist and the energy is smooth and convex; the diluent
    /// is taken away by decades. Henry's law first, the excess energy from a millionth of the amounts on.
    /// </remarks>
    public static void Minimise(GibbsProblem problem, GibbsState state)
    {
        var total = problem.Amount.Sum();
        var diluent = 0.1;
        for (; diluent > 1e-16; diluent *= 0.1)
        {
            Iterate(problem, state, diluent * total, diluent < 2e-6, 1e-2);
        }

        foreach (var phase in problem.Phases)
        {
            // Of an absent phase there is no more than the diluent over its deficit.
            state.Active[(int)phase] = Math.Exp(state.LnTotal[(int)phase]) > 1e7 * diluent * total;
        }

        Polish(problem, state);
    }

    /// <summary>Minimises from a state near the minimum.</summary>
    public static void Polish(GibbsProblem problem, GibbsState state)
    {
        do
        {
            Iterate(problem, state, 0, true, Tolerance);
        }
        while (Add(problem, state));
    }

    private static void Iterate(GibbsProblem problem, GibbsState state, double diluent, bool withExcess, double tolerance)
    {
        for (var step = 0; step < 400; step++)
        {
            var excess = withExcess ? Excess(problem, state) : new double[problem.Species.Length];
            if (Step(problem, state, excess, withExcess && !problem.Excess.IsEmpty, diluent) <= tolerance)
            {
                return;
            }

            if (diluent == 0)
            {
                Remove(problem, state);
            }
        }

        throw new InvalidOperationException(FormattableString.Invariant($"the independent minimisation did not end at diluent {diluent:E1}"));
    }

    /// <summary>ln x of a species at given potentials of the elements, as if its phase were there.</summary>
    public static double LnFraction(GibbsProblem problem, GibbsState state, int s)
    {
        var sum = -problem.Energy(s);
        for (var e = 0; e < problem.Elements.Length; e++)
        {
            sum += problem.Atoms[e][s] * state.Potential[e];
        }

        return sum;
    }

    private static double[] Excess(GibbsProblem problem, GibbsState state)
    {
        var all = new double[problem.Species.Length];
        if (state.Active[(int)Physics.Phase.Metal])
        {
            var potentials = problem.Excess.Potentials([.. problem.Metal.Select(s => Math.Exp(state.LnAmount[s]))]);
            for (var i = 0; i < problem.Metal.Length; i++)
            {
                all[problem.Metal[i]] = potentials[i];
            }
        }

        return all;
    }

    /// <summary>One Newton step.</summary>
    /// <returns>Largest full step in any logarithm and largest relative residual of a constraint.</returns>
    private static double Step(GibbsProblem problem, GibbsState state, double[] excess, bool withSlopes, double diluent)
    {
        int[] species = [.. Enumerable.Range(0, problem.Species.Length).Where(s => state.IsActive(problem, s))];
        int[] phases = [.. Enumerable.Range(0, 4).Where(p => state.Active[p])];
        var dense = new DenseStep(problem, state, species, phases, excess, withSlopes ? ExcessSlopes(problem, state) : null, diluent);
        Vector<double> solution = dense.Solve();
        return dense.Apply(solution);
    }

    /// <summary>Differences of the excess potentials in the logarithms of the metal's amounts.</summary>
    private static double[,] ExcessSlopes(GibbsProblem problem, GibbsState state)
    {
        const double width = 1e-5;
        var count = problem.Metal.Length;
        var slopes = new double[count, count];
        for (var j = 0; j < count && state.Active[(int)Physics.Phase.Metal]; j++)
        {
            double[] At(double shift) => problem.Excess.Potentials(
                [.. problem.Metal.Select((s, i) => Math.Exp(state.LnAmount[s] + (i == j ? shift : 0)))]);
            var (up, down) = (At(width), At(-width));
            for (var i = 0; i < count; i++)
            {
                slopes[i, j] = (up[i] - down[i]) / (2 * width);
            }
        }

        return slopes;
    }

    /// <summary>Takes away phases that have shrunk to nothing.</summary>
    private static void Remove(GibbsProblem problem, GibbsState state)
    {
        var largest = problem.Phases.Where(p => state.Active[(int)p]).Max(p => state.LnTotal[(int)p]);
        foreach (var phase in problem.Phases)
        {
            state.Active[(int)phase] &= state.LnTotal[(int)phase] > largest - 36;
        }
    }

    /// <summary>Brings in phases that would lower the energy: the sum of the mole fractions at the potentials exceeds 1.</summary>
    private static bool Add(GibbsProblem problem, GibbsState state)
    {
        var largest = Enumerable.Range(0, 4).Where(p => state.Active[p]).Max(p => state.LnTotal[p]);
        var any = false;
        foreach (var phase in problem.Phases.Where(p => !state.Active[(int)p]))
        {
            int[] members = [.. Enumerable.Range(0, problem.Species.Length).Where(s => problem.Species[s].Phase == phase)];
            if (members.Sum(s => Math.Exp(LnFraction(problem, state, s))) > 1 + 1e-10)
            {
                state.Active[(int)phase] = any = true;
                state.LnTotal[(int)phase] = largest - 9;
                foreach (var s in members)
                {
                    state.LnAmount[s] = LnFraction(problem, state, s) + largest - 9;
                }
            }
        }

        return any;
    }
}
