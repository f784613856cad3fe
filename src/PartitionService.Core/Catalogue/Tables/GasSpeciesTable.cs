namespace PartitionService.Core.Catalogue.Tables;

/// <summary>Reads <c>gas_species.csv</c>; the atom counts must agree with the formula.</summary>
internal static class GasSpeciesTable
{
    /// <summary>File name.</summary>
    public const string File = "gas_species.csv";

    private static readonly string[] Columns =
    [
        "species", "atoms", "constant_joule_per_mol", "linear_joule_per_mol_kelvin", "logarithmic_joule_per_mol_kelvin",
        "sigma_joule_per_mol", .. RowTail.Columns,
    ];

    /// <summary>Reads every row.</summary>
    public static IEnumerable<Located<Datum>> Parse(string content)
    {
        var keys = new SlotKeys();
        foreach (var row in CsvTable.Read(File, content, Columns).Rows)
        {
            var tail = new RowTail(row);
            var formula = row.Formula("species");
            var atoms = row.Counts("atoms");
            if (atoms.Count != formula.Atoms.Count || atoms.Any(a => formula.Count(a.Key) != a.Value))
                throw row.Refuse("atoms", row.Text("atoms"), $"the atoms of {formula}");
            var slot = $"gas/{formula.Text}";
            yield return row.At<Datum>(new GasSpeciesDatum
            {
                Slot = slot,
                Key = keys.Next(slot),
                Species = formula.Text,
                Atoms = atoms,
                ConstantJoulePerMol = row.Number("constant_joule_per_mol", -1e7, 1e7),
                LinearJoulePerMolKelvin = row.Number("linear_joule_per_mol_kelvin", -1e4, 1e4),
                LogarithmicJoulePerMolKelvin = row.Number("logarithmic_joule_per_mol_kelvin", -1000, 1000),
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
