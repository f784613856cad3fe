using PartitionService.PublishedChecks.Cases;
using PartitionService.PublishedChecks.Rows;

namespace PartitionService.PublishedChecks.Recipes;

/// <summary>Distribution between metal and slag.</summary>
/// <param name="furnace">Solves vessels.</param>
internal sealed class PartitionRecipes(Furnace furnace)
{
    /// <summary>Recipes by name.</summary>
    public IReadOnlyDictionary<string, Recipe> All => new Dictionary<string, Recipe>(StringComparer.Ordinal)
    {
        ["ratio-slag-to-metal"] = row => Each(row, (setup, element) => Ratio(setup, element)),
        ["ratio-metal-to-slag"] = row => Each(row, (setup, element) => 1 / Ratio(setup, element)),
        ["assay-ratio-metal-to-slag"] = row => Each(row, AssayRatio),
        ["mole-ratio-metal-to-slag"] = row => Each(row, MoleRatio),
        ["order-slag-to-metal"] = row => Each(row, (setup, element) => Order(setup, element, row.CompareElement)),
        ["order-metal-to-slag"] = row => Each(row, (setup, element) => 1 / Order(setup, element, row.CompareElement)),
        ["trend-slag-to-metal"] = row =>
            Each(row, (setup, element) => Math.Log10(Ratio(setup.After(), element) / Ratio(setup, element))),
        ["slope-slag-to-metal"] = row => Each(row, Slope),
        ["ratio-after-dilution"] = row => Each(row, (setup, element) => Ratio(setup.After(), element) / Ratio(setup, element)),
        ["family-ratio-slag-to-metal"] = row =>
            Each(row, (setup, element) => Ratio(setup, element) / Ratio(setup.After(), element)),
        ["tin-iron-quotient"] = row => [TinIronQuotient(row)],
    };

    private static IReadOnlyList<double> Each(PublishedRow row, Func<Setup, string, double> figure) =>
        [.. row.Setup.Combinations().SelectMany(setup => row.Elements.Select(element => figure(setup, element)))];

    private double Ratio(Setup setup, string element) => furnace.Solve(setup, element).Ratio(element);

    /// <summary>Contents of the phases as they leave, droplets included, as a plant assays them.</summary>
    private double AssayRatio(Setup setup, string element)
    {
        var content = furnace.Solve(setup, element).Of(element);
        return content.MetalMassPpm!.Value / content.SlagMassPpm!.Value;
    }

    private double MoleRatio(Setup setup, string element)
    {
        var answer = furnace.Solve(setup, element);
        return Answer.MoleFraction(answer.Metal!, element) / Answer.MoleFraction(answer.Slag!, element);
    }

    private double Order(Setup setup, string first, string second)
    {
        var answer = furnace.Solve(setup, first, second);
        return answer.Ratio(first) / answer.Ratio(second);
    }

    /// <summary>d log10 L / d log10 pO2 between the two stated pressures.</summary>
    private double Slope(Setup setup, string element)
    {
        var before = furnace.Solve(setup, element);
        var after = furnace.Solve(setup.After(), element);
        return Math.Log10(after.Ratio(element) / before.Ratio(element))
            / (after.Redox.Log10OxygenPressureAtm!.Value - before.Redox.Log10OxygenPressureAtm!.Value);
    }

    /// <summary>([%Sn]/[%Fe]) metal times ((%Fe)/(%Sn)) slag at the oxygen potential that leaves the stated iron in the tin.</summary>
    private double TinIronQuotient(PublishedRow row)
    {
        double low = -20, high = -6;
        for (var step = 0; step < 40; step++)
        {
            var middle = 0.5 * (low + high);
            var setup = row.Setup.With("oxygen", string.Create(System.Globalization.CultureInfo.InvariantCulture, $"log:{middle}"));
            var answer = furnace.Solve(setup);
            if (answer.Metal is { } metal && answer.Of("Fe").MetalMassPpm / 1e4 > row.Setup.Number("iron_mass_percent_in_metal"))
            {
                low = middle;
            }
            else
            {
                high = middle;
            }
        }

        var final = furnace.Solve(row.Setup.With("oxygen", string.Create(System.Globalization.CultureInfo.InvariantCulture, $"log:{low}")));
        return final.Ratio("Fe") / final.Ratio("Sn");
    }
}
