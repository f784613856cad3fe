namespace PartitionService.Core.Catalogue;

/// <summary>Solubility of one element, or of a pair as a product, in a liquid metal: log10 = a + b/T on mass %.</summary>
/// <remarks>
/// Slot: <c>solubility/{solvent}/{elements}</c>. For one element log10(mass %) = a + b/T; for a pair
/// log10([mass % i]^m [mass % j]^n) = a + b/T with the exponents in <see cref="Exponents"/>.
/// </remarks>
public sealed record SolubilityLimitDatum : Datum
{
    /// <summary>Solvent metal.</summary>
    public required string Solvent { get; init; }

    /// <summary>Exponent of each element's mass % in the product; one entry with exponent 1 for a plain limit.</summary>
    public required IReadOnlyDictionary<string, int> Exponents { get; init; }

    /// <summary>Constant term a.</summary>
    public required double Constant { get; init; }

    /// <summary>Coefficient b of 1/T in kelvin.</summary>
    public required double InverseTemperatureKelvin { get; init; }

    /// <summary>Phase that precipitates beyond the limit.</summary>
    public required string PrecipitatingPhase { get; init; }

    /// <summary>One standard deviation of the log10.</summary>
    public required double SigmaLog10 { get; init; }

    /// <summary>log10 of the limit at a temperature in kelvin.</summary>
    public double Log10Limit(double temperatureKelvin) => Constant + (InverseTemperatureKelvin / temperatureKelvin);
}
