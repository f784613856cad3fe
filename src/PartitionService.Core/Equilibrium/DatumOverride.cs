namespace PartitionService.Core.Equilibrium;

/// <summary>A number that replaces the catalogue's in one case.</summary>
/// <param name="Slot">Slot of the datum, for example <c>metal/Cu/Pb</c>.</param>
/// <param name="Kind">What <paramref name="Value"/> is; must fit the kind of slot.</param>
/// <param name="Value">The number at the temperature of the case.</param>
/// <param name="Source">Where the number comes from, in the caller's words.</param>
public sealed record DatumOverride(string Slot, OverrideKind Kind, double Value, string Source = "caller");

/// <summary>What the number of an override is.</summary>
public enum OverrideKind
{
    /// <summary>ln gamma, or ln(K/gamma) where the catalogue row is one; for metal/ and slag/ slots; in [-60, 60].</summary>
    LnGamma,

    /// <summary>Gibbs energy in J/mol from the liquid metal; for oxidation/, chloride/ and gas/ slots; in [-5e6, 5e6].</summary>
    GibbsEnergy,

    /// <summary>Interaction parameter epsilon on mole fractions, natural logarithm; for interaction/ slots; in [-1e6, 1e6].</summary>
    Epsilon,

    /// <summary>No number was stated; always a violation.</summary>
    Unstated,
}
