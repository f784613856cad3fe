using PartitionService.Core.Catalogue;
using PartitionService.Core.Equilibrium.Assembly;
using PartitionService.Core.Equilibrium.Derivatives;
using PartitionService.Core.Equilibrium.Reporting;
using PartitionService.Core.Equilibrium.Solvers;

namespace PartitionService.Core.Equilibrium;

/// <summary>Solves vessels against one catalogue. Immutable and safe to share between threads.</summary>
/// <param name="catalogue">The catalogue.</param>
public sealed class EquilibriumSolver(ThermochemicalCatalogue catalogue)
{
    [ThreadStatic]
    private static SolverWorkspace? threadWorkspace;

    /// <summary>The catalogue that cases are solved against.</summary>
    public ThermochemicalCatalogue Catalogue { get; } = catalogue;

    /// <summary>Validates and solves one vessel.</summary>
    /// <param name="vesselCase">The case.</param>
    /// <param name="cancellation">Stops the iteration.</param>
    /// <returns>An answer, all violations, or a typed failure.</returns>
    /// <exception cref="OperationCanceledException">Cancelled.</exception>
    public SolveOutcome Solve(VesselCase vesselCase, CancellationToken cancellation = default) =>
        Solve(vesselCase, SolveOptions.None, cancellation);

    /// <summary>Validates and solves one vessel, with what is asked for besides.</summary>
    /// <param name="vesselCase">The case.</param>
    /// <param name="options">What to compute besides the answer itself.</param>
    /// <param name="cancellation">Stops the iteration.</param>
    /// <returns>An answer, all violations, or a typed failure.</returns>
    /// <exception cref="OperationCanceledException">Cancelled.</exception>
    public SolveOutcome Solve(VesselCase vesselCase, SolveOptions options, CancellationToken cancellation = default)
    {
        ArgumentNullException.ThrowIfNull(vesselCase);
        ArgumentNullException.ThrowIfNull(options);
        cancellation.ThrowIfCancellationRequested();
        var violations = CaseValidation.Validate(vesselCase, Catalogue);
        if (violations.Count > 0)
        {
            return new SolveOutcome.Invalid(violations);
        }

        var assembly = new VesselAssembler(vesselCase, Catalogue).Assemble(out var failure);
        if (assembly is null)
        {
            return failure!;
        }

        if (FailureRules.Before(assembly) is { } impossible)
        {
            return impossible;
        }

        var work = threadWorkspace ??= new SolverWorkspace();
        double? dissolved = vesselCase.Oxygen is OxygenStatement.Dissolved statement ? 1e-6 * statement.MassPpm : null;
        var state = ActivityIteration.Solve(assembly, dissolved, Catalogue.Elements, work, cancellation);
        if (FailureRules.IsOverblown(assembly, state) && assembly.Family is not null
            && new VesselAssembler(vesselCase, Catalogue, withoutMetal: true).Assemble(out _) is { } blown
            && ActivityIteration.Solve(blown, null, Catalogue.Elements, work, cancellation) is { } blownState
            && FailureRules.After(blown, blownState, false) is null)
        {
            assembly = blown;
            state = blownState;
        }

        if (FailureRules.After(assembly, state, dissolved is not null) is { } failed)
        {
            return failed;
        }

        var answer = new AnswerBuilder(vesselCase, Catalogue, assembly, state).Build();
        return new SolveOutcome.Solved(options.Derivatives is { } selection
            ? answer with { Derivatives = DerivativeBuilder.Build(vesselCase, Catalogue, assembly, state, answer, selection) }
            : answer);
    }
}
