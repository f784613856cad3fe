using PartitionService.Core.Equilibrium.Solvers;
using PartitionService.Core.Thermodynamics;

namespace PartitionService.Core.Equilibrium.Assembly;

/// <summary>A case turned into the solver's arrays, with what is needed to read the solution back.</summary>
internal sealed class AssembledCase
{
    /// <summary>The numbers.</summary>
    public required EquilibriumProblem Problem { get; init; }

    /// <summary>Species in the order of the problem, without padding.</summary>
    public required SpeciesRecord[] Species { get; init; }

    /// <summary>Carried elements in the order of the problem; the inert slag is the last entry where there is one.</summary>
    public required string[] Carried { get; init; }

    /// <summary>Linking components in the order of the problem.</summary>
    public required string[] Links { get; init; }

    /// <summary>Phases in the order of the problem.</summary>
    public required PhaseKind[] Phases { get; init; }

    /// <summary>Index of oxygen among the links, or -1.</summary>
    public required int OxygenLink { get; init; }

    /// <summary>Indices of the metal's solutes among the species, the solvent left out.</summary>
    public required int[] MetalSolutes { get; init; }

    /// <summary>Index of the solvent among the species, or -1 where the metal cannot exist.</summary>
    public required int SolventSpecies { get; init; }

    /// <summary>Interaction model over <see cref="MetalSolutes"/>.</summary>
    public required InteractionModel Interactions { get; init; }

    /// <summary>
    /// Interaction parameters as indices into <see cref="MetalSolutes"/>, once per unordered pair; those of value zero, which the model
    /// leaves out, included.
    /// </summary>
    public required IReadOnlyList<(int First, int Second, InteractionTerm Term)> InteractionTerms { get; init; }

    /// <summary>Elements that no phase present has a datum for.</summary>
    public required IReadOnlyList<string> Unplaced { get; init; }

    /// <summary>Name of the component that stands for the inert part of the slag.</summary>
    public const string InertName = "(inert slag)";
}
