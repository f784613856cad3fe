namespace PartitionService.Core.Catalogue;

/// <summary>First-order interaction parameter epsilon_i^j in a liquid metal on mole fractions and natural logarithm.</summary>
/// <remarks>
/// Slot: <c>interaction/{solvent}/{i}/{j}</c> with i and j in ordinal order, because epsilon is symmetric.
/// epsilon = a + b/T. Values published on mass % and log10 were converted with
/// epsilon = 230 (M_j/M_s) e + (M_s - M_j)/M_s (Lupis and Elliott 1966).
/// </remarks>
public sealed record InteractionDatum : Datum
{
    /// <summary>Solvent metal.</summary>
    public required string Solvent { get; init; }

    /// <summary>First element of the pair, the ordinally smaller symbol.</summary>
    public required string First { get; init; }

    /// <summary>Second element of the pair; equal to <see cref="First"/> for a self-interaction.</summary>
    public required string Second { get; init; }

    /// <summary>Constant term a, dimensionless.</summary>
    public required double Constant { get; init; }

    /// <summary>Coefficient b of 1/T in kelvin.</summary>
    public required double InverseTemperatureKelvin { get; init; }

    /// <summary>One standard deviation of epsilon.</summary>
    public required double SigmaEpsilon { get; init; }

    /// <summary>epsilon at a temperature in kelvin, extrapolating outside the range.</summary>
    public double Epsilon(double temperatureKelvin) => Constant + (InverseTemperatureKelvin / temperatureKelvin);

    /// <summary>Derivative of epsilon with respect to temperature, -b/T^2, per kelvin.</summary>
    public double EpsilonPerKelvin(double temperatureKelvin) => -InverseTemperatureKelvin / (temperatureKelvin * temperatureKelvin);
}
