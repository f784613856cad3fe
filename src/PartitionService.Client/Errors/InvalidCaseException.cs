namespace PartitionService.Client.Errors;

/// <summary>Fields of the request are out of range or contradict. Change the request; repeating it is of no use.</summary>
/// <param name="fault">What the service said.</param>
/// <param name="violations">Every violation, in the order of the service.</param>
/// <param name="inner">The failure as gRPC gave it.</param>
public sealed class InvalidCaseException(ServiceFault fault, IReadOnlyList<FieldViolation> violations, Exception? inner = null)
    : PartitionException(fault, inner)
{
    /// <summary>Every field that is refused; empty where the service named none.</summary>
    public IReadOnlyList<FieldViolation> Violations { get; } = violations;
}
