namespace PartitionService.Server.Paging;

/// <summary>One page of a list.</summary>
/// <param name="Entries">Entries of the page.</param>
/// <param name="NextToken">Token of the next page; empty on the last.</param>
/// <param name="TotalSize">Number of entries on all pages.</param>
internal sealed record Page<T>(IReadOnlyList<T> Entries, string NextToken, int TotalSize);
