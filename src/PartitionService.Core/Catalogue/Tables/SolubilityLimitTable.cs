namespace PartitionService.Core.Catalogue.Tables;

/// <summary>Reads <c>solubility_limits.csv</c>.</summary>
internal static class SolubilityLimitTable
{
    /// <summary>File name.</summary>
    public const string File = "solubility_limits.csv";

    private static readonly string[] Columns =
    [
        "solvent", "exponents", "constant", "inverse_temperature_kelvin", "precipitating_phase", "sigma_log10", ..
        RowTail.Columns,
    ];

    /// <summary>Reads every row.</summary>
    public static IEnumerable<Located<Datum>> Parse(string content)
    {
        var keys = new SlotKeys();
        foreach (var row in CsvTable.Read(File, content, Columns).Rows)
        {
            var tail = new RowTail(row);
            var solvent = row.Text("solvent");
            var exponents = row.Counts("exponents");
            if (exponents.Count > 2 || (exponents.Count == 1 && exponents.Values.Single() != 1))
                throw row.Refuse("exponents", row.Text("exponents"), "one element with exponent 1 or a pair of elements");
            var slot = $"solubility/{solvent}/{string.Join('-', exponents.Keys)}";
            yield return row.At<Datum>(new SolubilityLimitDatum
            {
                Slot = slot,
                Key = keys.Next(slot),
                Solvent = solvent,
                Exponents = exponents,
                Constant = row.Number("constant", -100, 100),
                InverseTemperatureKelvin = row.Number("inverse_temperature_kelvin", -1e5, 1e5),
                PrecipitatingPhase = row.Text("precipitating_phase"),
                SigmaLog10 = row.Positive("sigma_log10", 5),
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
