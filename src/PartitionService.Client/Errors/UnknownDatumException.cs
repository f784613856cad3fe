namespace PartitionService.Client.Errors;

/// <summary>The catalogue has no such slot or key.</summary>
/// <param name="fault">What the service said.</param>
/// <param name="inner">The failure as gRPC gave it.</param>
public sealed class UnknownDatumException(ServiceFault fault, Exception? inner = null) : PartitionException(fault, inner);
