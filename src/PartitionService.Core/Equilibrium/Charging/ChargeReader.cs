using System.Diagnostics.CodeAnalysis;
using PartitionService.Core.Catalogue;
using PartitionService.Core.Thermodynamics;

namespace PartitionService.Core.Equilibrium.Charging;

/// <summary>Resolves charge items into atoms.</summary>
internal static class ChargeReader
{
    /// <summary>Resolves a formula or "air" into atoms per formula unit.</summary>
    /// <param name="text">The formula.</param>
    /// <param name="elements">Known elements.</param>
    /// <param name="atoms">Atoms per formula unit.</param>
    /// <param name="problem">What is wrong; empty where nothing is.</param>
    public static bool TryResolve(
        string text,
        IReadOnlyDictionary<string, Element> elements,
        [NotNullWhen(true)] out IReadOnlyDictionary<string, double>? atoms,
        out string problem)
    {
        atoms = null;
        problem = "";
        if (text == GasFormulas.Air)
        {
            atoms = GasFormulas.AirAtoms;
            return true;
        }

        if (!ChemicalFormula.TryParse(text, out var formula, out var error))
        {
            problem = $"must be a chemical formula such as Cu, PbO or Fe2SiO4, or \"air\" ({error})";
            return false;
        }

        foreach (var symbol in formula.Atoms.Keys)
        {
            if (!elements.ContainsKey(symbol))
            {
                problem = $"must hold only elements that the catalogue knows; {symbol} is none of them";
                return false;
            }
        }

        atoms = formula.Atoms;
        return true;
    }

    /// <summary>Resolves a valid item.</summary>
    public static ChargeConstituent Read(ChargeItem item, IReadOnlyDictionary<string, Element> elements)
    {
        if (!TryResolve(item.Formula, elements, out var perFormula, out var problem))
        {
            throw new ArgumentException(problem, nameof(item));
        }

        var molarMass = perFormula.Sum(atom => atom.Value * elements[atom.Key].AtomicMassGramPerMol);
        var moles = item.Unit == ChargeUnit.NormalCubicMetre
            ? item.Quantity / PhysicalConstants.NormalCubicMetrePerMol
            : item.Quantity * 1000 / molarMass;
        var atoms = perFormula.ToDictionary(atom => atom.Key, atom => atom.Value * moles, StringComparer.Ordinal);
        return new ChargeConstituent(item.Formula, Classify(item.Formula, perFormula), atoms, perFormula, moles * molarMass / 1000);
    }

    private static ChargeOrigin Classify(string formula, IReadOnlyDictionary<string, double> atoms)
    {
        if (GasFormulas.Contains(formula))
        {
            return ChargeOrigin.Gas;
        }

        if (atoms.Count == 1 && atoms.ContainsKey("C"))
        {
            return ChargeOrigin.Carbon;
        }

        var organic = atoms.ContainsKey("C") && atoms.ContainsKey("H")
            && atoms.Keys.All(e => e is "C" or "H" or "O" or "N" or "S" or "Cl" or "Br" or "F" or "P");
        if (organic || atoms.Keys.All(e => e is "H" or "N" or "Ar"))
        {
            return ChargeOrigin.Gas;
        }

        return atoms.Keys.Any(e => e is "O" or "F" or "Cl" or "Br" or "I") ? ChargeOrigin.Slag : ChargeOrigin.Metal;
    }
}
