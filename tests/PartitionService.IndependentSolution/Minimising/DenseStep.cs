using MathNet.Numerics.LinearAlgebra;

namespace PartitionService.IndependentSolution.Minimising;

/// <summary>Linear system of one Newton step over ln n, ln N and potentials of what is active, and its application.</summary>
internal sealed class DenseStep
{
    private const double LargeFraction = 1e-8;

    private readonly GibbsProblem problem;
    private readonly GibbsState state;
    private readonly int[] species;
    private readonly int[] phases;
    private readonly int elements;
    private readonly Matrix<double> matrix;
    private readonly Vector<double> right;
    private double residual;

    public DenseStep(
        GibbsProblem problem, GibbsState state, int[] species, int[] phases, double[] excess, double[,]? slopes, double diluent)
    {
        this.problem = problem;
        this.state = state;
        this.species = species;
        this.phases = phases;
        elements = problem.Elements.Length;
        var size = species.Length + phases.Length + elements;
        matrix = Matrix<double>.Build.Dense(size, size);
        right = Vector<double>.Build.Dense(size);
        Stationarity(excess, slopes);
        PhaseSums(diluent);
        Constraints();
    }

    public Vector<double> Solve() => slopesPresent ? matrix.LU().Solve(right) : Reduced();

    /// <summary>Applies a step within its limits.</summary>
    /// <returns>The larger of the largest full step and the largest relative residual before it.</returns>
    public double Apply(Vector<double> solution)
    {
        double length = 1, largest = 0;
        for (var i = 0; i < species.Length + phases.Length; i++)
        {
            var move = solution[i];
            if (!double.IsFinite(move))
            {
                throw new InvalidOperationException("the independent minimisation met a singular matrix");
            }

            largest = Math.Max(largest, Math.Abs(move));
            if (i >= species.Length)
            {
                length = Math.Min(length, 2 / Math.Max(2, Math.Abs(move)));
                continue;
            }

            var s = species[i];
            var lnFraction = state.LnAmount[s] - state.LnTotal[(int)problem.Species[s].Phase];
            if (lnFraction > Math.Log(LargeFraction))
            {
                length = Math.Min(length, 2 / Math.Max(2, Math.Abs(move)));
            }
            else if (move > 0)
            {
                var relative = move - solution[species.Length + Array.IndexOf(phases, (int)problem.Species[s].Phase)];
                length = relative > 0 ? Math.Min(length, Math.Max(0.01, (Math.Log(1e-4) - lnFraction) / relative)) : length;
            }
        }

        for (var i = 0; i < species.Length; i++)
        {
            state.LnAmount[species[i]] += length * solution[i];
        }

        for (var p = 0; p < phases.Length; p++)
        {
            state.LnTotal[phases[p]] += length * solution[species.Length + p];
        }

        for (var e = 0; e < elements; e++)
        {
            var next = solution[species.Length + phases.Length + e];
            largest = Math.Max(largest, Math.Abs(next - state.Potential[e]) / Math.Max(1, Math.Abs(next)));
            state.Potential[e] = next;
        }

        return Math.Max(largest, residual);
    }

    private bool slopesPresent;

    /// <summary>Delta ln n - Delta ln N + slopes - atoms lambda = -(energy + ln x + excess); lambda is absolute.</summary>
    private void Stationarity(double[] excess, double[,]? slopes)
    {
        slopesPresent = slopes is not null;
        for (var i = 0; i < species.Length; i++)
        {
            var s = species[i];
            var phase = (int)problem.Species[s].Phase;
            matrix[i, i] = 1;
            matrix[i, species.Length + Array.IndexOf(phases, phase)] = -1;
            for (var e = 0; e < elements; e++)
            {
                matrix[i, species.Length + phases.Length + e] = -problem.Atoms[e][s];
            }

            right[i] = -(problem.Energy(s) + state.LnAmount[s] - state.LnTotal[phase] + excess[s]);
        }

        for (var a = 0; a < problem.Metal.Length && slopes is not null; a++)
        {
            var row = Array.IndexOf(species, problem.Metal[a]);
            for (var b = 0; b < problem.Metal.Length && row >= 0; b++)
            {
                matrix[row, Array.IndexOf(species, problem.Metal[b])] += slopes[a, b];
            }
        }
    }

    private void PhaseSums(double diluent)
    {
        for (var p = 0; p < phases.Length; p++)
        {
            var row = species.Length + p;
            var sum = 0.0;
            for (var i = 0; i < species.Length; i++)
            {
                if ((int)problem.Species[species[i]].Phase == phases[p])
                {
                    var fraction = Math.Exp(state.LnAmount[species[i]] - state.LnTotal[phases[p]]);
                    sum += fraction;
                    matrix[row, i] = fraction;
                }
            }

            sum += diluent * Math.Exp(-state.LnTotal[phases[p]]);
            matrix[row, row] = -sum;
            right[row] = 1 - sum;
            residual = Math.Max(residual, Math.Abs(1 - sum));
        }
    }

    /// <summary>Constraints relative to their gross amount, in the logarithm where all terms have one sign.</summary>
    private void Constraints()
    {
        for (var e = 0; e < elements; e++)
        {
            double held = 0, gross = Math.Abs(problem.Amount[e]);
            var row = species.Length + phases.Length + e;
            foreach (var s in species)
            {
                var term = problem.Constraint[e][s] * Math.Exp(state.LnAmount[s]);
                held += term;
                gross += Math.Abs(term);
            }

            for (var i = 0; i < species.Length; i++)
            {
                matrix[row, i] = problem.Constraint[e][species[i]] * Math.Exp(state.LnAmount[species[i]]) / gross;
            }

            var target = problem.Amount[e];
            right[row] = (held > 0 && target > 0 ? held * Math.Log(target / held) : target - held) / gross;
            residual = Math.Max(residual, Math.Abs(target - held) / gross);
        }
    }

    /// <summary>Without slopes every stationarity row gives its ln n directly; what is left is solved densely.</summary>
    private Vector<double> Reduced()
    {
        var count = species.Length;
        var rest = phases.Length + elements;
        var border = matrix.SubMatrix(count, rest, 0, count);
        var head = matrix.SubMatrix(0, count, count, rest);
        var known = right.SubVector(0, count);
        var system = matrix.SubMatrix(count, rest, count, rest) - (border * head);
        var outer = system.LU().Solve(right.SubVector(count, rest) - (border * known));
        var inner = known - (head * outer);
        return Vector<double>.Build.Dense([.. inner, .. outer]);
    }
}
