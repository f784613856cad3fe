namespace PartitionService.PublishedChecks.Rows;

/// <summary>The files of published rows.</summary>
internal static class RowFiles
{
    /// <summary>Files in the order of the report. The last holds the checks beyond the validation rows.</summary>
    public static IReadOnlyList<string> Kinds { get; } =
    [
        "activity_coefficients",
        "partition_ratios",
        "volatilisation",
        "deportment",
        "facts_of_the_trade",
        "worked_examples",
        FurtherChecks,
    ];

    /// <summary>Checks that this project adds.</summary>
    public const string FurtherChecks = "further_checks";

    /// <summary>All rows, loaded once.</summary>
    public static IReadOnlyList<PublishedRow> All { get; } = [.. Kinds.SelectMany(Load)];

    private static IEnumerable<PublishedRow> Load(string kind)
    {
        var records = CsvText.Split(File.ReadAllText(Path.Combine(AppContext.BaseDirectory, "Data", $"{kind}.csv")));
        foreach (var record in records.Skip(1))
        {
            if (record.Count != records[0].Count)
            {
                throw new InvalidDataException($"{kind}.csv: the row that starts with {record[0]} has {record.Count} fields");
            }

            yield return new PublishedRow(
                kind, records[0].Zip(record).ToDictionary(pair => pair.First, pair => pair.Second, StringComparer.Ordinal));
        }
    }
}
