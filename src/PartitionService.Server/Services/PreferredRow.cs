using PartitionService.Core.Catalogue;

namespace PartitionService.Server.Services;

/// <summary>Picks the row that counts for a solute in a solvent.</summary>
internal static class PreferredRow
{
    /// <summary>The preferred row nearest to a temperature in kelvin, or the first where none is given; null where there is none.</summary>
    /// <remarks>Preferred rows of one slot follow one another in temperature, so that the nearest one is the one that covers it.</remarks>
    public static InfiniteDilutionDatum? Of(IEnumerable<InfiniteDilutionDatum> rows, double? temperatureKelvin) =>
        rows.Where(row => row.Preferred).MinBy(row => temperatureKelvin is { } temperature ? row.DistanceKelvin(temperature) : 0);
}
