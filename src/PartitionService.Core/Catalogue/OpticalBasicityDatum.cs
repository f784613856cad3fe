namespace PartitionService.Core.Catalogue;

/// <summary>Optical basicity of a whole oxide (or CaF2) in one set of values; sets must not be mixed inside a formula.</summary>
/// <remarks>Slot: <c>optical-basicity/{oxide}</c>.</remarks>
public sealed record OpticalBasicityDatum : Datum
{
    /// <summary>Whole oxide, for example <c>Al2O3</c>.</summary>
    public required string Oxide { get; init; }

    /// <summary>Optical basicity, dimensionless.</summary>
    public required double OpticalBasicity { get; init; }

    /// <summary>Name of the set: <c>mills</c> (for capacity formulas) or another.</summary>
    public required string Set { get; init; }

    /// <summary>One standard deviation.</summary>
    public required double Sigma { get; init; }
}
