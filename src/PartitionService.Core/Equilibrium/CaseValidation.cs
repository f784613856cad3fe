using System.Globalization;
using PartitionService.Core.Catalogue;
using PartitionService.Core.Equilibrium.Charging;
using PartitionService.Core.Thermodynamics;

namespace PartitionService.Core.Equilibrium;

/// <summary>Finds everything that is wrong with a case before it is solved.</summary>
public static class CaseValidation
{
    /// <summary>Validates a case against a catalogue.</summary>
    /// <param name="vesselCase">The case.</param>
    /// <param name="catalogue">Known elements, solvents, slag families and data.</param>
    /// <returns>All violations in the order of the fields; empty where the case is valid.</returns>
    public static IReadOnlyList<CaseViolation> Validate(VesselCase vesselCase, ThermochemicalCatalogue catalogue)
    {
        var check = new ViolationList();
        check.Length("name", vesselCase.Name, CaseLimits.NameLength);
        check.Range(
            "temperature_kelvin",
            vesselCase.TemperatureKelvin,
            PhysicalConstants.MinimumTemperatureKelvin,
            PhysicalConstants.MaximumTemperatureKelvin);
        check.Range("pressure_atm", vesselCase.PressureAtm, CaseLimits.MinimumPressureAtm, CaseLimits.MaximumPressureAtm);
        ValidateCharge(check, vesselCase.Charge, catalogue);
        if (vesselCase.Solvent is { } solvent && !catalogue.Solvents.Contains(solvent))
        {
            check.Add("metal.solvent", solvent, $"must be one of {string.Join(", ", catalogue.Solvents)}, or unset");
        }

        if (vesselCase.SlagFamily is { } family && !catalogue.SlagFamilies.ContainsKey(family))
        {
            check.Add("slag.family", family, $"must be one of {string.Join(", ", catalogue.SlagFamilies.Keys)}");
        }

        ValidateOxygen(check, vesselCase.Oxygen, catalogue);
        ValidateAllowances(check, vesselCase, catalogue);
        OverrideValidation.Validate(check, vesselCase.Overrides, catalogue);
        return check.Violations;
    }

    private static void ValidateCharge(ViolationList check, IReadOnlyList<ChargeItem> charge, ThermochemicalCatalogue catalogue)
    {
        if (charge.Count is 0 or > CaseLimits.ChargeItems)
        {
            check.Add("charge", ViolationList.Text(charge.Count), $"must hold 1 to {CaseLimits.ChargeItems} items");
        }

        var total = 0.0;
        for (var index = 0; index < charge.Count && index < CaseLimits.ChargeItems; index++)
        {
            var item = charge[index];
            var path = $"charge[{index.ToString(CultureInfo.InvariantCulture)}]";
            var known = ChargeReader.TryResolve(item.Formula, catalogue.Elements, out _, out var problem);
            if (!known)
            {
                check.Add($"{path}.formula", item.Formula.Length > 120 ? item.Formula[..120] : item.Formula, problem);
            }

            switch (item.Unit)
            {
                case ChargeUnit.Kilogram:
                    check.Quantity($"{path}.mass_kg", item.Quantity);
                    break;
                case ChargeUnit.NormalCubicMetre:
                    check.Quantity($"{path}.volume_normal_cubic_metre", item.Quantity);
                    if (known && !GasFormulas.Contains(item.Formula))
                    {
                        check.Add(
                            $"{path}.volume_normal_cubic_metre",
                            ViolationList.Text(item.Quantity),
                            $"is only for gases ({GasFormulas.Listing}); give {item.Formula} in mass_kg");
                    }

                    break;
                default:
                    check.Add(path, "", "needs mass_kg or volume_normal_cubic_metre");
                    break;
            }

            total += item.Quantity;
        }

        if (charge.Count > 0 && total == 0)
        {
            check.Add("charge", "0", "must hold at least one quantity above 0");
        }
    }

