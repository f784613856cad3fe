using Grpc.Core;
using PartitionService.Contracts.V1;

namespace PartitionService.Client.Errors;

/// <summary>What the service said about a failure; every exception of the client carries it.</summary>
/// <param name="StatusCode">gRPC status.</param>
/// <param name="Reason">Reason; unspecified where the failure did not come from the service or is newer than this client.</param>
/// <param name="Message">The failure in words.</param>
/// <param name="RequestId">Id of the request in the log of the service; empty where none was sent.</param>
public sealed record ServiceFault(StatusCode StatusCode, ErrorReason Reason, string Message, string RequestId);
