namespace PartitionService.Core.Thermodynamics;

/// <summary>Constants of nature and of unit definitions.</summary>
public static class PhysicalConstants
{
    /// <summary>Molar gas constant R in J/(mol K), exact since the 2019 revision of the SI.</summary>
    public const double GasConstant = 8.31446261815324;

    /// <summary>Ideal molar volume at 0 degC and 1 atm in m3/mol, R 273.15 K / 101325 Pa.</summary>
    public const double NormalCubicMetrePerMol = GasConstant * 273.15 / 101325;

    /// <summary>Lowest temperature of the service in kelvin.</summary>
    public const double MinimumTemperatureKelvin = 500;

    /// <summary>Highest temperature of the service in kelvin.</summary>
    public const double MaximumTemperatureKelvin = 2500;
}
