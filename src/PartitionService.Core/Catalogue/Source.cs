namespace PartitionService.Core.Catalogue;

/// <summary>Where a number comes from.</summary>
/// <param name="Id">Short id used by the rows.</param>
/// <param name="Citation">Full citation.</param>
/// <param name="Kind">paper, handbook, dataset, thesis, page, practice or assumption.</param>
/// <param name="Locator">DOI or address of the publication; may be empty.</param>
public sealed record Source(string Id, string Citation, string Kind, string Locator);
