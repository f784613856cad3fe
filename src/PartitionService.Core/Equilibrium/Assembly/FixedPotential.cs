namespace PartitionService.Core.Equilibrium.Assembly;

/// <summary>An oxygen potential that a statement fixes, with what it depends on.</summary>
/// <param name="HalfLnPressure">1/2 ln pO2, pO2 in atm.</param>
/// <param name="PerKelvin">Derivative with respect to temperature, per kelvin.</param>
/// <param name="PerDatum">Derivative with respect to each Gibbs energy that entered, mol/J.</param>
internal sealed record FixedPotential(
    double HalfLnPressure, double PerKelvin, IReadOnlyList<(string Slot, double PerJoulePerMol)> PerDatum);
