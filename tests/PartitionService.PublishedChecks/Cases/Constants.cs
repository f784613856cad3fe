using PartitionService.Core.Thermodynamics;

namespace PartitionService.PublishedChecks.Cases;

/// <summary>Constants of nature.</summary>
internal static class Constants
{
    /// <summary>Faraday constant in C/mol, exact since 2019 (e N_A, rounded).</summary>
    public const double FaradayCoulombPerMol = 96485.33212;

    /// <summary>RT in J/mol.</summary>
    public static double Thermal(double temperatureKelvin) => PhysicalConstants.GasConstant * temperatureKelvin;
}
