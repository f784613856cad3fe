using PartitionService.PublishedChecks.Rows;

namespace PartitionService.PublishedChecks.Judging;

/// <summary>What came of one row.</summary>
/// <param name="Row">The row.</param>
/// <param name="Computed">Computed figures in words; empty where nothing was computed.</param>
/// <param name="DifferenceLog10">Computed over published, log10; null where it has no meaning.</param>
/// <param name="Verdict">The verdict.</param>
internal sealed record CheckResult(PublishedRow Row, string Computed, double? DifferenceLog10, Verdict Verdict);
