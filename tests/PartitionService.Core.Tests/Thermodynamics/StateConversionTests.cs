using PartitionService.Core.Catalogue;
using PartitionService.Core.Thermodynamics;

namespace PartitionService.Core.Tests.Thermodynamics;

public sealed class StateConversionTests
{
    private static readonly ThermochemicalCatalogue Catalogue = CatalogueLoader.LoadEmbedded();

    [Theory]
    [InlineData("Fe", "pure liquid")]
    [InlineData("P", "pure liquid")]
    [InlineData("C", "graphite")]
    [InlineData("O", "1/2 O2 gas, 1 atm")]
    [InlineData("N", "1/2 N2 gas, 1 atm")]
    public void Reference_is_named(string element, string name) => Assert.Equal(name, StateConversion.ReferenceName(element));

    [Theory]
    [InlineData("Fe", StandardState.Liquid)]
    [InlineData("C", StandardState.Graphite)]
    [InlineData("S", StandardState.HalfDiatomicGas)]
    public void The_reference_itself_needs_no_conversion(string element, StandardState state) =>
        Assert.Equal(0, Convert(element, state, 1573));

    /// <summary>Iron at 1573 K by hand: 13808 J/mol (1 - 1573/1811) = 1814.6 J/mol of fusion, -0.13875 RT.</summary>
    [Fact]
    public void Solid_iron_at_1573_kelvin_by_hand() => Assert.Equal(-0.13875, Convert("Fe", StandardState.Solid, 1573)!.Value, 5);

    [Fact]
    public void Solid_and_liquid_coexist_at_the_melting_point()
    {
        var iron = Catalogue.Elements["Fe"].MeltingPointKelvin;
        Assert.Equal(0, Convert("Fe", StandardState.Solid, iron)!.Value, 12);
        Assert.True(Convert("Fe", StandardState.Solid, iron + 100) > 0);
    }

    /// <summary>
    /// At its boiling point a metal's vapour has 1 atm over the liquid, so liquid and monatomic gas have the same potential. Boiling points
    /// and gas rows come from different columns of the catalogue; they may differ by the sigma of the gas row.
    /// </summary>
    [Theory]
    [InlineData("Mg")]
    [InlineData("Ca")]
    [InlineData("Zn")]
    [InlineData("Cd")]
    public void Liquid_and_vapour_coexist_at_the_boiling_point(string element)
    {
        var boiling = Catalogue.Elements[element].BoilingPointKelvin;
        var sigma = Catalogue.GasSpecies.Single(row => row.Species == element).SigmaJoulePerMol / (PhysicalConstants.GasConstant * boiling);
        Assert.InRange(Convert(element, StandardState.MonatomicGas, boiling)!.Value, -sigma, sigma);
    }

    /// <summary>P2(g) is the product of two atoms: the conversion per atom is half its Gibbs energy of formation over RT.</summary>
    [Fact]
    public void Half_diatomic_gas_counts_half_the_molecule()
    {
        var energy = Catalogue.GasSpecies.Single(row => row.Species == "P2").GibbsEnergy(1873);
        Assert.Equal(energy / (2 * PhysicalConstants.GasConstant * 1873), Convert("P", StandardState.HalfDiatomicGas, 1873)!.Value, 12);
    }

    [Theory]
    [InlineData("Fe", StandardState.Graphite)]
    [InlineData("Fe", StandardState.ProductOnly)]
    [InlineData("Ce", StandardState.MonatomicGas)]
    public void What_the_catalogue_cannot_convert_is_null(string element, StandardState state) =>
        Assert.Null(Convert(element, state, 1573));

    private static double? Convert(string element, StandardState state, double temperature) =>
        StateConversion.LnReferenceOverState(Catalogue.Elements[element], state, temperature, Catalogue);
}
