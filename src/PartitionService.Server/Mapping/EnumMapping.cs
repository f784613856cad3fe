using PartitionService.Core.Catalogue;
using PartitionService.Core.Equilibrium;
using Wire = PartitionService.Contracts.V1;

namespace PartitionService.Server.Mapping;

/// <summary>Enumerations of the core as the contract spells them. Tests hold both sides together by name.</summary>
internal static class EnumMapping
{
    /// <summary>Trust of a number; null (an override) is unspecified.</summary>
    public static Wire.Access ToWire(Access? access) => access switch
    {
        null => Wire.Access.Unspecified,
        Access.Read => Wire.Access.Read,
        Access.Abstract => Wire.Access.Abstract,
        Access.Derived => Wire.Access.Derived,
        Access.Memory => Wire.Access.Memory,
        Access.Assumed => Wire.Access.Assumed,
        _ => throw new ArgumentOutOfRangeException(nameof(access), access, "unknown access"),
    };

    /// <summary>Weight of a remark; the numbers are the same on both sides.</summary>
    public static Wire.Severity ToWire(Severity severity) => (Wire.Severity)(int)severity;

    /// <summary>Kind of a differentiated quantity; the numbers are the same on both sides.</summary>
    public static Wire.DerivativeOutputKind ToWire(DerivativeOutputKind kind) => (Wire.DerivativeOutputKind)(int)kind;

    /// <summary>Kind of a parameter; the numbers are the same on both sides.</summary>
    public static Wire.DerivativeParameterKind ToWire(DerivativeParameterKind kind) => (Wire.DerivativeParameterKind)(int)kind;

    /// <summary>Code of a remark; the numbers are the same on both sides.</summary>
    public static Wire.RemarkCode ToWire(RemarkCode code) => (Wire.RemarkCode)(int)code;
}
