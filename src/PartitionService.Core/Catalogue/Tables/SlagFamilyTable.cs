namespace PartitionService.Core.Catalogue.Tables;

/// <summary>Reads <c>slag_families.csv</c> and joins the components and the typical entrainment.</summary>
internal static class SlagFamilyTable
{
    /// <summary>File name.</summary>
    public const string File = "slag_families.csv";

    private static readonly string[] Columns =
    [
        "family", "description", "temperature_min_kelvin", "temperature_max_kelvin", "mono_cation_mol_per_100_gram", "entrainment_slot",
        "capacity_formulas", "access", "source_ids", "note",
    ];

    /// <summary>Reads every row.</summary>
    /// <param name="content">The file.</param>
    /// <param name="components">Rows of <c>slag_components.csv</c>.</param>
    /// <param name="data">Data among which the entrainment rows are looked up.</param>
    public static IReadOnlyList<Located<SlagFamily>> Parse(
        string content,
        IReadOnlyList<Located<SlagComponentRow>> components,
        IReadOnlyList<Located<Datum>> data)
    {
        var byFamily = components.ToLookup(c => c.Value.Family, c => c.Value.Component, StringComparer.Ordinal);
        var entrainment = data.Select(d => d.Value).OfType<EntrainmentDatum>().ToLookup(d => d.Slot, StringComparer.Ordinal);
        var seen = new HashSet<string>(StringComparer.Ordinal);
        var families = new List<Located<SlagFamily>>();
        foreach (var row in CsvTable.Read(File, content, Columns).Rows)
        {
            var name = row.Text("family");
            if (!seen.Add(name) || name != SlotKeys.Hyphenate(name))
                throw row.Refuse("family", name, "a name in lower case with hyphens that no other row has");
            if (!byFamily[name].Any())
                throw row.Refuse("family", name, $"a family with at least one row in {SlagComponentTable.File}");
            var slot = row.OptionalText("entrainment_slot");
            var entrained = slot.Length == 0
                ? null
                : entrainment[slot].FirstOrDefault(d => d.Preferred)
                    ?? throw row.Refuse("entrainment_slot", slot, $"the slot of a preferred row in {EntrainmentTable.File}");
            var minimum = row.Positive("temperature_min_kelvin", 6000);
            families.Add(row.At(new SlagFamily(
                name,
                row.Text("description"),
                minimum,
                row.Number("temperature_max_kelvin", minimum, 6000),
                row.Positive("mono_cation_mol_per_100_gram", 10),
                [.. byFamily[name]],
                entrained?.TypicalMassPercent,
                slot,
                row.List("capacity_formulas"),
                row.Word("access", Words.Access),
                RowTail.ReadSources(row),
                row.OptionalText("note"))));
        }

        return families;
    }
}
