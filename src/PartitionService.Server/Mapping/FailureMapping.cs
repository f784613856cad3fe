using PartitionService.Contracts.V1;
using PartitionService.Core.Equilibrium;

namespace PartitionService.Server.Mapping;

/// <summary>Reasons of failures that the core reports.</summary>
internal static class FailureMapping
{
    /// <summary>The reason that is sent for a failure.</summary>
    public static ErrorReason ToReason(SolveFailure failure) => failure switch
    {
        SolveFailure.OxygenHasNoHome => ErrorReason.OxygenHasNoHome,
        SolveFailure.ElementHasNoHome => ErrorReason.ElementHasNoHome,
        SolveFailure.PressureExceeded => ErrorReason.PressureExceeded,
        SolveFailure.NoSolvent => ErrorReason.NoSolvent,
        SolveFailure.DissolvedOxygenNotReachable => ErrorReason.DissolvedOxygenNotReachable,
        SolveFailure.NotConverged => ErrorReason.NotConverged,
        _ => throw new ArgumentOutOfRangeException(nameof(failure), failure, "unknown failure"),
    };
}
