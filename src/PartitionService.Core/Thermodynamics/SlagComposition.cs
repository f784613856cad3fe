using PartitionService.Core.Catalogue;

namespace PartitionService.Core.Thermodynamics;

/// <summary>Composition of a slag as whole oxides in mass %, with the variables that activity coefficients depend on.</summary>
/// <param name="MassPercent">Mass % by whole oxide, for example SiO2.</param>
/// <param name="IsTypical">True where the family's usual composition stands in for one that was not given.</param>
public sealed record SlagComposition(IReadOnlyDictionary<string, double> MassPercent, bool IsTypical)
{
    /// <summary>The usual composition of a family.</summary>
    public static SlagComposition Typical(SlagFamily family) =>
        new(family.Components.ToDictionary(c => c.Formula, c => c.TypicalMassPercent, StringComparer.Ordinal), true);

    /// <summary>Mass % of one oxide, zero where absent.</summary>
    public double this[string oxide] => MassPercent.GetValueOrDefault(oxide);

    /// <summary>Value of a composition variable; null where its denominator is absent.</summary>
    /// <param name="variable">The variable.</param>
    /// <param name="elements">Atomic masses.</param>
    public double? Variable(SlagVariable variable, IReadOnlyDictionary<string, Element> elements)
    {
        switch (variable)
        {
            case SlagVariable.CaOMassPercent:
                return this["CaO"];
            case SlagVariable.CaOToSiO2MassRatio:
                return this["SiO2"] > 0 ? this["CaO"] / this["SiO2"] : null;
            case SlagVariable.IronToSiO2MassRatio:
                var iron = elements["Fe"].AtomicMassGramPerMol;
                var oxygen = elements["O"].AtomicMassGramPerMol;
                var total = (this["FeO"] * iron / (iron + oxygen)) + (this["Fe2O3"] * 2 * iron / ((2 * iron) + (3 * oxygen)));
                return this["SiO2"] > 0 ? total / this["SiO2"] : null;
            case SlagVariable.PhosphorusBasicitySum:
                return BasicitySum(elements);
            default:
                return null;
        }
    }

    /// <summary>Optical basicity by the mixing rule of Duffy and Ingram: sum(x n Lambda)/sum(x n), n oxygens per formula.</summary>
    /// <param name="catalogue">Optical basicities of the preferred (Mills) set.</param>
    /// <returns>Optical basicity; null where no oxide of the composition has one.</returns>
    /// <remarks>Example: the ladle slag of the catalogue's worked example gives 0.7723.</remarks>
    public double? OpticalBasicity(ThermochemicalCatalogue catalogue)
    {
        double above = 0, below = 0;
        foreach (var (oxide, massPercent) in MassPercent)
        {
            var row = catalogue.Slot<OpticalBasicityDatum>($"optical-basicity/{oxide}").FirstOrDefault(r => r.Preferred);
            if (row is null || !(massPercent > 0) || OxideFormulas.Get(oxide) is not { } formula)
            {
                continue;
            }

            // CaF2 counts its two fluorines like one oxygen (the charge of the anions).
            var anions = formula.Atoms.GetValueOrDefault("O") + (0.5 * formula.Atoms.GetValueOrDefault("F"));
            var weight = massPercent / formula.MolarMass(catalogue.Elements) * anions;
            above += weight * row.OpticalBasicity;
            below += weight;
        }

        return below > 0 ? above / below : null;
    }

    /// <summary>Mol of mono-cations in 100 g of slag.</summary>
    public double MonoCationMolPer100Gram(IReadOnlyDictionary<string, Element> elements)
    {
        var sum = 0.0;
        foreach (var (oxide, massPercent) in MassPercent)
        {
            if (OxideFormulas.Get(oxide) is { } formula)
            {
                sum += massPercent / formula.MolarMass(elements)
                    * formula.Atoms.Where(atom => atom.Key is not ("O" or "F" or "Cl" or "Br" or "I")).Sum(atom => atom.Value);
            }
        }

        return sum;
    }

    /// <summary>Weight of an oxide in the basicity sum for phosphorus (Turkdogan and Pearson 1953); zero for those that are not in it.</summary>
    internal static double BasicityWeight(string oxide) =>
        oxide switch { "CaO" => 22, "MgO" => 15, "MnO" => 13, "FeO" => 12, "SiO2" => -2, _ => 0 };

    private double? BasicitySum(IReadOnlyDictionary<string, Element> elements)
    {
        double moles = 0, sum = 0;
        foreach (var (oxide, massPercent) in MassPercent)
        {
            if (!(massPercent > 0) || OxideFormulas.Get(oxide) is not { } formula)
            {
                continue;
            }

            var amount = massPercent / formula.MolarMass(elements);
            moles += amount;
            sum += amount * BasicityWeight(oxide);
        }

        return moles > 0 ? sum / moles : null;
    }
}
