namespace PartitionService.Client.Errors;

/// <summary>The service could not be reached or is draining, after every attempt. The same call may succeed later.</summary>
/// <param name="fault">What is known about the failure.</param>
/// <param name="inner">The failure as gRPC gave it.</param>
public sealed class PartitionUnavailableException(ServiceFault fault, Exception? inner = null) : PartitionException(fault, inner);
