namespace PartitionService.Core.Catalogue.Tables;

/// <summary>Reads <c>chlorides.csv</c>.</summary>
internal static class ChlorideTable
{
    /// <summary>File name.</summary>
    public const string File = "chlorides.csv";

    private static readonly string[] Columns =
    [
        "element", "chloride", "chloride_state", "enthalpy_joule_per_mol", "slope_joule_per_mol_kelvin", "sigma_joule_per_mol", ..
        RowTail.Columns,
    ];

    /// <summary>Reads every row.</summary>
    public static IEnumerable<Located<Datum>> Parse(string content)
    {
        var keys = new SlotKeys();
        foreach (var row in CsvTable.Read(File, content, Columns).Rows)
        {
            var tail = new RowTail(row);
            var element = row.Text("element");
            var chloride = MononuclearFormula.Read(row, "chloride", "Cl");
            if (chloride.Element != element)
                throw row.Refuse("element", element, $"{chloride.Element}, the element of {chloride.Text}");
            var slot = $"chloride/{chloride.Text}";
            yield return row.At<Datum>(new ChlorideDatum
            {
                Slot = slot,
                Key = keys.Next(slot),
                Element = element,
                Chloride = chloride.Text,
                ChlorinePerMetal = chloride.PartnerPerMetal,
                ChlorideState = row.Word("chloride_state", Words.CondensedState),
                EnthalpyJoulePerMol = row.Number("enthalpy_joule_per_mol", -3e6, 1e6),
                SlopeJoulePerMolKelvin = row.Number("slope_joule_per_mol_kelvin", -1000, 1000),
                SigmaJoulePerMol = row.Positive("sigma_joule_per_mol", 1e5),
                MinimumTemperatureKelvin = tail.Minimum,
                MaximumTemperatureKelvin = tail.Maximum,
                Preferred = tail.Preferred,
                PreferredReason = tail.Reason,
                Access = tail.Access,
                SourceIds = tail.SourceIds,
                Flags = tail.Flags,
                Note = tail.Note,
            });
        }
    }
}
