using PartitionService.PublishedChecks.Cases;
using PartitionService.PublishedChecks.Rows;

namespace PartitionService.PublishedChecks.Recipes;

/// <summary>Percent of an element to metal, slag and gas against published ranges.</summary>
/// <param name="furnace">Solves vessels.</param>
internal sealed class DeportmentRecipe(Furnace furnace)
{
    /// <summary>One phase of a row.</summary>
    /// <param name="Phase">metal, slag or gas.</param>
    /// <param name="Percent">Computed percent of the element's input.</param>
    /// <param name="Low">Lower end of the published range; null where none is stated.</param>
    /// <param name="High">Upper end of the published range; null where none is stated.</param>
    internal sealed record Share(string Phase, double Percent, double? Low, double? High)
    {
        /// <summary>Percentage points outside the range; zero inside, or where no range is stated.</summary>
        public double Outside => Math.Max(0, Math.Max((Low ?? Percent) - Percent, Percent - (High ?? Percent)));

        /// <summary>Nearest point of the range.</summary>
        public double Nearest => Percent + (Percent < Low ? Outside : -Outside);
    }

    /// <summary>Computes the three shares.</summary>
    public IReadOnlyList<Share> Compute(PublishedRow row)
    {
        var element = furnace.Solve(row.Setup, row.Element).Of(row.Element);
        return
        [
            One("metal", element.MetalFraction),
            One("slag", element.SlagFraction),
            One("gas", element.GasFraction),
        ];

        Share One(string phase, double fraction) =>
            new(phase, 100 * fraction, row.Number($"{phase}_low_percent"), row.Number($"{phase}_high_percent"));
    }
}
