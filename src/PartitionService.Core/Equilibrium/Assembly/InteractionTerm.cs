namespace PartitionService.Core.Equilibrium.Assembly;

/// <summary>An interaction parameter at the temperature of the case.</summary>
/// <param name="Slot">Slot of the datum.</param>
/// <param name="Epsilon">Value on mole fractions and natural logarithm.</param>
/// <param name="PerKelvin">Derivative with respect to temperature, per kelvin; zero for an overridden number.</param>
internal sealed record InteractionTerm(string Slot, double Epsilon, double PerKelvin);
