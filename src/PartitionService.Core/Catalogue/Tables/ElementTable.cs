namespace PartitionService.Core.Catalogue.Tables;

/// <summary>Reads <c>elements.csv</c>.</summary>
internal static class ElementTable
{
    /// <summary>File name.</summary>
    public const string File = "elements.csv";

    private static readonly string[] Columns =
    [
        "symbol", "atomic_mass_gram_per_mol", "melting_point_kelvin", "enthalpy_of_fusion_joule_per_mol", "boiling_point_kelvin",
        "enthalpy_of_vaporisation_joule_per_mol", "access", "source_ids", "note",
    ];

    /// <summary>Reads every row; symbols are unique and known.</summary>
    public static IReadOnlyList<Located<Element>> Parse(string content)
    {
        var seen = new HashSet<string>(StringComparer.Ordinal);
        var elements = new List<Located<Element>>();
        foreach (var row in CsvTable.Read(File, content, Columns).Rows)
        {
            var symbol = row.Text("symbol");
            if (!ElementSymbols.Contains(symbol) || !seen.Add(symbol))
                throw row.Refuse("symbol", symbol, "an element symbol that no other row has");
            elements.Add(row.At(new Element(
                symbol,
                row.Positive("atomic_mass_gram_per_mol", 300),
                row.Positive("melting_point_kelvin", 6000),
                row.Positive("enthalpy_of_fusion_joule_per_mol", 2e5),
                row.Positive("boiling_point_kelvin", 8000),
                row.Positive("enthalpy_of_vaporisation_joule_per_mol", 1e6),
                row.Word("access", Words.Access),
                RowTail.ReadSources(row),
                row.OptionalText("note"))));
        }

        return elements;
    }
}
