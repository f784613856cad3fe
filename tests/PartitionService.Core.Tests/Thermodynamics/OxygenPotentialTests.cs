using PartitionService.Core.Catalogue;
using PartitionService.Core.Thermodynamics;

namespace PartitionService.Core.Tests.Thermodynamics;

public sealed class OxygenPotentialTests
{
    private const double Temperature = 1573;
    private static readonly ThermochemicalCatalogue Catalogue = CatalogueLoader.LoadEmbedded();

    /// <summary>
    /// JANAF 1998 (from memory), Gibbs energies of formation in kJ/mol at 1500 and 1600 K, linear between: CO -243.740 and -252.284, CO2
    /// -396.288 and -396.353, at 1 bar. CO + 1/2 O2 = CO2 then gives 7.29 at 1e-8 atm. The enthalpies at 298 K are stated to 0.17 (CO) and
    /// 0.05 kJ/mol (CO2), together 0.22 kJ/mol or 1.7 % of the ratio.
    /// </summary>
    [Fact]
    public void Co2_to_co_ratio_at_1573_kelvin_agrees_with_janaf()
    {
        const double carbonMonoxide = -243740 + (0.73 * (-252284 + 243740));
        const double carbonDioxide = -396288 + (0.73 * (-396353 + 396288));
        var published = Math.Exp((carbonMonoxide - carbonDioxide) / (PhysicalConstants.GasConstant * Temperature)) * Math.Sqrt(1.01325e-8);
        var computed = OxygenPotential.ToRatio(OxygenPotential.FromLog10(-8), Gas("CO2"), Gas("CO"), Temperature);
        Assert.Equal(7.29, published, 0.005);
        Assert.InRange(computed / published, 1 - 0.017, 1 + 0.017);
    }

    /// <summary>
    /// Ni + 1/2 O2 = NiO: mu(O2) = -478967 + 248.514 T - 9.7961 T ln T J/mol at 1 bar (O'Neill and Pownceby, Contrib. Mineral. Petrol. 114
    /// (1993) 296, from memory). The catalogue's straight line misfits it by up to 154 J per half mole of O2, which is 0.0103 in log10.
    /// </summary>
    [Fact]
    public void Nickel_buffer_agrees_with_the_published_oxygen_potential()
    {
        var published = (-478967 + (248.514 * Temperature) - (9.7961 * Temperature * Math.Log(Temperature)))
            / (PhysicalConstants.GasConstant * Temperature * Math.Log(10));
        var line = Catalogue.Slot<OxidationDatum>("oxidation/NiO")
            .Single(row => row is { Preferred: true, MetalState: StandardState.Solid, OxideState: StandardState.Solid });

        var computed = OxygenPotential.ToLog10(OxygenPotential.FromPair(0, 0, line.GibbsEnergy(Temperature), 1, Temperature));

        Assert.Equal(published - Math.Log10(1.01325), computed, 0.0103);
    }

    [Fact]
    public void Ratio_and_potential_are_inverse()
    {
        var potential = OxygenPotential.FromRatio(0.37, Gas("CO2"), Gas("CO"), Temperature);
        Assert.Equal(0.37, OxygenPotential.ToRatio(potential, Gas("CO2"), Gas("CO"), Temperature), 12);
    }

    /// <summary>ln ratio = 1/2 ln pO2 + constant, so a hundredfold pO2 makes the ratio tenfold.</summary>
    [Fact]
    public void Hundredfold_pressure_makes_the_ratio_tenfold()
    {
        double Ratio(double log10) => OxygenPotential.ToRatio(OxygenPotential.FromLog10(log10), Gas("H2O"), 0, Temperature);
        Assert.Equal(10, Ratio(-8) / Ratio(-10), 10);
    }

    /// <summary>Fe3O4 per Fe: nu = 4/3. ln a(oxide) - ln a(metal) + dG/RT = 4/3 of 1/2 ln pO2.</summary>
    [Fact]
    public void Pair_divides_by_the_oxygen_per_metal()
    {
        var thermal = PhysicalConstants.GasConstant * Temperature;
        Assert.Equal((-2 + 1 - 12) / (4.0 / 3), OxygenPotential.FromPair(-2, -1, -12 * thermal, 4.0 / 3, Temperature), 12);
    }

    [Theory]
    [InlineData(-8, -9.2103403719761836)]
    [InlineData(0, 0)]
    [InlineData(2, 2.3025850929940459)]
    public void Log10_is_twice_the_potential_over_ln_10(double log10, double potential)
    {
        Assert.Equal(potential, OxygenPotential.FromLog10(log10), 13);
        Assert.Equal(log10, OxygenPotential.ToLog10(potential), 13);
    }

    private static double Gas(string species) => Catalogue.GasSpecies.Single(row => row.Species == species).GibbsEnergy(Temperature);
}
