namespace PartitionService.Core.Catalogue;

/// <summary>Metal (or matte, alloy) droplets held in a slag, mass % of slag.</summary>
/// <remarks>Slot: <c>entrainment/{process}</c> in lower case with hyphens.</remarks>
public sealed record EntrainmentDatum : Datum
{
    /// <summary>Process, for example <c>secondary copper / black copper</c>.</summary>
    public required string Process { get; init; }

    /// <summary>Vessel or slag.</summary>
    public required string Vessel { get; init; }

    /// <summary>Phase that is carried by the slag.</summary>
    public required string EntrainedPhase { get; init; }

    /// <summary>Lower end of the usual range, mass % of slag.</summary>
    public required double LowMassPercent { get; init; }

    /// <summary>Typical value, mass % of slag.</summary>
    public required double TypicalMassPercent { get; init; }

    /// <summary>Upper end of the usual range, mass % of slag.</summary>
    public required double HighMassPercent { get; init; }
}
