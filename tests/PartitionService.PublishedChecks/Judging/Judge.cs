using PartitionService.PublishedChecks.Rows;

namespace PartitionService.PublishedChecks.Judging;

/// <summary>Compares a computed number with a published statement.</summary>
internal static class Judge
{
    /// <summary>Least change of a logarithm (base 10) that counts as a rise or fall.</summary>
    private const double LeastChange = 1e-6;

    /// <summary>The candidate that agrees worst with the row; a row with a range of conditions must hold at all of them.</summary>
    public static double Worst(PublishedRow row, IReadOnlyList<double> candidates) =>
        candidates.MaxBy(candidate => double.IsNaN(candidate) ? double.PositiveInfinity : Excess(row, candidate));

    /// <summary>True where the statement holds.</summary>
    public static bool Holds(PublishedRow row, double computed) =>
        !double.IsNaN(computed) && (row.Relation is "<" or ">" or "increases" or "decreases"
            ? Excess(row, computed) < 0
            : Excess(row, computed) <= 0);

    /// <summary>Distance beyond the tolerance on the row's scale; negative inside.</summary>
    public static double Excess(PublishedRow row, double computed)
    {
        double Step(double? published) => row.Scale switch
        {
            "log10" => Math.Log10(computed / published!.Value),
            "relative" => (AsPrinted(computed) / published!.Value) - 1,
            _ => computed - published!.Value,
        };

        return row.Relation switch
        {
            "=" => Math.Abs(Step(row.Value)) - row.Tolerance,
            ">=" or ">" => -Step(row.Value) - row.Tolerance,
            "<=" or "<" => Step(row.Value) - row.Tolerance,
            "between" => Math.Max(-Step(row.Low), Step(row.High)) - row.Tolerance,
            "increases" => LeastChange - computed,
            "decreases" => LeastChange + computed,
            _ => throw new InvalidDataException($"{row.Id}: unknown relation {row.Relation}"),
        };
    }

    /// <summary>Worked examples print six significant digits, some with a tolerance of 1e-6; the computed figure is rounded alike.</summary>
    private static double AsPrinted(double value)
    {
        var unit = Math.Pow(10, Math.Floor(Math.Log10(Math.Abs(value))) - 5);
        return Math.Round(value / unit) * unit;
    }

    /// <summary>Computed over published in log10 units; zero inside a published range; null where a logarithm has no meaning.</summary>
    public static double? DifferenceLog10(PublishedRow row, double computed)
    {
        if (row.Relation is "increases" or "decreases")
        {
            return computed;
        }

        var nearest = row.Relation == "between" ? Math.Clamp(computed, row.Low!.Value, row.High!.Value) : row.Value!.Value;
        return row.Fields["unit"].StartsWith("log10", StringComparison.Ordinal) ? computed - nearest
            : computed > 0 && nearest > 0 ? Math.Log10(computed / nearest)
            : null;
    }
}
