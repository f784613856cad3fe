using PartitionService.Core.Equilibrium.Solvers;

namespace PartitionService.Core.Equilibrium.Derivatives;

/// <summary>What one unit of a parameter changes directly: constants, amounts and fixed potentials.</summary>
internal sealed class Perturbation
{
    private readonly double[] lnK;
    private readonly bool[] isTouched;
    private readonly int[] touched;
    private int count;

    /// <summary>Makes room for a problem.</summary>
    public Perturbation(EquilibriumProblem problem)
    {
        lnK = new double[problem.SpeciesCount];
        isTouched = new bool[problem.SpeciesCount];
        touched = new int[problem.SpeciesCount];
        ElementAmount = new double[problem.ElementCount];
        Link = new double[problem.LinkCount];
    }

    /// <summary>Change of each species' ln K.</summary>
    public ReadOnlySpan<double> LnK => lnK;

    /// <summary>Species whose ln K changes.</summary>
    public ReadOnlySpan<int> Touched => touched.AsSpan(0, count);

    /// <summary>Change of the amount of each carried element, mol.</summary>
    public double[] ElementAmount { get; }

    /// <summary>True where <see cref="ElementAmount"/> is not all zero.</summary>
    public bool HasAmounts { get; set; }

    /// <summary>Change of each link: of its amount in mol, or of its potential where that is fixed.</summary>
    public double[] Link { get; }

    /// <summary>Adds a change of ln K.</summary>
    public void AddLnK(int species, double change)
    {
        if (change == 0)
        {
            return;
        }

        if (!isTouched[species])
        {
            isTouched[species] = true;
            touched[count++] = species;
        }

        lnK[species] += change;
    }

    /// <summary>Back to no change.</summary>
    public void Clear()
    {
        foreach (var species in Touched)
        {
            lnK[species] = 0;
            isTouched[species] = false;
        }

        count = 0;
        HasAmounts = false;
        Array.Clear(ElementAmount);
        Array.Clear(Link);
    }
}
