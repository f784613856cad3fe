using PartitionService.Core.Catalogue;
using PartitionService.Core.Thermodynamics;

namespace PartitionService.Core.Equilibrium.Assembly;

/// <summary>Slag compositions as whole oxides in mass %, from amounts of elements.</summary>
internal static class WholeOxides
{
    private static readonly Dictionary<string, (string Oxide, double Atoms)> ByElement = new(StringComparer.Ordinal)
    {
        ["Al"] = ("Al2O3", 2),
        ["As"] = ("As2O3", 2),
        ["B"] = ("B2O3", 2),
        ["Ba"] = ("BaO", 1),
        ["Bi"] = ("Bi2O3", 2),
        ["Ca"] = ("CaO", 1),
        ["Cr"] = ("Cr2O3", 2),
        ["Cu"] = ("Cu2O", 2),
        ["Fe"] = ("FeO", 1),
        ["K"] = ("K2O", 2),
        ["Li"] = ("Li2O", 2),
        ["Mg"] = ("MgO", 1),
        ["Mn"] = ("MnO", 1),
        ["Na"] = ("Na2O", 2),
        ["Ni"] = ("NiO", 1),
        ["P"] = ("P2O5", 2),
        ["Pb"] = ("PbO", 1),
        ["Sb"] = ("Sb2O3", 2),
        ["Si"] = ("SiO2", 1),
        ["Sn"] = ("SnO2", 1),
        ["Sr"] = ("SrO", 1),
        ["Ti"] = ("TiO2", 1),
        ["Zn"] = ("ZnO", 1),
    };

    /// <summary>Composition of amounts in mol; null where none of the elements has a whole oxide here.</summary>
    /// <param name="amounts">Element and amount; ferric iron as "FeO1.5".</param>
    /// <param name="elements">Atomic masses.</param>
    public static SlagComposition? Composition(
        IEnumerable<(string Element, double Mol)> amounts, IReadOnlyDictionary<string, Element> elements)
    {
        var mass = new Dictionary<string, double>(StringComparer.Ordinal);
        var total = 0.0;
        foreach (var (element, mol) in amounts)
        {
            var (oxide, atoms) = element == "FeO1.5" ? ("Fe2O3", 2) : ByElement.GetValueOrDefault(element);
            if (oxide is null || !(mol > 0))
            {
                continue;
            }

            var kilogram = mol / atoms * MolarMass(oxide, elements);
            mass[oxide] = mass.GetValueOrDefault(oxide) + kilogram;
            total += kilogram;
        }

        return total > 0
            ? new SlagComposition(mass.ToDictionary(m => m.Key, m => 100 * m.Value / total, StringComparer.Ordinal), false)
            : null;
    }

    /// <summary>Composition of the charged slag constituents; null where none is charged.</summary>
    public static SlagComposition? OfCharge(ChargeAccount account, IReadOnlyDictionary<string, Element> elements) =>
        Composition(
            account.SlagCharge.Elements
                .Select(e => (e, account.SlagCharge[e] - (e == "Fe" ? account.FerricIron : 0)))
                .Append(("FeO1.5", account.FerricIron)),
            elements);

    private static double MolarMass(string oxide, IReadOnlyDictionary<string, Element> elements) =>
        ChemicalFormula.Parse(oxide).MolarMass(elements);
}
