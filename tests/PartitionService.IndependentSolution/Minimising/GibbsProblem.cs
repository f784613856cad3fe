using PartitionService.IndependentSolution.Physics;

namespace PartitionService.IndependentSolution.Minimising;

/// <summary>Minimise the total Gibbs energy over the amounts of all species under linear constraints, one per element.</summary>
internal sealed class GibbsProblem
{
    /// <summary>Species; their energies may change between runs.</summary>
    public required Species[] Species { get; init; }

    /// <summary>Elements whose potential is unknown.</summary>
    public required string[] Elements { get; init; }

    /// <summary>Atoms of each unknown element, [element][species].</summary>
    public required double[][] Atoms { get; init; }

    /// <summary>Left sides of the constraints, [element][species]: the atoms, or the statement about dissolved oxygen.</summary>
    public required double[][] Constraint { get; init; }

    /// <summary>Right sides, mol.</summary>
    public required double[] Amount { get; init; }

    /// <summary>Fixed potential of oxygen times the oxygen of each species; taken from the energies.</summary>
    public required double[] FixedPart { get; init; }

    /// <summary>Excess energy of the metal over the species in <see cref="Metal"/>.</summary>
    public required MetalExcess Excess { get; init; }

    /// <summary>Indices of the metal's species.</summary>
    public required int[] Metal { get; init; }

    /// <summary>Phases that have species.</summary>
    public Phase[] Phases => [.. Species.Select(s => s.Phase).Distinct().Order()];

    /// <summary>Standard energy of a species less what fixed potentials supply.</summary>
    public double Energy(int s) => Species[s].Energy - FixedPart[s];
}
