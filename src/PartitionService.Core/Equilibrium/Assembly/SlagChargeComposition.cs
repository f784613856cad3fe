using PartitionService.Core.Catalogue;
using PartitionService.Core.Thermodynamics;

namespace PartitionService.Core.Equilibrium.Assembly;

/// <summary>Composition of the charged slag constituents as whole oxides.</summary>
internal static class SlagChargeComposition
{
    private static readonly (string Element, string Oxide, double Atoms)[] WholeOxides =
    [
        ("Al", "Al2O3", 2), ("As", "As2O3", 2), ("B", "B2O3", 2), ("Ba", "BaO", 1), ("Ca", "CaO", 1), ("Cr", "Cr2O3", 2),
        ("Cu", "Cu2O", 2), ("K", "K2O", 2), ("Li", "Li2O", 2), ("Mg", "MgO", 1), ("Mn", "MnO", 1), ("Na", "Na2O", 2),
        ("P", "P2O5", 2), ("Pb", "PbO", 1), ("Sb", "Sb2O3", 2), ("Si", "SiO2", 1), ("Sn", "SnO2", 1), ("Sr", "SrO", 1),
        ("Ti", "TiO2", 1), ("Zn", "ZnO", 1),
    ];

    /// <summary>The composition in mass %; the family's usual one where no slag constituent is charged.</summary>
    public static SlagComposition Of(ChargeAccount account, SlagFamily family, ThermochemicalCatalogue catalogue)
    {
        var mass = new Dictionary<string, double>(StringComparer.Ordinal);
        foreach (var (element, oxide, atoms) in WholeOxides)
        {
            Add(oxide, account.SlagCharge[element] / atoms);
        }

        Add("FeO", account.SlagCharge["Fe"] - account.FerricIron);
        Add("Fe2O3", account.FerricIron / 2);
        var total = mass.Values.Sum();
        return total > 0
            ? new SlagComposition(mass.ToDictionary(m => m.Key, m => 100 * m.Value / total, StringComparer.Ordinal), false)
            : SlagComposition.Typical(family);

        void Add(string oxide, double mol)
        {
            if (mol > 0)
            {
                mass[oxide] = mol * ChemicalFormula.Parse(oxide).MolarMass(catalogue.Elements);
            }
        }
    }
}
