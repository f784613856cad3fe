namespace PartitionService.Core.Catalogue;

/// <summary>Activity coefficient of a mononuclear oxide (or chloride) in a slag of one family.</summary>
/// <remarks>
/// Slot: <c>slag/{family}/{oxide}</c>. ln gamma = a + b/T + slope (variable - reference), mole fractions on the
/// mono-cation basis. With <see cref="OxideState"/> = <see cref="StandardState.ProductOnly"/> the row holds
/// ln(K/gamma) instead and x = exp(a + b/T) a_M pO2^(nu/2).
/// </remarks>
public sealed record SlagActivityDatum : Datum
{
    /// <summary>Slag family, for example <c>iron-silicate</c>.</summary>
    public required string Family { get; init; }

    /// <summary>Element of the oxide or chloride.</summary>
    public required string Element { get; init; }

    /// <summary>Mononuclear oxide or chloride, for example <c>SnO2</c> or <c>NaCl</c>.</summary>
    public required string Oxide { get; init; }

    /// <summary>Oxygen atoms per metal atom; zero for a chloride.</summary>
    public required double OxygenPerMetal { get; init; }

    /// <summary>Chlorine atoms per metal atom; zero for an oxide.</summary>
    public required double ChlorinePerMetal { get; init; }

    /// <summary>State in which the pure oxide has activity 1, or ProductOnly.</summary>
    public required StandardState OxideState { get; init; }

    /// <summary>State of the metal that a ProductOnly row refers to; liquid for all other rows.</summary>
    public required StandardState MetalState { get; init; }

    /// <summary>Constant term a, dimensionless.</summary>
    public required double Constant { get; init; }

    /// <summary>Coefficient b of 1/T in kelvin.</summary>
    public required double InverseTemperatureKelvin { get; init; }

    /// <summary>Composition variable that ln gamma depends on; null where there is none.</summary>
    public SlagVariable? Variable { get; init; }

    /// <summary>Change of ln gamma per unit of <see cref="Variable"/>; zero where there is none.</summary>
    public required double Slope { get; init; }

    /// <summary>Value of <see cref="Variable"/> at which the slope term is zero.</summary>
    public required double VariableReference { get; init; }

    /// <summary>One standard deviation of ln gamma for use with any metal.</summary>
    public required double SigmaLnGamma { get; init; }

    /// <summary>One standard deviation with the calibrating metal, where errors of K and gamma0 cancel.</summary>
    public required double SigmaSameMetal { get; init; }

    /// <summary>calibrated, anchored, literature or assumed.</summary>
    public required string Kind { get; init; }

    /// <summary>ln gamma (or ln(K/gamma)) at a temperature in kelvin without the slope term.</summary>
    public double LnGamma(double temperatureKelvin) => Constant + (InverseTemperatureKelvin / temperatureKelvin);

    /// <summary>Derivative of <see cref="LnGamma"/> with respect to temperature, -b/T^2, per kelvin.</summary>
    public double LnGammaPerKelvin(double temperatureKelvin) => -InverseTemperatureKelvin / (temperatureKelvin * temperatureKelvin);
}
