using PartitionService.Core.Equilibrium;

namespace PartitionService.Server.Hosting;

/// <summary>Solves one vessel; the seam between the calls and the core.</summary>
/// <param name="vesselCase">The case.</param>
/// <param name="options">What to compute besides the answer itself.</param>
/// <param name="cancellation">Stops the solution.</param>
/// <returns>An answer, all violations, or a typed failure.</returns>
/// <exception cref="OperationCanceledException">Cancelled.</exception>
public delegate SolveOutcome VesselSolve(VesselCase vesselCase, SolveOptions options, CancellationToken cancellation);
