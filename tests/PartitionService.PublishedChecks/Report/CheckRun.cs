using System.Globalization;
using PartitionService.PublishedChecks.Cases;
using PartitionService.PublishedChecks.Judging;
using PartitionService.PublishedChecks.Recipes;
using PartitionService.PublishedChecks.Rows;

namespace PartitionService.PublishedChecks.Report;

/// <summary>One run over all rows.</summary>
internal static class CheckRun
{
    private static readonly Lazy<IReadOnlyList<CheckResult>> Lazily = new(Compute);

    /// <summary>Results in the order of the rows.</summary>
    public static IReadOnlyList<CheckResult> Results => Lazily.Value;

    private static IReadOnlyList<CheckResult> Compute()
    {
        var book = new RecipeBook(new Furnace());
        var results = new Dictionary<string, CheckResult>(StringComparer.Ordinal);

        // Closure looks at every vessel of the run, so it comes last.
        foreach (var row in RowFiles.All.OrderBy(row => row.Recipe is "sum-of-fractions" or "fraction-range"))
        {
            try
            {
                results.Add(row.Id, Check(row, book));
            }
            catch (Exception problem) when (problem is InvalidOperationException or KeyNotFoundException)
            {
                throw new InvalidOperationException($"{row.Id}: {problem.Message}", problem);
            }
        }

        return [.. RowFiles.All.Select(row => results[row.Id])];
    }

    private static CheckResult Check(PublishedRow row, RecipeBook book)
    {
        if (row.Recipe == PublishedRow.NotComputable)
        {
            return new CheckResult(row, "", null, Verdict.NotComputable);
        }

        if (row.Recipe == "deportment")
        {
            return Deportment(row, book.Deportment.Compute(row));
        }

        var computed = Judge.Worst(row, book[row.Recipe](row));
        return new CheckResult(
            row, Text(row.Relation is "increases" or "decreases" ? Rounded(computed) : computed), Judge.DifferenceLog10(row, computed), Judged(row, Judge.Holds(row, computed)));
    }

    private static CheckResult Deportment(PublishedRow row, IReadOnlyList<DeportmentRecipe.Share> shares)
    {
        var worst = shares.MaxBy(share => share.Outside)!;
        var figures = string.Join("; ", shares.Select(share => $"{share.Phase} {Text(share.Percent)}"));
        double? difference = worst.Outside == 0 ? 0
            : worst.Percent > 0 && worst.Nearest > 0 ? Math.Log10(worst.Percent / worst.Nearest)
            : null;
        return new CheckResult(row, figures, difference, Judged(row, worst.Outside <= row.Tolerance));
    }

    private static Verdict Judged(PublishedRow row, bool holds) =>
        !row.Scored ? Verdict.Context : holds ? Verdict.Held : Verdict.Missed;

    private static string Text(double value) => value.ToString("G4", CultureInfo.InvariantCulture);

    /// <summary>A change of a logarithm below the noise of the iteration is shown as zero.</summary>
    private static double Rounded(double value) => Math.Abs(value) < 1e-12 ? 0 : value;
}
