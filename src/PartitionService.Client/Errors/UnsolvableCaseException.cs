namespace PartitionService.Client.Errors;

/// <summary>The case is valid, but a condition that it states cannot hold; <see cref="PartitionException.Reason"/> says which.</summary>
/// <param name="fault">What the service said.</param>
/// <param name="elements">Symbols of the elements that it is about.</param>
/// <param name="inner">The failure as gRPC gave it.</param>
public sealed class UnsolvableCaseException(ServiceFault fault, IReadOnlyList<string> elements, Exception? inner = null)
    : PartitionException(fault, inner)
{
    /// <summary>Symbols of the elements that the failure is about; may be empty.</summary>
    public IReadOnlyList<string> Elements { get; } = elements;
}
