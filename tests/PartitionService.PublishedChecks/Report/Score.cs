using PartitionService.PublishedChecks.Judging;

namespace PartitionService.PublishedChecks.Report;

/// <summary>Counts over some results.</summary>
/// <param name="Scored">Rows that count.</param>
/// <param name="Held">Rows that hold.</param>
internal sealed record Score(int Scored, int Held)
{
    /// <summary>Rows that do not hold.</summary>
    public int Missed => Scored - Held;

    /// <summary>Share that holds, per cent.</summary>
    public double Percent => 100.0 * Held / Scored;

    /// <summary>Counts results.</summary>
    public static Score Of(IEnumerable<CheckResult> results)
    {
        var scored = results.Where(result => result.Row.Scored).ToArray();
        return new Score(scored.Length, scored.Count(result => result.Verdict == Verdict.Held));
    }
}
