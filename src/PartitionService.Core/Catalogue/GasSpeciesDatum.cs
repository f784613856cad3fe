namespace PartitionService.Core.Catalogue;

/// <summary>Gibbs energy of formation of an ideal gas species at 1 atm from the component reference states.</summary>
/// <remarks>
/// Slot: <c>gas/{species}</c>. Delta G = A + B T + C T ln T in J per mol of species, from pure liquid metal, graphite,
/// O2, S2, Cl2, Br2, H2 and N2 gas at 1 atm. With C not zero A and B are no enthalpy and no entropy.
/// </remarks>
public sealed record GasSpeciesDatum : Datum
{
    /// <summary>Formula of the species, for example <c>As4O6</c> or <c>CO2</c>.</summary>
    public required string Species { get; init; }

    /// <summary>Atoms per molecule by element symbol; all counts positive.</summary>
    public required IReadOnlyDictionary<string, int> Atoms { get; init; }

    /// <summary>Constant term A in J/mol.</summary>
    public required double ConstantJoulePerMol { get; init; }

    /// <summary>Coefficient B of T in J/(mol K).</summary>
    public required double LinearJoulePerMolKelvin { get; init; }

    /// <summary>Coefficient C of T ln T in J/(mol K).</summary>
    public required double LogarithmicJoulePerMolKelvin { get; init; }

    /// <summary>One standard deviation of Delta G in J/mol.</summary>
    public required double SigmaJoulePerMol { get; init; }

    /// <summary>Delta G in J per mol of species at a temperature in kelvin, extrapolating outside the range.</summary>
    public double GibbsEnergy(double temperatureKelvin) =>
        ConstantJoulePerMol
        + (LinearJoulePerMolKelvin * temperatureKelvin)
        + (LogarithmicJoulePerMolKelvin * temperatureKelvin * Math.Log(temperatureKelvin));

    /// <summary>Derivative of Delta G with respect to temperature, B + C (ln T + 1), in J/(mol K).</summary>
    public double GibbsEnergyPerKelvin(double temperatureKelvin) =>
        LinearJoulePerMolKelvin + (LogarithmicJoulePerMolKelvin * (Math.Log(temperatureKelvin) + 1));
}
