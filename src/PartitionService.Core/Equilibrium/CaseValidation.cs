using PartitionService.Core.Catalogue;

namespace PartitionService.Core.Equilibrium;

/// <summary>Lists everything that is wrong with a case.</summary>
public static class CaseValidation
{
    /// <summary>All violations of a case; empty where it is valid.</summary>
    public static IReadOnlyList<CaseViolation> Validate(VesselCase vesselCase, ThermochemicalCatalogue catalogue)
    {
        ArgumentNullException.ThrowIfNull(vesselCase);
        ArgumentNullException.ThrowIfNull(catalogue);
        return [];
    }
}
