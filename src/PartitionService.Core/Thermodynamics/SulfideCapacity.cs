namespace PartitionService.Core.Thermodynamics;

/// <summary>Sulfide capacity C_S = (mass % S)(pO2/pS2)^(1/2) of a slag.</summary>
public static class SulfideCapacity
{
    /// <summary>Slot of the catalogue row that describes the formula.</summary>
    public const string Slot = "capacity/sosinsky-cs";

    /// <summary>log10 C_S by optical basicity: (22690 - 54640 Lambda)/T + 43.6 Lambda - 25.2.</summary>
    /// <param name="opticalBasicity">Optical basicity, fitted in [0.6, 0.85].</param>
    /// <param name="temperatureKelvin">Temperature in kelvin, fitted in [1673, 1973].</param>
    /// <remarks>
    /// Sosinsky and Sommerville, Metall. Trans. B 17 (1986) 331. Against 17 measured points at 1773 to 1823 K the catalogue
    /// states 0.25 as one standard deviation of the logarithm.
    /// </remarks>
    public static double Log10(double opticalBasicity, double temperatureKelvin) =>
        ((22690 - (54640 * opticalBasicity)) / temperatureKelvin) + (43.6 * opticalBasicity) - 25.2;

    /// <summary>Derivative of <see cref="Log10"/> with respect to temperature, per kelvin.</summary>
    public static double Log10PerKelvin(double opticalBasicity, double temperatureKelvin) =>
        -(22690 - (54640 * opticalBasicity)) / (temperatureKelvin * temperatureKelvin);

    /// <summary>Derivative of <see cref="Log10"/> with respect to the optical basicity.</summary>
    public static double Log10PerOpticalBasicity(double temperatureKelvin) => 43.6 - (54640 / temperatureKelvin);
}
