namespace PartitionService.Client.Errors;

/// <summary>The deadline passed, or the service cancelled the call, before an answer came.</summary>
/// <param name="fault">What is known about the failure.</param>
/// <param name="inner">The failure as gRPC gave it.</param>
public sealed class PartitionTimeoutException(ServiceFault fault, Exception? inner = null) : PartitionException(fault, inner);
