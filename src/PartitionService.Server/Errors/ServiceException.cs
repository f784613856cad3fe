using Grpc.Core;
using PartitionService.Contracts.V1;
using PartitionService.Core.Equilibrium;

namespace PartitionService.Server.Errors;

/// <summary>A refusal that the caller is told about in full.</summary>
internal sealed class ServiceException(
    StatusCode status,
    ErrorReason reason,
    string message,
    IReadOnlyList<string>? elements = null,
    IReadOnlyList<CaseViolation>? violations = null)
    : Exception(message)
{
    /// <summary>Status of the call.</summary>
    public StatusCode Status { get; } = status;

    /// <summary>Reason in ErrorInfo.</summary>
    public ErrorReason Reason { get; } = reason;

    /// <summary>Elements concerned; may be empty.</summary>
    public IReadOnlyList<string> Elements { get; } = elements ?? [];

    /// <summary>Violations of fields, paths from the request; may be empty.</summary>
    public IReadOnlyList<CaseViolation> Violations { get; } = violations ?? [];
}
