namespace PartitionService.Core.Catalogue;

/// <summary>The columns that every datum row ends with, read once for all tables.</summary>
internal sealed class RowTail
{
    /// <summary>Names of the columns in their order.</summary>
    public static readonly string[] Columns =
    [
        "temperature_min_kelvin", "temperature_max_kelvin", "preferred", "preferred_reason", "access", "source_ids", "flags", "note",
    ];

    /// <summary>Reads and checks the columns.</summary>
    public RowTail(RowReader row)
    {
        Minimum = row.Positive("temperature_min_kelvin", 6000);
        Maximum = row.Number("temperature_max_kelvin", Minimum, 6000);
        Preferred = row.Word("preferred", Words.YesNo);
        Reason = Preferred ? row.OptionalText("preferred_reason") : row.Text("preferred_reason");
        Access = row.Word("access", Words.Access);
        SourceIds = ReadSources(row);
        Flags = row.List("flags");
        Note = row.OptionalText("note");
        if (Flags.Contains("assumed") && Access != Access.Assumed)
            throw row.Refuse("access", row.Text("access"), "assumed, because the row is flagged assumed");
    }

    /// <summary>Lower end of the temperature range in kelvin.</summary>
    public double Minimum { get; }

    /// <summary>Upper end of the temperature range in kelvin.</summary>
    public double Maximum { get; }

    /// <summary>True where the row counts.</summary>
    public bool Preferred { get; }

    /// <summary>Why the row counts or not.</summary>
    public string Reason { get; }

    /// <summary>How the number was obtained.</summary>
    public Access Access { get; }

    /// <summary>Source ids, at least one.</summary>
    public IReadOnlyList<string> SourceIds { get; }

    /// <summary>Machine-readable cautions.</summary>
    public IReadOnlyList<string> Flags { get; }

    /// <summary>Free text.</summary>
    public string Note { get; }

    /// <summary>Source ids of a row; at least one is required.</summary>
    public static IReadOnlyList<string> ReadSources(RowReader row) =>
        row.List("source_ids") is { Count: > 0 } ids ? ids : throw row.Refuse("source_ids", "", "at least one source id");
}
