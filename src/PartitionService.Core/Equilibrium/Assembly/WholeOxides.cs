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
            var (oxide, atoms) = Of(element);
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

    /// <summary>Whole oxide of an element and its atoms per formula; null where it has none here. Ferric iron as "FeO1.5".</summary>
    public static (string? Oxide, double Atoms) Of(string element) =>
        element == "FeO1.5" ? ("Fe2O3", 2) : ByElement.TryGetValue(element, out var found) ? found : (null, 0);

    /// <summary>Mass of whole oxide per mol of element, g/mol; zero where it has none here.</summary>
    public static double GramPerMol(string element, IReadOnlyDictionary<string, Element> elements) =>
        Of(element) is ({ } oxide, var atoms) ? MolarMass(oxide, elements) / atoms : 0;

    private static double MolarMass(string oxide, IReadOnlyDictionary<string, Element> elements) =>
        OxideFormulas.Get(oxide)!.MolarMass(elements);
}
