using PartitionService.Core.Equilibrium.Assembly;
using PartitionService.Core.Equilibrium.Solvers;

namespace PartitionService.Core.Equilibrium.Derivatives;

/// <summary>First-order response of an equilibrium to a <see cref="Perturbation"/>, activity coefficients otherwise fixed.</summary>
/// <remarks>
/// <para>
/// Implicit function theorem on the balances and the sums of mole fractions. With A_i = sum m^2 N x, c_ij = sum m nu_j N x and
/// c_i,phi = sum_(s in phi) m x the carried elements are eliminated, and what is left is a system over the free links and the phases
/// present, factored once. A carried element then responds by dlambda_i = (db_i - sum m N x dk - c_ij dlambda_j - c_i,phi dN_phi)/A_i.
/// </para>
/// <para>
/// Everything is written with the atoms of a link that are left when its element has been eliminated, nu_sj - m_s c_ij/A_i. For the
/// species that holds nearly all of an element they are nearly zero, and no digits cancel. Amounts of phases are carried as logarithms,
/// so that all rows are in mol.
/// </para>
/// </remarks>
internal sealed class EquilibriumResponse
{
    private readonly EquilibriumProblem problem;
    private readonly int border;
    private readonly int[] elementOf;
    private readonly double[] held;
    private readonly double[] fraction;
    private readonly double[] rest;
    private readonly double[] load;
    private readonly double[] ratio;
    private readonly double[] inverse;
    private readonly double[] schur;
    private readonly int[] unknown;
    private readonly DenseFactor? factor;
    private readonly double[] right;
    private readonly double[] solution;
    private readonly double[] holding;
    private readonly double[] elementLink;
    private readonly double[] linkLink;

    /// <summary>Factors the Jacobian of a solution.</summary>
    public EquilibriumResponse(EquilibriumState state)
    {
        problem = state.Assembled.Problem;
        var links = problem.LinkCount;
        border = links + problem.PhaseCount;
        fraction = state.MoleFraction;
        PhaseAmount = state.PhaseAmount;
        held = [.. fraction.Select((x, s) => PhaseAmount[problem.Phase[s]] * x)];
        elementOf = new int[fraction.Length];
        rest = new double[fraction.Length * links];
        load = new double[fraction.Length * border];
        ratio = new double[problem.ElementCount * border];
        inverse = new double[problem.ElementCount];
        schur = new double[border * border];
        holding = new double[problem.ElementCount * problem.PhaseCount * (links + 2)];
        elementLink = new double[links * problem.PhaseCount * problem.ElementCount];
        linkLink = new double[links * problem.PhaseCount * links];
        Step = new double[border];
        Base = new double[problem.ElementCount];
        Holding = new double[(problem.ElementCount + links) * problem.PhaseCount];
        Held = new double[Holding.Length];
        for (var i = 0; i < problem.ElementCount; i++)
        {
            Eliminate(i);
        }

        AddLinkOnly();
        unknown = [.. Enumerable.Range(0, border).Where(b => b < links ? !problem.LinkFixed[b] : PhaseAmount[b - links] > 0)];
        right = new double[unknown.Length];
        solution = new double[unknown.Length];
        factor = unknown.Length == 0 ? null : DenseFactor.Of(Reduced(), unknown.Length);
        IsRegular = unknown.Length == 0 || factor is not null;
    }

    /// <summary>False where the equilibrium does not determine its amounts, so that there are no derivatives.</summary>
    public bool IsRegular { get; }

    /// <summary>Amount of each phase, mol; zero where absent.</summary>
    public double[] PhaseAmount { get; }

    /// <summary>Response of the links' ln activities, then of ln of the phase amounts.</summary>
    public double[] Step { get; }

    /// <summary>Response of each carried element's ln activity with the links' share left out.</summary>
    public double[] Base { get; }

    /// <summary>Amount of each component in each phase, mol, [component][phase], carried elements first, then links.</summary>
    public double[] Held { get; }

