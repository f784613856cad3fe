using PartitionService.Core.Catalogue;

namespace PartitionService.Core.Equilibrium;

/// <summary>Solves vessels against one catalogue. Immutable and safe to share between threads.</summary>
/// <param name="catalogue">The catalogue.</param>
public sealed class EquilibriumSolver(ThermochemicalCatalogue catalogue)
{
    /// <summary>The catalogue that cases are solved against.</summary>
    public ThermochemicalCatalogue Catalogue { get; } = catalogue;

    /// <summary>Validates and solves one vessel.</summary>
    /// <param name="vesselCase">The case.</param>
    /// <param name="cancellation">Stops the iteration.</param>
    /// <returns>An answer, all violations, or a typed failure.</returns>
    /// <exception cref="OperationCanceledException">Cancelled.</exception>
    public SolveOutcome Solve(VesselCase vesselCase, CancellationToken cancellation = default) =>
        throw new InvalidOperationException($"pending {Catalogue.Digest} {vesselCase} {cancellation}");
}
