using PartitionService.Core.Catalogue;
using Wire = PartitionService.Contracts.V1;

namespace PartitionService.Server.Mapping;

/// <summary>Turns the coverage of the catalogue into what is sent.</summary>
internal static class CoverageMapping
{
    /// <summary>Maps the tables that a request asks for.</summary>
    /// <param name="coverage">All tables.</param>
    /// <param name="kind">The table asked for; unspecified: all.</param>
    public static IEnumerable<Wire.CoverageTable> ToWire(CoverageMatrix coverage, Wire.CoverageKind kind)
    {
        (Wire.CoverageKind Kind, CoverageTable Table)[] tables =
        [
            (Wire.CoverageKind.Metals, coverage.Metals),
            (Wire.CoverageKind.Slags, coverage.Slags),
            (Wire.CoverageKind.Vapours, coverage.Vapours),
        ];
        return tables.Where(t => kind == Wire.CoverageKind.Unspecified || kind == t.Kind).Select(t => ToWire(t.Kind, t.Table));
    }

    /// <summary>Maps a trust level; the names are the same on both sides.</summary>
    public static Wire.CoverageTrust ToWire(CoverageTrust trust) => trust switch
    {
        CoverageTrust.Read => Wire.CoverageTrust.Read,
        CoverageTrust.Abstract => Wire.CoverageTrust.Abstract,
        CoverageTrust.Derived => Wire.CoverageTrust.Derived,
        CoverageTrust.Memory => Wire.CoverageTrust.Memory,
        CoverageTrust.Assumed => Wire.CoverageTrust.Assumed,
        CoverageTrust.Missing => Wire.CoverageTrust.Missing,
        _ => throw new ArgumentOutOfRangeException(nameof(trust), trust, "unknown trust"),
    };

    private static Wire.CoverageTable ToWire(Wire.CoverageKind kind, CoverageTable table) => new()
    {
        Kind = kind,
        Rows = { table.Rows },
        Elements = { table.Elements },
        Cells = { table.Cells.Select(cell => ToWire(cell, table.SigmaUnit)) },
        Counts =
        {
            Enum.GetValues<CoverageTrust>().Select(trust => new Wire.CoverageCount { Trust = ToWire(trust), CellCount = table.Count(trust) }),
        },
    };

    private static Wire.CoverageCell ToWire(CoverageCell cell, string unit)
    {
        var sent = new Wire.CoverageCell
        {
            Row = cell.Row,
            Element = cell.Element,
            Species = cell.Species,
            Trust = ToWire(cell.Trust),
            Unit = unit,
            Key = cell.Key,
        };
        if (cell.Sigma is { } sigma)
            sent.Sigma = sigma;
        return sent;
    }
}
