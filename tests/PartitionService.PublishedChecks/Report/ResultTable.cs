using System.Globalization;
using System.Text;
using PartitionService.PublishedChecks.Judging;
using PartitionService.PublishedChecks.Rows;

namespace PartitionService.PublishedChecks.Report;

/// <summary>Writes results as comma-separated text and as Markdown.</summary>
internal static class ResultTable
{
    private static readonly string[] Columns =
    [
        "id", "kind", "quantity", "conditions", "published", "computed", "difference_log10", "tolerance", "verdict", "pack_overlap",
        "access", "source",
    ];

    /// <summary>Comma-separated text.</summary>
    public static string Csv(IReadOnlyList<CheckResult> results)
    {
        var text = new StringBuilder();
        foreach (var line in results.Select(Cells).Prepend(Columns))
        {
            text.Append(CsvText.Join(line)).Append('\n');
        }

        return text.ToString();
    }

    /// <summary>Markdown: summary, then one table per kind.</summary>
    public static string Markdown(IReadOnlyList<CheckResult> results)
    {
        var text = new StringBuilder("# Published checks: results of a run\n\n");
        text.Append("Written by the tests; README.md explains the columns and every miss. Difference: computed over published, log10; for a bound it is\n");
        text.Append("the distance from the bound, for a trend the change itself; 0 inside a published range.\n\n");
        Summary(text, results);
        foreach (var kind in RowFiles.Kinds)
        {
            text.Append(CultureInfo.InvariantCulture, $"\n## {kind.Replace('_', ' ')}\n\n");
            text.Append("| id | quantity | published | computed | difference | tolerance | verdict | overlap | access |\n");
            text.Append("| --- | --- | --- | --- | --- | --- | --- | --- | --- |\n");
            foreach (var cells in results.Where(result => result.Row.Kind == kind).Select(Cells))
            {
                text.Append(CultureInfo.InvariantCulture, $"| {cells[0]} | {cells[2]} | {cells[4]} | {cells[5]} | {cells[6]} | {cells[7]} | ");
                text.Append(CultureInfo.InvariantCulture, $"{cells[8]} | {cells[9]} | {cells[10]} |\n");
            }
        }

        return text.ToString();
    }

    /// <summary>Cells of one result in the order of the columns.</summary>
    public static IReadOnlyList<string> Cells(CheckResult result)
    {
        var row = result.Row;
        return
        [
            row.Id,
            row.Kind,
            Quantity(row),
            row.Fields["conditions"],
            Published(row),
            result.Computed,
            result.DifferenceLog10 is { } difference ? Fixed(difference) : "",
            $"{row.Fields["tolerance"]} {row.Scale}".Trim(),
            result.Verdict switch
            {
                Verdict.Held => "held",
                Verdict.Missed => "MISSED",
                Verdict.Context => "context, not scored",
                _ => $"not computable: {row.Fields["reason"]}",
            },
            row.Fields["pack_overlap"].Length > 0 ? "yes" : "no",
            row.Fields["access"],
            row.Fields["citation"],
        ];
    }

    /// <summary>Two decimals, without a negative zero.</summary>
    private static string Fixed(double value) =>
        (Math.Round(value, 2) + 0.0).ToString("0.00", CultureInfo.InvariantCulture);

    private static string Quantity(PublishedRow row)
    {
        var pair = row.CompareElement.Length > 0 ? $"{row.Fields["element"]} against {row.CompareElement}" : row.Fields["element"];
        var where = row.Fields["solvent"].Length > 1 ? $" in {row.Fields["solvent"]}" : "";
        return pair.Length == 0 ? row.Fields["quantity"] : $"{pair}{where}: {row.Fields["quantity"]}";
    }

    private static string Published(PublishedRow row)
    {
        if (row.Kind == "deportment")
        {
            return string.Join("; ", new[] { "metal", "slag", "gas" }
                .Where(phase => row.Fields[$"{phase}_low_percent"].Length > 0)
                .Select(phase => Range(phase, row.Fields[$"{phase}_low_percent"], row.Fields[$"{phase}_high_percent"])));
        }

        return row.Relation switch
        {
            "increases" or "decreases" => row.Relation,
            "between" => $"{row.Fields["value_low"]} to {row.Fields["value_high"]}",
            "=" => row.Fields["value"],
            _ => $"{row.Relation} {row.Fields["value"]}",
        };
    }

    private static string Range(string phase, string low, string high) => low == high ? $"{phase} {low}" : $"{phase} {low}-{high}";

    private static void Summary(StringBuilder text, IReadOnlyList<CheckResult> results)
    {
        text.Append("| rows | scored | held | missed | per cent |\n| --- | --- | --- | --- | --- |\n");
        var validation = results.Where(result => result.Row.Kind != RowFiles.FurtherChecks).ToArray();
        Line("validation rows", validation);
        Line("validation rows without pack overlap", validation.Where(result => result.Row.Fields["pack_overlap"].Length == 0));
        Line("validation rows with pack overlap", validation.Where(result => result.Row.Fields["pack_overlap"].Length > 0));
        Line("validation rows without worked examples", validation.Where(result => result.Row.Kind != "worked_examples"));
        foreach (var kind in RowFiles.Kinds)
        {
            Line(kind.Replace('_', ' '), results.Where(result => result.Row.Kind == kind));
        }

        text.Append(CultureInfo.InvariantCulture, $"\nNot scored: {results.Count(r => r.Verdict == Verdict.Context)} rows of context, ");
        text.Append(CultureInfo.InvariantCulture, $"{results.Count(r => r.Verdict == Verdict.NotComputable)} rows not computable.\n");

        void Line(string name, IEnumerable<CheckResult> some)
        {
            var score = Score.Of(some);
            text.Append(CultureInfo.InvariantCulture, $"| {name} | {score.Scored} | {score.Held} | {score.Missed} | {score.Percent:0.0} |\n");
        }
    }
}
