using PartitionService.Core.Thermodynamics;

namespace PartitionService.Core.Tests.Thermodynamics;

public sealed class PhysicalConstantsTests
{
    /// <summary>R is the product of the Boltzmann and Avogadro constants, both exact (SI brochure, 9th edition, 2019).</summary>
    [Fact]
    public void Gas_constant_is_boltzmann_times_avogadro() =>
        Assert.InRange(PhysicalConstants.GasConstant / (1.380649e-23 * 6.02214076e23), 1 - 1e-14, 1 + 1e-14);

    /// <summary>22.41396954... L/mol at 273.15 K and 101.325 kPa, printed cut off (CODATA 2018, from memory).</summary>
    [Fact]
    public void Normal_cubic_metre_is_the_molar_volume_of_an_ideal_gas_at_zero_celsius() =>
        Assert.Equal(22.41396954e-3, PhysicalConstants.NormalCubicMetrePerMol, 10);
}
