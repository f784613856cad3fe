namespace PartitionService.Core.Catalogue;

/// <summary>One cell of a coverage table: what is known of one column's element in one row.</summary>
/// <param name="Row">Name of the row: a solvent, a slag family or <c>gas</c>.</param>
/// <param name="Element">Element symbol of the column.</param>
/// <param name="Species">Solute, oxide, chloride or gas species that the number is about; empty where it is missing.</param>
/// <param name="Trust">How well the number is founded.</param>
/// <param name="Sigma">One standard deviation in the unit of the table; null where the number is missing.</param>
/// <param name="Key">Key of the catalogue row; empty where the number is missing.</param>
public sealed record CoverageCell(string Row, string Element, string Species, CoverageTrust Trust, double? Sigma, string Key);
