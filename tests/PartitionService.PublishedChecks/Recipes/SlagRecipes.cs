using PartitionService.Core.Thermodynamics;
using PartitionService.PublishedChecks.Cases;
using PartitionService.PublishedChecks.Rows;

namespace PartitionService.PublishedChecks.Recipes;

/// <summary>Quantities of a slag alone.</summary>
/// <param name="furnace">Solves vessels.</param>
internal sealed class SlagRecipes(Furnace furnace)
{
    /// <summary>Recipes by name.</summary>
    public IReadOnlyDictionary<string, Recipe> All => new Dictionary<string, Recipe>(StringComparer.Ordinal)
    {
        ["oxide-activity-coefficient"] = row => [.. row.Setup.Combinations().Select(setup => Coefficient(row, setup))],
        ["oxide-activity-coefficient-ratio"] = row => [Coefficient(row, row.Setup) / Coefficient(row, Typical(row.Setup.After()))],
        ["trend-oxide-activity-coefficient"] = row =>
            [Math.Log10(Coefficient(row, row.Setup.After()) / Coefficient(row, row.Setup))],
        ["optical-basicity"] = row => [OpticalBasicity(row.Setup)],
        ["sulfide-capacity"] = row =>
            [SulfideCapacity.Log10(OpticalBasicity(row.Setup), row.Setup.Number("temperature_kelvin"))],
    };

    private double Coefficient(PublishedRow row, Setup setup) =>
        Answer.Species(furnace.Solve(setup, row.Element).Slag!, setup["oxide"]).ActivityCoefficient!.Value;

    /// <summary>The other family at its usual composition.</summary>
    private Setup Typical(Setup setup) => setup.With(
        "slag",
        string.Join(',', furnace.Catalogue.SlagFamilies[setup["family"]].Components
            .Select(component => string.Create(
                System.Globalization.CultureInfo.InvariantCulture, $"{component.Formula}:{component.TypicalMassPercent}"))));

    private double OpticalBasicity(Setup setup) =>
        new SlagComposition(
            setup.Amounts("slag").ToDictionary(part => part.Formula, part => part.Amount, StringComparer.Ordinal), false)
        .OpticalBasicity(furnace.Catalogue)!.Value;
}
