namespace PartitionService.Core.Catalogue.Tables;

/// <summary>Reads <c>entrainment.csv</c>.</summary>
internal static class EntrainmentTable
{
    /// <summary>File name.</summary>
    public const string File = "entrainment.csv";

    private static readonly string[] Columns =
    [
        "process", "vessel", "entrained_phase", "mass_percent_low", "mass_percent_typical", "mass_percent_high", ..
        RowTail.Columns,
    ];

    /// <summary>Reads every row.</summary>
    public static IEnumerable<Located<Datum>> Parse(string content)
    {
        var keys = new SlotKeys();
        foreach (var row in CsvTable.Read(File, content, Columns).Rows)
        {
            var tail = new RowTail(row);
            var process = row.Text("process");
            var low = row.Number("mass_percent_low", 0, 100);
            var typical = row.Number("mass_percent_typical", low, 100);
            var slot = $"entrainment/{SlotKeys.Hyphenate(process)}";
            yield return row.At<Datum>(new EntrainmentDatum
            {
                Slot = slot,
                Key = keys.Next(slot),
                Process = process,
                Vessel = row.Text("vessel"),
                EntrainedPhase = row.Text("entrained_phase"),
                LowMassPercent = low,
                TypicalMassPercent = typical,
                HighMassPercent = row.Number("mass_percent_high", typical, 100),
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
