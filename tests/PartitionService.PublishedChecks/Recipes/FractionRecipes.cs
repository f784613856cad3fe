using PartitionService.PublishedChecks.Cases;
using PartitionService.PublishedChecks.Rows;

namespace PartitionService.PublishedChecks.Recipes;

/// <summary>Shares of an element and closure of balances.</summary>
/// <param name="furnace">Solves vessels.</param>
internal sealed class FractionRecipes(Furnace furnace)
{
    /// <summary>Recipes by name.</summary>
    public IReadOnlyDictionary<string, Recipe> All => new Dictionary<string, Recipe>(StringComparer.Ordinal)
    {
        ["fraction-to-metal"] = row => Each(row, setup => furnace.Solve(setup, row.Element).Of(row.Element).MetalFraction),
        ["fraction-to-slag"] = row => Each(row, setup => furnace.Solve(setup, row.Element).Of(row.Element).SlagFraction),
        ["fraction-to-gas"] = row => Each(row, setup => furnace.Solve(setup, row.Element).Of(row.Element).GasFraction),
        ["mass-percent-in-metal"] = row =>
            Each(row, setup => furnace.Solve(setup, row.Element).Of(row.Element).MetalMassPpm!.Value / 1e4),
        ["sum-of-fractions"] = _ => [.. Fractions().Select(shares => shares.Sum())],
        ["fraction-range"] = _ => [.. Fractions().SelectMany(shares => shares)],
    };

    private static IReadOnlyList<double> Each(PublishedRow row, Func<Setup, double> figure) =>
        [.. row.Setup.Combinations().Select(figure)];

    /// <summary>The shares of every element in every vessel that was solved before this row.</summary>
    private IEnumerable<double[]> Fractions() =>
        furnace.Answers.SelectMany(answer => answer.Elements).Select(element => new[]
        {
            element.MetalFraction,
            element.SlagFraction,
            element.GasFraction,
            element.MechanicalDustFraction,
            element.UnburntCarbonFraction,
            element.UnplacedFraction,
        });
}
