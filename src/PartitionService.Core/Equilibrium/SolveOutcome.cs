namespace PartitionService.Core.Equilibrium;

/// <summary>Result of solving a case: an answer, violations of the input, or a typed failure.</summary>
public abstract record SolveOutcome
{
    private SolveOutcome()
    {
    }

    /// <summary>The case was solved.</summary>
    /// <param name="Answer">The answer.</param>
    public sealed record Solved(VesselAnswer Answer) : SolveOutcome;

    /// <summary>The case is not valid; every violation is listed.</summary>
    /// <param name="Violations">At least one violation.</param>
    public sealed record Invalid(IReadOnlyList<CaseViolation> Violations) : SolveOutcome;

    /// <summary>The case is valid but a condition cannot hold.</summary>
    /// <param name="Reason">Which condition.</param>
    /// <param name="Message">What it means and what to change, with the numbers.</param>
    /// <param name="Elements">Elements that the failure is about; may be empty.</param>
    public sealed record Failed(SolveFailure Reason, string Message, IReadOnlyList<string> Elements) : SolveOutcome;
}

/// <summary>Which condition of a valid case cannot hold.</summary>
public enum SolveFailure
{
    /// <summary>More oxygen than the phases present can hold.</summary>
    OxygenHasNoHome,

    /// <summary>An element other than oxygen cannot be held by the phases present with the oxygen stated.</summary>
    ElementHasNoHome,

    /// <summary>The stated potentials ask for more than the total pressure, which would take unlimited gas.</summary>
    PressureExceeded,

    /// <summary>No metal in the charge that the catalogue knows as solvent.</summary>
    NoSolvent,

    /// <summary>The metal cannot hold the stated dissolved oxygen.</summary>
    DissolvedOxygenNotReachable,

    /// <summary>The iteration did not converge.</summary>
    NotConverged,
}
