namespace PartitionService.Core.Catalogue.Tables;

/// <summary>Reads <c>oxidation.csv</c>.</summary>
internal static class OxidationTable
{
    /// <summary>File name.</summary>
    public const string File = "oxidation.csv";

    private static readonly string[] Columns =
    [
        "element", "oxide", "metal_state", "oxide_state", "enthalpy_joule_per_mol", "slope_joule_per_mol_kelvin",
        "sigma_joule_per_mol", .. RowTail.Columns,
    ];

    /// <summary>Reads every row.</summary>
    public static IEnumerable<Located<Datum>> Parse(string content)
    {
        var keys = new SlotKeys();
        foreach (var row in CsvTable.Read(File, content, Columns).Rows)
        {
            var tail = new RowTail(row);
            var element = row.Text("element");
            var oxide = MononuclearFormula.Read(row, "oxide", "O");
            if (oxide.Element != element)
                throw row.Refuse("element", element, $"{oxide.Element}, the element of {oxide.Text}");
            var slot = $"oxidation/{oxide.Text}";
            yield return row.At<Datum>(new OxidationDatum
            {
                Slot = slot,
                Key = keys.Next(slot),
                Element = element,
                Oxide = oxide.Text,
                OxygenPerMetal = oxide.PartnerPerMetal,
                MetalState = row.Word("metal_state", Words.MetalState),
                OxideState = row.Word("oxide_state", Words.CondensedState),
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
