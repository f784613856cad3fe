namespace PartitionService.Core.Catalogue.Tables;

/// <summary>Reads <c>slag_components.csv</c>.</summary>
internal static class SlagComponentTable
{
    /// <summary>File name.</summary>
    public const string File = "slag_components.csv";

    private static readonly string[] Columns =
    [
        "family", "component", "mass_percent_low", "mass_percent_typical", "mass_percent_high", "access", "source_ids", "note",
    ];

    /// <summary>Reads every row; a component stands once in a family.</summary>
    public static IReadOnlyList<Located<SlagComponentRow>> Parse(string content)
    {
        var seen = new HashSet<(string, string)>();
        var components = new List<Located<SlagComponentRow>>();
        foreach (var row in CsvTable.Read(File, content, Columns).Rows)
        {
            var family = row.Text("family");
            var formula = row.Formula("component");
            if (!seen.Add((family, formula.Text)))
                throw row.Refuse("component", formula.Text, $"a component that stands once in family '{family}'");
            var low = row.Number("mass_percent_low", 0, 100);
            var typical = row.Number("mass_percent_typical", low, 100);
            var component = new SlagComponent(formula.Text, low, typical, row.Number("mass_percent_high", typical, 100));
            row.Word("access", Words.Access);
            components.Add(row.At(new SlagComponentRow(family, component, formula, RowTail.ReadSources(row))));
        }

        return components;
    }
}

/// <summary>A component with the family it belongs to.</summary>
/// <param name="Family">Family name.</param>
/// <param name="Component">Composition window.</param>
/// <param name="Formula">The component's formula, resolved.</param>
/// <param name="SourceIds">Ids of the sources.</param>
internal sealed record SlagComponentRow(string Family, SlagComponent Component, ChemicalFormula Formula, IReadOnlyList<string> SourceIds);
