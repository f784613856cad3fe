using Grpc.Core;
using PartitionService.Contracts.V1;

namespace PartitionService.Client.Errors;

/// <summary>A call failed. Derived types say what the caller can do about it.</summary>
/// <param name="fault">What the service said.</param>
/// <param name="inner">The failure as gRPC gave it.</param>
public class PartitionException(ServiceFault fault, Exception? inner = null)
    : Exception((fault ?? throw new ArgumentNullException(nameof(fault))).Message, inner)
{
    /// <summary>Reason that the service gave; unspecified where the failure did not come from the service.</summary>
    public ErrorReason Reason { get; } = fault.Reason;

    /// <summary>Id of the request in the log of the service; empty where none was sent.</summary>
    public string RequestId { get; } = fault.RequestId;

    /// <summary>gRPC status of the call.</summary>
    public StatusCode StatusCode { get; } = fault.StatusCode;
}