    private static void ValidateOxygen(ViolationList check, OxygenStatement oxygen, ThermochemicalCatalogue catalogue)
    {
        switch (oxygen)
        {
            case OxygenStatement.Pressure statement:
                check.Range("oxygen.log10_po2_atm", statement.Log10PressureAtm, -40, 2);
                break;
            case OxygenStatement.CarbonDioxideToMonoxide statement:
                check.Range("oxygen.co2_to_co_ratio", statement.Ratio, 1e-12, 1e12);
                break;
            case OxygenStatement.WaterToHydrogen statement:
                check.Range("oxygen.h2o_to_h2_ratio", statement.Ratio, 1e-12, 1e12);
                break;
            case OxygenStatement.Dissolved statement:
                check.Range("oxygen.dissolved_oxygen_mass_ppm", statement.MassPpm, 1e-6, 50000);
                break;
            case OxygenStatement.MetalOxidePair statement:
                if (MetalOxide.Resolve(statement.Oxide, catalogue) is null)
                {
                    check.Add(
                        "oxygen.metal_oxide_pair.oxide", statement.Oxide, "must be an oxide of one metal that the catalogue has, such as FeO or Cu2O");
                }

                check.Range("oxygen.metal_oxide_pair.oxide_activity", statement.OxideActivity, 1e-12, 1);
                check.Range("oxygen.metal_oxide_pair.metal_activity", statement.MetalActivity, 1e-12, 1);
                break;
            case OxygenStatement.Closed:
                break;
            default:
                check.Add(
                    "oxygen",
                    "",
                    "needs exactly one of log10_po2_atm, co2_to_co_ratio, h2o_to_h2_ratio, metal_oxide_pair, dissolved_oxygen_mass_ppm, closed_balance");
                break;
        }
    }

    private static void ValidateAllowances(ViolationList check, VesselCase vesselCase, ThermochemicalCatalogue catalogue)
    {
        var allowances = vesselCase.Allowances;
        check.Range("allowances.metal_in_slag.mass_percent", allowances.MetalInSlagMassPercent, 0, 90);
        check.Range("allowances.slag_in_metal_mass_percent", allowances.SlagInMetalMassPercent, 0, 50);
        check.Range("allowances.mechanical_dust_mass_fraction", allowances.MechanicalDustMassFraction, 0, 0.5);
        if (allowances.MetalInSlagTypical
            && (vesselCase.SlagFamily is null
                || (catalogue.SlagFamilies.TryGetValue(vesselCase.SlagFamily, out var family)
                    && family.TypicalEntrainedMetalMassPercent is null)))
        {
            check.Add(
                "allowances.metal_in_slag.family_typical",
                "true",
                vesselCase.SlagFamily is null
                    ? "needs a slag family"
                    : $"has no value for {vesselCase.SlagFamily} in the catalogue; give mass_percent");
        }

        var efficiencies = allowances.StageEfficiencies;
        if (efficiencies.Count > CaseLimits.StageEfficiencies)
        {
            check.Add(
                "allowances.stage_efficiencies",
                ViolationList.Text(efficiencies.Count),
                $"must hold at most {CaseLimits.StageEfficiencies} entries");
        }

        var seen = new HashSet<string>(StringComparer.Ordinal);
        for (var index = 0; index < efficiencies.Count && index < CaseLimits.StageEfficiencies; index++)
        {
            var path = $"allowances.stage_efficiencies[{index.ToString(CultureInfo.InvariantCulture)}]";
            var element = efficiencies[index].Element;
            if (!catalogue.Elements.ContainsKey(element) || element == "O")
            {
                check.Add(
                    $"{path}.element",
                    element,
                    element == "O" ? "must not be O: oxygen follows the other elements" : "must be the symbol of an element that the catalogue knows");
            }
            else if (!seen.Add(element))
            {
                check.Add($"{path}.element", element, "must not stand twice");
            }

            check.Range($"{path}.efficiency", efficiencies[index].Efficiency, 0, 1);
        }
    }
}
