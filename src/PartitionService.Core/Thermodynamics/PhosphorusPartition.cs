namespace PartitionService.Core.Thermodynamics;

/// <summary>Phosphorus partition between basic steelmaking slag and liquid iron.</summary>
public static class PhosphorusPartition
{
    /// <summary>Slot of the catalogue row that describes the formula.</summary>
    public const string Slot = "capacity/suito-inoue-1995-lp";

    /// <summary>Lowest total iron that the formula is evaluated at, mass %; below it the logarithm runs away.</summary>
    public const double LowestIronMassPercent = 0.5;

    /// <summary>
    /// log10 of (mass % P)/[mass % P] = 0.072 (%CaO + 0.3 %MgO + 0.6 %P2O5 + 0.2 %MnO - 0.5 %Al2O3 + 1.2 %Na2O + 0.9 %BaO) + 11570/T
    /// - 10.52 + 2.5 log10 %Fe_t.
    /// </summary>
    /// <param name="slag">Composition as whole oxides, mass %.</param>
    /// <param name="ironMassPercent">Total iron of the slag, mass %.</param>
    /// <param name="temperatureKelvin">Temperature in kelvin, fitted in [1823, 1973].</param>
    /// <remarks>
    /// Suito and Inoue 1995, coefficients recalled; the catalogue states 0.10 as one standard deviation on 33 measured heats. The
    /// terms of Na2O and BaO are this catalogue's extension.
    /// </remarks>
    public static double Log10(SlagComposition slag, double ironMassPercent, double temperatureKelvin)
    {
        ArgumentNullException.ThrowIfNull(slag);
        var basicity = slag["CaO"] + (0.3 * slag["MgO"]) + (0.6 * slag["P2O5"]) + (0.2 * slag["MnO"]) - (0.5 * slag["Al2O3"])
            + (1.2 * slag["Na2O"]) + (0.9 * slag["BaO"]);
        return (0.072 * basicity) + (11570 / temperatureKelvin) - 10.52
            + (2.5 * Math.Log10(Math.Max(ironMassPercent, LowestIronMassPercent)));
    }

    /// <summary>Derivative of <see cref="Log10"/> with respect to temperature, per kelvin.</summary>
    public static double Log10PerKelvin(double temperatureKelvin) => -11570 / (temperatureKelvin * temperatureKelvin);

    /// <summary>Derivative of <see cref="Log10"/> with respect to total iron, per mass %; zero below the lowest iron.</summary>
    public static double Log10PerIronMassPercent(double ironMassPercent) =>
        ironMassPercent > LowestIronMassPercent ? 2.5 / (ironMassPercent * Math.Log(10)) : 0;

    /// <summary>Derivative of <see cref="Log10"/> with respect to an oxide, per mass %, the iron term left out.</summary>
    public static double Log10PerMassPercent(string oxide) => oxide switch
    {
        "CaO" => 0.072,
        "MgO" => 0.072 * 0.3,
        "P2O5" => 0.072 * 0.6,
        "MnO" => 0.072 * 0.2,
        "Al2O3" => 0.072 * -0.5,
        "Na2O" => 0.072 * 1.2,
        "BaO" => 0.072 * 0.9,
        _ => 0,
    };
}
