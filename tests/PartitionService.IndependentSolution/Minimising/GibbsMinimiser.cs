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
    private const double Tolerance = 1e-12;

    /// <summary>Minimises from a state; the state holds the minimum afterwards.</summary>
    /// <returns>Number of Newton steps.</returns>
    public static int Minimise(GibbsProblem problem, GibbsState state)
    {
        var withExcess = false;
        for (var step = 1; step <= 2000; step++)
        {
            var excess = withExcess ? Excess(problem, state) : new double[problem.Species.Length];
            var size = Step(problem, state, excess, withExcess);
            if (size > Tolerance || Remove(problem, state))
            {
                continue;
            }

            if (!withExcess && !problem.Excess.IsEmpty)
            {
                withExcess = true;
                continue;
            }

            if (!Add(problem, state))
            {
                return step;
            }
        }

        throw new InvalidOperationException("the independent minimisation did not end");
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
    private static double Step(GibbsProblem problem, GibbsState state, double[] excess, bool withExcess)
    {
        int[] species = [.. Enumerable.Range(0, problem.Species.Length).Where(s => state.IsActive(problem, s))];
        int[] phases = [.. Enumerable.Range(0, 4).Where(p => state.Active[p])];
        var dense = new DenseStep(problem, state, species, phases, excess, withExcess ? ExcessSlopes(problem, state) : null);
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
    private static bool Remove(GibbsProblem problem, GibbsState state)
    {
        var largest = Enumerable.Range(0, 4).Where(p => state.Active[p]).Max(p => state.LnTotal[p]);
        var any = false;
        for (var phase = 0; phase < 4; phase++)
        {
            if (state.Active[phase] && state.LnTotal[phase] < largest - 36)
            {
                state.Active[phase] = false;
                any = true;
            }
        }

        return any;
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
