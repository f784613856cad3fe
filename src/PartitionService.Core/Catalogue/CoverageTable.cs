namespace PartitionService.Core.Catalogue;

/// <summary>One table of a <see cref="CoverageMatrix"/>.</summary>
/// <param name="SigmaUnit">Unit of the standard deviations, <c>1</c> where they have none (natural logarithm).</param>
/// <param name="Rows">Names of the rows in ordinal order.</param>
/// <param name="Elements">Element symbols of the columns in ordinal order; each has a number in at least one row of the table.</param>
/// <param name="Cells">Cells by row, then by element, then by species. A pair of row and element has at least one cell.</param>
public sealed record CoverageTable(
    string SigmaUnit,
    IReadOnlyList<string> Rows,
    IReadOnlyList<string> Elements,
    IReadOnlyList<CoverageCell> Cells)
{
    /// <summary>Number of cells of a trust level.</summary>
    public int Count(CoverageTrust trust) => Cells.Count(cell => cell.Trust == trust);

    /// <summary>Cells of one row and element, by species; several where several valences count.</summary>
    public IEnumerable<CoverageCell> At(string row, string element) => Cells.Where(cell => cell.Row == row && cell.Element == element);
}
