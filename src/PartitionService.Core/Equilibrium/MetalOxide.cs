using System.Globalization;
using PartitionService.Core.Catalogue;

namespace PartitionService.Core.Equilibrium;

/// <summary>An oxide of one metal, written per metal atom or as a whole oxide.</summary>
/// <param name="Element">The metal.</param>
/// <param name="OxygenPerMetal">Oxygen atoms per metal atom.</param>
/// <param name="Slot">Slot of its Gibbs energy of oxidation.</param>
internal sealed record MetalOxide(string Element, double OxygenPerMetal, string Slot)
{
    /// <summary>Resolves text such as <c>FeO</c>, <c>CuO0.5</c> or <c>Cu2O</c>.</summary>
    /// <returns>The oxide; null where it is none, or the catalogue has no preferred row for it.</returns>
    public static MetalOxide? Resolve(string text, ThermochemicalCatalogue catalogue)
    {
        if (!ChemicalFormula.TryParse(text, out var formula, out _) || formula.Atoms.Count != 2 || !formula.Atoms.ContainsKey("O"))
        {
            return null;
        }

        var (element, count) = formula.Atoms.First(atom => atom.Key != "O");
        var ratio = formula.Atoms["O"] / count;
        foreach (var row in catalogue.Data)
        {
            // Names round the ratio to four decimals (FeO1.3333), so Fe3O4 must find it.
            if (row is OxidationDatum { Preferred: true } oxidation
                && oxidation.Element == element
                && Math.Abs(oxidation.OxygenPerMetal - ratio) < 1e-3)
            {
                return new MetalOxide(element, oxidation.OxygenPerMetal, oxidation.Slot);
            }
        }

        return null;
    }

    /// <summary>Name of a mononuclear oxide, for example <c>CuO0.5</c>.</summary>
    public static string Name(string element, double oxygenPerMetal) =>
        oxygenPerMetal == 1 ? $"{element}O" : $"{element}O{oxygenPerMetal.ToString("0.####", CultureInfo.InvariantCulture)}";
}
