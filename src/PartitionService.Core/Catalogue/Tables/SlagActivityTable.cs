namespace PartitionService.Core.Catalogue.Tables;

/// <summary>Reads <c>slag_activities.csv</c>.</summary>
internal static class SlagActivityTable
{
    /// <summary>File name.</summary>
    public const string File = "slag_activities.csv";

    private static readonly string[] Columns =
    [
        "family", "oxide", "oxide_state", "metal_state", "constant", "inverse_temperature_kelvin", "variable", "slope_per_unit",
        "variable_reference", "sigma_ln_gamma", "sigma_same_metal", "kind", .. RowTail.Columns,
    ];

    /// <summary>Reads every row.</summary>
    public static IEnumerable<Located<Datum>> Parse(string content)
    {
        var keys = new SlotKeys();
        foreach (var row in CsvTable.Read(File, content, Columns).Rows)
        {
            var tail = new RowTail(row);
            var family = row.Text("family");
            var oxide = MononuclearFormula.Read(row, "oxide", "O", "Cl");
            SlagVariable? variable = row.OptionalText("variable").Length == 0 ? null : row.Word("variable", Words.SlagVariable);
            var slope = row.Number("slope_per_unit", -10, 10);
            if ((slope != 0) != variable.HasValue)
                throw row.Refuse("slope_per_unit", row.Text("slope_per_unit"), "a slope other than 0 exactly where a variable is named");
            var kind = row.Word("kind", Words.SlagKind);
            if (kind == "assumed" && tail.Access != Access.Assumed)
                throw row.Refuse("access", row.Text("access"), "assumed, because the kind is assumed");
            var slot = $"slag/{family}/{oxide.Text}";
            yield return row.At<Datum>(new SlagActivityDatum
            {
                Slot = slot,
                Key = keys.Next(slot),
                Family = family,
                Element = oxide.Element,
                Oxide = oxide.Text,
                OxygenPerMetal = oxide.Partner == "O" ? oxide.PartnerPerMetal : 0,
                ChlorinePerMetal = oxide.Partner == "Cl" ? oxide.PartnerPerMetal : 0,
                OxideState = row.Word("oxide_state", Words.SlagState),
                MetalState = row.Word("metal_state", Words.CondensedState),
                Constant = row.Number("constant", -100, 100),
                InverseTemperatureKelvin = row.Number("inverse_temperature_kelvin", -1e5, 1e5),
                Variable = variable,
                Slope = slope,
                VariableReference = row.Number("variable_reference", -1000, 1000),
                SigmaLnGamma = row.Positive("sigma_ln_gamma", 20),
                SigmaSameMetal = row.Positive("sigma_same_metal", 20),
                Kind = kind,
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