    /// <summary>Response of <see cref="Held"/>, mol.</summary>
    public double[] Holding { get; }

    /// <summary>Amount of a species, mol.</summary>
    public double Amount(int species) => held[species];

    /// <summary>Mole fraction of a species.</summary>
    public double Fraction(int species) => fraction[species];

    /// <summary>Finds the response; fills <see cref="Step"/> and <see cref="Base"/>.</summary>
    public void Solve(Perturbation change)
    {
        var links = problem.LinkCount;
        Span<double> full = stackalloc double[border];
        full.Clear();
        Array.Clear(Base);
        var lnK = change.LnK;
        foreach (var s in change.Touched)
        {
            var row = load.AsSpan(s * border, border);
            var dk = lnK[s];
            for (var b = 0; b < row.Length; b++)
            {
                full[b] -= row[b] * dk;
            }

            if (elementOf[s] >= 0)
            {
                Base[elementOf[s]] -= problem.Multiplicity[s] * held[s] * dk;
            }
        }

        if (change.HasAmounts)
        {
            for (var i = 0; i < Base.Length; i++)
            {
                var amount = change.ElementAmount[i];
                if (amount != 0)
                {
                    Base[i] += amount;
                    for (var b = 0; b < border; b++)
                    {
                        full[b] -= ratio[(i * border) + b] * amount;
                    }
                }
            }
        }

        Array.Clear(Step);
        for (var j = 0; j < links; j++)
        {
            if (problem.LinkFixed[j])
            {
                Step[j] = change.Link[j];
                for (var b = 0; b < border; b++)
                {
                    full[b] -= schur[(b * border) + j] * change.Link[j];
                }
            }
            else
            {
                full[j] += change.Link[j];
            }
        }

        for (var k = 0; k < unknown.Length; k++)
        {
            right[k] = full[unknown[k]];
        }

        factor?.Solve(right, solution);
        for (var k = 0; k < unknown.Length; k++)
        {
            Step[unknown[k]] = solution[k];
        }

        for (var i = 0; i < Base.Length; i++)
        {
            var sum = Base[i] * inverse[i];
            for (var b = links; b < border; b++)
            {
                sum -= ratio[(i * border) + b] * Step[b];
            }

            Base[i] = sum;
        }
    }

    /// <summary>Response of ln of a mole fraction after <see cref="Solve"/>.</summary>
    public double LnFraction(int species, Perturbation change)
    {
        var sum = change.LnK[species];
        if (elementOf[species] >= 0)
        {
            sum += problem.Multiplicity[species] * Base[elementOf[species]];
        }

        for (var j = 0; j < problem.LinkCount; j++)
        {
            sum += rest[(species * problem.LinkCount) + j] * Step[j];
        }

        return sum;
    }

    /// <summary>Fills <see cref="Holding"/> after <see cref="Solve"/>.</summary>
    public void FindHolding(Perturbation change)
    {
        var links = problem.LinkCount;
        var phases = problem.PhaseCount;
        var width = links + 2;
        var carried = problem.ElementCount * phases;
        for (var at = 0; at < carried; at++)
        {
            var row = holding.AsSpan(at * width, width);
            var sum = (row[links] * Base[at / phases]) + (row[links + 1] * Step[links + (at % phases)]);
            for (var j = 0; j < links; j++)
            {
                sum += row[j] * Step[j];
            }

            Holding[at] = sum;
        }

        for (var at = 0; at < links * phases; at++)
        {
            var sum = Held[carried + at] * Step[links + (at % phases)];
            for (var k = 0; k < links; k++)
            {
                sum += linkLink[(at * links) + k] * Step[k];
            }

            var row = elementLink.AsSpan(at * Base.Length, Base.Length);
            for (var i = 0; i < row.Length; i++)
            {
                sum += row[i] * Base[i];
            }

            Holding[carried + at] = sum;
        }

        foreach (var s in change.Touched)
        {
            var amount = held[s] * change.LnK[s];
            var phase = problem.Phase[s];
            if (elementOf[s] >= 0)
            {
                Holding[(elementOf[s] * phases) + phase] += problem.Multiplicity[s] * amount;
            }

            for (var j = 0; j < links; j++)
            {
                Holding[carried + (j * phases) + phase] += problem.LinkAtoms[j][s] * amount;
            }
        }
    }

