using PartitionService.Core.Catalogue;

namespace PartitionService.Core.Thermodynamics;

/// <summary>Derivatives of a slag's composition variables with respect to the mass % of each whole oxide, each taken on its own.</summary>
internal static class SlagCompositionGradient
{
    /// <summary>Gradient of <see cref="SlagComposition.Variable"/>, per mass %; empty where the variable is not defined.</summary>
    public static Dictionary<string, double> Variable(
        SlagComposition slag, SlagVariable variable, IReadOnlyDictionary<string, Element> elements)
    {
        var gradient = new Dictionary<string, double>(StringComparer.Ordinal);
        if (slag.Variable(variable, elements) is not { } value)
        {
            return gradient;
        }

        switch (variable)
        {
            case SlagVariable.CaOMassPercent:
                gradient["CaO"] = 1;
                break;
            case SlagVariable.CaOToSiO2MassRatio:
                gradient["CaO"] = 1 / slag["SiO2"];
                gradient["SiO2"] = -value / slag["SiO2"];
                break;
            case SlagVariable.IronToSiO2MassRatio:
                foreach (var (oxide, share) in IronShares(elements))
                {
                    gradient[oxide] = share / slag["SiO2"];
                }

                gradient["SiO2"] = -value / slag["SiO2"];
                break;
            case SlagVariable.PhosphorusBasicitySum:
                AddBasicitySum(gradient, slag, value, elements);
                break;
        }

        return gradient;
    }

    /// <summary>Gradient of <see cref="SlagComposition.OpticalBasicity"/>, per mass %; empty where it is not defined.</summary>
    public static Dictionary<string, double> OpticalBasicity(SlagComposition slag, ThermochemicalCatalogue catalogue)
    {
        var gradient = new Dictionary<string, double>(StringComparer.Ordinal);
        if (slag.OpticalBasicity(catalogue) is not { } value)
        {
            return gradient;
        }

        var below = 0.0;
        foreach (var (oxide, massPercent) in slag.MassPercent)
        {
            var row = catalogue.Slot<OpticalBasicityDatum>($"optical-basicity/{oxide}").FirstOrDefault(r => r.Preferred);
            if (row is null || !ChemicalFormula.TryParse(oxide, out var formula, out _))
            {
                continue;
            }

            var anions = formula.Atoms.GetValueOrDefault("O") + (0.5 * formula.Atoms.GetValueOrDefault("F"));
            var weight = anions / formula.MolarMass(catalogue.Elements);
            gradient[oxide] = (row.OpticalBasicity - value) * weight;
            below += weight * massPercent;
        }

        foreach (var oxide in gradient.Keys.ToArray())
        {
            gradient[oxide] /= below;
        }

        return gradient;
    }

    /// <summary>Gradient of <see cref="SlagComposition.MonoCationMolPer100Gram"/>, mol per mass %.</summary>
    public static Dictionary<string, double> MonoCations(SlagComposition slag, IReadOnlyDictionary<string, Element> elements)
    {
        var gradient = new Dictionary<string, double>(StringComparer.Ordinal);
        foreach (var oxide in slag.MassPercent.Keys)
        {
            if (ChemicalFormula.TryParse(oxide, out var formula, out _))
            {
                gradient[oxide] = formula.Atoms.Where(atom => atom.Key != "O").Sum(atom => atom.Value) / formula.MolarMass(elements);
            }
        }

        return gradient;
    }

    /// <summary>Mass of iron per mass of each iron oxide.</summary>
    public static (string Oxide, double Share)[] IronShares(IReadOnlyDictionary<string, Element> elements)
    {
        var iron = elements["Fe"].AtomicMassGramPerMol;
        var oxygen = elements["O"].AtomicMassGramPerMol;
        return [("FeO", iron / (iron + oxygen)), ("Fe2O3", 2 * iron / ((2 * iron) + (3 * oxygen)))];
    }

    private static void AddBasicitySum(
        Dictionary<string, double> gradient, SlagComposition slag, double value, IReadOnlyDictionary<string, Element> elements)
    {
        var moles = 0.0;
        foreach (var (oxide, massPercent) in slag.MassPercent)
        {
            if (ChemicalFormula.TryParse(oxide, out var formula, out _))
            {
                var perMass = 1 / formula.MolarMass(elements);
                moles += massPercent * perMass;
                gradient[oxide] = (SlagComposition.BasicityWeight(oxide) - value) * perMass;
            }
        }

        foreach (var oxide in gradient.Keys.ToArray())
        {
            gradient[oxide] /= moles;
        }
    }
}
