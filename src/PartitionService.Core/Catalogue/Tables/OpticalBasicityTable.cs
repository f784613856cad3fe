namespace PartitionService.Core.Catalogue.Tables;

/// <summary>Reads <c>optical_basicities.csv</c>.</summary>
internal static class OpticalBasicityTable
{
    /// <summary>File name.</summary>
    public const string File = "optical_basicities.csv";

    private static readonly string[] Columns =
    [
        "oxide", "optical_basicity", "set", "sigma", .. RowTail.Columns,
    ];

    /// <summary>Reads every row.</summary>
    public static IEnumerable<Located<Datum>> Parse(string content)
    {
        var keys = new SlotKeys();
        foreach (var row in CsvTable.Read(File, content, Columns).Rows)
        {
            var tail = new RowTail(row);
            var oxide = row.Formula("oxide").Text;
            var slot = $"optical-basicity/{oxide}";
            yield return row.At<Datum>(new OpticalBasicityDatum
            {
                Slot = slot,
                Key = keys.Next(slot),
                Oxide = oxide,
                OpticalBasicity = row.Positive("optical_basicity", 3),
                Set = row.Text("set"),
                Sigma = row.Positive("sigma", 1),
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
