namespace PartitionService.Core.Catalogue;

/// <summary>Activity coefficient of a solute at infinite dilution in a liquid metal, ln gamma0 = a + b/T.</summary>
/// <remarks>
/// Slot: <c>metal/{solvent}/{solute}</c>. Natural logarithm, mole fraction basis, activity referred to
/// <see cref="SoluteState"/>. For O, S, H, N the state is half a mole of the diatomic gas, for C graphite.
/// </remarks>
public sealed record InfiniteDilutionDatum : Datum
{
    /// <summary>Solvent metal, for example <c>Cu</c>.</summary>
    public required string Solvent { get; init; }

    /// <summary>Dissolved element, for example <c>Pb</c>.</summary>
    public required string Solute { get; init; }

    /// <summary>Pure substance that has activity 1.</summary>
    public required StandardState SoluteState { get; init; }

    /// <summary>Constant term a, dimensionless.</summary>
    public required double Constant { get; init; }

    /// <summary>Coefficient b of 1/T in kelvin.</summary>
    public required double InverseTemperatureKelvin { get; init; }

    /// <summary>One standard deviation of ln gamma0.</summary>
    public required double SigmaLnGamma { get; init; }

    /// <summary>Largest mole fraction for which Henry's law was found to hold; null where the source gives none.</summary>
    public double? HenrianLimitMoleFraction { get; init; }

    /// <summary>ln gamma0 at a temperature in kelvin, extrapolating outside the range.</summary>
    public double LnGamma(double temperatureKelvin) => Constant + (InverseTemperatureKelvin / temperatureKelvin);

    /// <summary>Derivative of <see cref="LnGamma"/> with respect to temperature, -b/T^2, per kelvin.</summary>
    public double LnGammaPerKelvin(double temperatureKelvin) => -InverseTemperatureKelvin / (temperatureKelvin * temperatureKelvin);
}
