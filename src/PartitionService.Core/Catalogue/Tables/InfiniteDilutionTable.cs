namespace PartitionService.Core.Catalogue.Tables;

/// <summary>Reads <c>infinite_dilution.csv</c>.</summary>
internal static class InfiniteDilutionTable
{
    /// <summary>File name.</summary>
    public const string File = "infinite_dilution.csv";

    private static readonly string[] Columns =
    [
        "solvent", "solute", "solute_state", "constant", "inverse_temperature_kelvin", "sigma_ln_gamma",
        "henrian_limit_mole_fraction", .. RowTail.Columns,
    ];

    /// <summary>Reads every row.</summary>
    public static IEnumerable<Located<Datum>> Parse(string content)
    {
        var keys = new SlotKeys();
        foreach (var row in CsvTable.Read(File, content, Columns).Rows)
        {
            var tail = new RowTail(row);
            var solvent = row.Text("solvent");
            var solute = row.Text("solute");
            if (solvent == solute)
                throw row.Refuse("solute", solute, "an element other than the solvent");
            var slot = $"metal/{solvent}/{solute}";
            yield return row.At<Datum>(new InfiniteDilutionDatum
            {
                Slot = slot,
                Key = keys.Next(slot),
                Solvent = solvent,
                Solute = solute,
                SoluteState = row.Word("solute_state", Words.SoluteState),
                Constant = row.Number("constant", -100, 100),
                InverseTemperatureKelvin = row.Number("inverse_temperature_kelvin", -1e5, 1e5),
                SigmaLnGamma = row.Positive("sigma_ln_gamma", 20),
                HenrianLimitMoleFraction = row.OptionalPositive("henrian_limit_mole_fraction", 1),
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
