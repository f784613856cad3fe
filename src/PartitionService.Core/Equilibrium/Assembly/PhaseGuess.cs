namespace PartitionService.Core.Equilibrium.Assembly;

/// <summary>Rough amounts of the phases for a cold start, from where the charge comes in.</summary>
internal static class PhaseGuess
{
    /// <summary>Amount in mol, positive.</summary>
    public static double Of(PhaseKind phase, ChargeAccount account)
    {
        var total = account.Reacting.Elements.Sum(e => account.Reacting[e]) + account.InertCations;
        var guess = phase switch
        {
            PhaseKind.Metal => account.Metallic.Elements.Sum(e => account.Metallic[e]),
            PhaseKind.Slag => account.InertCations + account.SlagCharge.Elements
                .Where(e => !LinkComponents.Contains(e) && e is not ("C" or "F")).Sum(e => account.SlagCharge[e]),
            PhaseKind.Gas => (0.5 * (account.Reacting["N"] + account.Reacting["H"] + account.Reacting["Cl"]))
                + account.Reacting["Ar"] + account.Reacting["C"],
            _ => account.Reacting["C"],
        };
        return Math.Max(guess, 1e-4 * total);
    }
}
