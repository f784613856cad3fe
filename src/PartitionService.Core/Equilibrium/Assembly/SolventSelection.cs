using PartitionService.Core.Catalogue;

namespace PartitionService.Core.Equilibrium.Assembly;

/// <summary>Finds the solvent of a metal bath.</summary>
internal static class SolventSelection
{
    /// <summary>The stated solvent, or the metallic element with the largest amount charged in metallic form.</summary>
    /// <param name="stated">Stated solvent; null to find it.</param>
    /// <param name="account">The charge.</param>
    /// <param name="catalogue">Known solvents.</param>
    /// <param name="failure">Why there is none; null on success.</param>
    public static string? Choose(string? stated, ChargeAccount account, ThermochemicalCatalogue catalogue, out SolveOutcome.Failed? failure)
    {
        failure = null;
        var known = string.Join(", ", catalogue.Solvents);
        if (stated is not null)
        {
            if (account.Reacting[stated] > 0)
            {
                return stated;
            }

            failure = new SolveOutcome.Failed(
                SolveFailure.NoSolvent, $"The stated solvent {stated} is not in the charge, or all of it bypasses the equilibrium.", [stated]);
            return null;
        }

        string? best = null;
        foreach (var element in account.Metallic.Elements)
        {
            if (account.Reacting[element] > 0 && (best is null || account.Metallic[element] > account.Metallic[best]))
            {
                best = element;
            }
        }

        if (best is not null && catalogue.Solvents.Contains(best))
        {
            return best;
        }

        failure = new SolveOutcome.Failed(
            SolveFailure.NoSolvent,
            best is null
                ? $"Nothing in the charge is metallic, so the solvent must be stated (metal.solvent), one of {known}."
                : $"The main metal of the charge, {best}, is no solvent that the catalogue knows; state one of {known} (metal.solvent).",
            best is null ? [] : [best]);
        return null;
    }
}
