using System.Collections.Concurrent;
using System.Globalization;
using PartitionService.Core.Equilibrium;

namespace PartitionService.Core.Tests.Equilibrium.RandomCases;

/// <summary>Counts outcomes of random cases; safe to share between threads.</summary>
internal sealed class RandomCaseTally
{
    private readonly ConcurrentDictionary<string, int> failures = new(StringComparer.Ordinal);
    private readonly ConcurrentBag<SolutionReport> reports = [];

    /// <summary>Seed and what is wrong.</summary>
    public ConcurrentBag<(int Seed, string Fault)> Faults { get; } = [];

    /// <summary>Number of cases with an answer.</summary>
    public int Solved => reports.Count;

    /// <summary>Share of the answers that needed the slower method.</summary>
    public double BarrierShare => reports.Count(r => r.UsedBarrierMethod) / (double)Math.Max(1, reports.Count);

    /// <summary>Counts one case.</summary>
    public void Add(int seed, string? fault, SolveOutcome? outcome)
    {
        if (fault is not null)
        {
            Faults.Add((seed, fault));
        }

        switch (outcome)
        {
            case SolveOutcome.Solved solved:
                reports.Add(solved.Answer.Solution);
                break;
            case SolveOutcome.Failed failed:
                failures.AddOrUpdate(failed.Reason.ToString(), 1, (_, count) => count + 1);
                break;
            default:
                break;
        }
    }

    /// <summary>The counts in words.</summary>
    public string Summary()
    {
        var kinds = string.Join(", ", failures.OrderBy(f => f.Key, StringComparer.Ordinal).Select(f => $"{f.Key} {f.Value}"));
        return string.Create(
            CultureInfo.InvariantCulture,
            $"solved {Solved}; {kinds}; mean iterations {Mean(r => r.Iterations):F2}, passes {Mean(r => r.ActivityPasses):F2}, most passes {reports.Max(r => r.ActivityPasses)}, barrier {100 * BarrierShare:F3} %, largest balance error {reports.Max(r => r.LargestBalanceError):E1}");
    }

    /// <summary>The first faults by seed.</summary>
    public string FaultText() =>
        $"{Faults.Count} faults\n{string.Join('\n', Faults.OrderBy(f => f.Seed).Take(40).Select(f => $"seed {f.Seed}: {f.Fault}"))}\n{Summary()}";

    private double Mean(Func<SolutionReport, int> selector) => reports.IsEmpty ? 0 : reports.Average(selector);
}