    /// <summary>Sums of one carried element, and its share of the border system.</summary>
    private void Eliminate(int element)
    {
        var links = problem.LinkCount;
        var row = ratio.AsSpan(element * border, border);
        var square = 0.0;
        for (var s = problem.GroupStart[element]; s < problem.GroupStart[element + 1]; s++)
        {
            double m = problem.Multiplicity[s];
            elementOf[s] = element;
            square += m * m * held[s];
            row[links + problem.Phase[s]] += m * held[s];
            for (var j = 0; j < links; j++)
            {
                row[j] += m * problem.LinkAtoms[j][s] * held[s];
            }
        }

        inverse[element] = 1 / square;
        for (var first = links; first < border; first++)
        {
            for (var second = links; second < border; second++)
            {
                schur[(first * border) + second] -= row[first] * row[second] / square;
            }
        }

        foreach (ref var value in row)
        {
            value /= square;
        }

        for (var s = problem.GroupStart[element]; s < problem.GroupStart[element + 1]; s++)
        {
            Add(s, element, row);
        }
    }

    private void AddLinkOnly()
    {
        Span<double> none = stackalloc double[border];
        none.Clear();
        for (var s = problem.GroupStart[problem.ElementCount]; s < fraction.Length; s++)
        {
            elementOf[s] = -1;
            Add(s, -1, none);
        }
    }

    /// <summary>Adds a species to the border system and to what each phase holds.</summary>
    private void Add(int s, int element, ReadOnlySpan<double> eliminated)
    {
        var links = problem.LinkCount;
        var phases = problem.PhaseCount;
        var phase = problem.Phase[s];
        double m = problem.Multiplicity[s];
        var left = rest.AsSpan(s * links, links);
        var row = load.AsSpan(s * border, border);
        for (var j = 0; j < links; j++)
        {
            left[j] = problem.LinkAtoms[j][s] - (m * eliminated[j]);
            row[j] = held[s] * left[j];
            schur[(j * border) + links + phase] += row[j];
            schur[((links + phase) * border) + j] += row[j];
        }

        for (var b = links; b < border; b++)
        {
            row[b] = held[s] * ((b - links == phase ? 1 : 0) - (m * eliminated[b]));
        }

        if (element >= 0)
        {
            var at = (element * phases) + phase;
            var sums = holding.AsSpan(at * (links + 2), links + 2);
            Held[at] += m * held[s];
            sums[links] += m * m * held[s];
            sums[links + 1] += m * held[s];
            for (var j = 0; j < links; j++)
            {
                sums[j] += m * row[j];
            }
        }

        for (var j = 0; j < links; j++)
        {
            var atoms = problem.LinkAtoms[j][s];
            var at = (j * phases) + phase;
            Held[(problem.ElementCount * phases) + at] += atoms * held[s];
            if (element >= 0)
            {
                elementLink[(at * problem.ElementCount) + element] += m * atoms * held[s];
            }

            for (var k = 0; k < links; k++)
            {
                schur[(j * border) + k] += row[j] * left[k];
                linkLink[(at * links) + k] += atoms * row[k];
            }
        }
    }

    private double[] Reduced()
    {
        var matrix = new double[unknown.Length * unknown.Length];
        for (var row = 0; row < unknown.Length; row++)
        {
            for (var column = 0; column < unknown.Length; column++)
            {
                matrix[(row * unknown.Length) + column] = schur[(unknown[row] * border) + unknown[column]];
            }
        }

        return matrix;
    }
}
