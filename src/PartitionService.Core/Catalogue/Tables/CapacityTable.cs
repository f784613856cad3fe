namespace PartitionService.Core.Catalogue.Tables;

/// <summary>Reads <c>capacities.csv</c>.</summary>
internal static class CapacityTable
{
    /// <summary>File name.</summary>
    public const string File = "capacities.csv";

    private static readonly string[] Columns =
    [
        "id", "quantity", "formula", "symbols", "validity", "sigma_log10", "worked_inputs", "worked_value_log10", ..
        RowTail.Columns,
    ];

    /// <summary>Reads every row.</summary>
    public static IEnumerable<Located<Datum>> Parse(string content)
    {
        var keys = new SlotKeys();
        foreach (var row in CsvTable.Read(File, content, Columns).Rows)
        {
            var tail = new RowTail(row);
            var id = row.Text("id");
            var slot = $"capacity/{id}";
            yield return row.At<Datum>(new CapacityDatum
            {
                Slot = slot,
                Key = keys.Next(slot),
                Id = id,
                Quantity = row.Text("quantity"),
                Formula = row.Text("formula"),
                Symbols = row.Text("symbols"),
                Validity = row.Text("validity"),
                SigmaLog10 = row.OptionalPositive("sigma_log10", 5),
                WorkedInputs = row.OptionalText("worked_inputs"),
                WorkedValue = row.OptionalText("worked_value_log10"),
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
