namespace PartitionService.Core.Catalogue.Tables;

/// <summary>Reads <c>interactions.csv</c>; the pair stands in ordinal order because epsilon is symmetric.</summary>
internal static class InteractionTable
{
    /// <summary>File name.</summary>
    public const string File = "interactions.csv";

    private static readonly string[] Columns =
    [
        "solvent", "first", "second", "constant", "inverse_temperature_kelvin", "sigma_epsilon", .. RowTail.Columns,
    ];

    /// <summary>Reads every row.</summary>
    public static IEnumerable<Located<Datum>> Parse(string content)
    {
        var keys = new SlotKeys();
        foreach (var row in CsvTable.Read(File, content, Columns).Rows)
        {
            var tail = new RowTail(row);
            var solvent = row.Text("solvent");
            var first = row.Text("first");
            var second = row.Text("second");
            if (string.CompareOrdinal(first, second) > 0)
                throw row.Refuse("second", second, $"a symbol not before '{first}' in ordinal order");
            var slot = $"interaction/{solvent}/{first}/{second}";
            yield return row.At<Datum>(new InteractionDatum
            {
                Slot = slot,
                Key = keys.Next(slot),
                Solvent = solvent,
                First = first,
                Second = second,
                Constant = row.Number("constant", -1e6, 1e6),
                InverseTemperatureKelvin = row.Number("inverse_temperature_kelvin", -1e8, 1e8),
                SigmaEpsilon = row.Positive("sigma_epsilon", 1e6),
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
