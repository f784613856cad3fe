using System.Globalization;
using PartitionService.Core.Catalogue;

namespace PartitionService.Core.Equilibrium;

/// <summary>Finds everything that is wrong with the overrides of a case.</summary>
internal static class OverrideValidation
{
    /// <summary>Adds the violations of all overrides.</summary>
    public static void Validate(ViolationList check, IReadOnlyList<DatumOverride> overrides, ThermochemicalCatalogue catalogue)
    {
        if (overrides.Count > CaseLimits.Overrides)
        {
            check.Add("overrides", ViolationList.Text(overrides.Count), $"must hold at most {CaseLimits.Overrides} entries");
        }

        var seen = new HashSet<string>(StringComparer.Ordinal);
        for (var index = 0; index < overrides.Count && index < CaseLimits.Overrides; index++)
        {
            var path = $"overrides[{index.ToString(CultureInfo.InvariantCulture)}]";
            var item = overrides[index];
            check.Length($"{path}.slot", item.Slot, CaseLimits.SlotLength);
            check.Length($"{path}.source", item.Source, CaseLimits.SourceLength);
            if (item.Slot.Length <= CaseLimits.SlotLength)
            {
                ValidateSlot(check, path, item, catalogue);
                if (!seen.Add(item.Slot))
                {
                    check.Add($"{path}.slot", item.Slot, "must not stand twice");
                }
            }
        }
    }

    private static void ValidateSlot(ViolationList check, string path, DatumOverride item, ThermochemicalCatalogue catalogue)
    {
        var parts = item.Slot.Split('/');
        var kind = parts[0] switch
        {
            "metal" or "slag" => OverrideKind.LnGamma,
            "oxidation" or "chloride" or "gas" => OverrideKind.GibbsEnergy,
            "interaction" => OverrideKind.Epsilon,
            _ => OverrideKind.Unstated,
        };
        if (kind == OverrideKind.Unstated)
        {
            check.Add($"{path}.slot", item.Slot, "must start with metal/, slag/, oxidation/, chloride/, gas/ or interaction/");
            return;
        }

        if (!IsKnown(parts, item.Slot, catalogue))
        {
            check.Add($"{path}.slot", item.Slot, "must be a slot of the catalogue, or a metal/ or interaction/ slot of known solvent and elements in ordinal order");
        }

        if (item.Kind != kind)
        {
            check.Add(path, FieldOf(item.Kind), $"needs {FieldOf(kind)} for slot {item.Slot}");
            return;
        }

        switch (kind)
        {
            case OverrideKind.LnGamma:
                check.Range($"{path}.ln_gamma", item.Value, -60, 60);
                break;
            case OverrideKind.Epsilon:
                check.Range($"{path}.epsilon", item.Value, -1e6, 1e6);
                break;
            default:
                check.Range($"{path}.gibbs_energy_joule_per_mol", item.Value, -5e6, 5e6);
                break;
        }
    }

    /// <summary>Name of the field of a request; empty where none was sent.</summary>
    private static string FieldOf(OverrideKind kind) => kind switch
    {
        OverrideKind.LnGamma => "ln_gamma",
        OverrideKind.Epsilon => "epsilon",
        OverrideKind.GibbsEnergy => "gibbs_energy_joule_per_mol",
        _ => "",
    };

    private static bool IsKnown(string[] parts, string slot, ThermochemicalCatalogue catalogue)
    {
        if (catalogue.Slot(slot).Any(row => row.Preferred))
        {
            return true;
        }

        bool Element(string symbol) => catalogue.Elements.ContainsKey(symbol);
        return parts switch
        {
            ["metal", var solvent, var solute] => catalogue.Solvents.Contains(solvent) && Element(solute) && solute != solvent,
            ["interaction", var solvent, var first, var second] =>
                catalogue.Solvents.Contains(solvent) && Element(first) && Element(second) && string.CompareOrdinal(first, second) <= 0,
            ["slag", var family, var oxide] =>
                catalogue.SlagFamilies.ContainsKey(family) && catalogue.Slot($"oxidation/{oxide}").Any(row => row.Preferred),
            _ => false,
        };
    }
}
