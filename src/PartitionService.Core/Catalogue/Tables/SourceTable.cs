namespace PartitionService.Core.Catalogue.Tables;

/// <summary>Reads <c>sources.csv</c>.</summary>
internal static class SourceTable
{
    /// <summary>File name.</summary>
    public const string File = "sources.csv";

    private static readonly string[] Columns = ["id", "citation", "kind", "locator"];

    /// <summary>Reads every row; ids are unique.</summary>
    public static Dictionary<string, Source> Parse(string content)
    {
        var sources = new Dictionary<string, Source>(StringComparer.Ordinal);
        foreach (var row in CsvTable.Read(File, content, Columns).Rows)
        {
            var source = new Source(row.Text("id"), row.Text("citation"), row.Text("kind"), row.OptionalText("locator"));
            if (!sources.TryAdd(source.Id, source))
                throw row.Refuse("id", source.Id, "an id that no other row has");
        }

        return sources;
    }
}
