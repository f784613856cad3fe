using PartitionService.Core.Equilibrium;
using PartitionService.Core.Equilibrium.Assembly;
using PartitionService.Core.Thermodynamics;

namespace PartitionService.Core.Tests.Equilibrium.Assembly;

public sealed class OxygenStatementReaderTests
{
    [Fact]
    public void Pressure_is_read_as_it_stands() => Assert.Equal(-8, Read(new OxygenStatement.Pressure(-8), 1573), 12);

    /// <summary>
    /// Fe + 1/2 O2 = wustite, 1184 to 1644 K: mu(O2) = -551159 + 269.404 T - 16.9484 T ln T J/mol at 1 bar (O'Neill and Pownceby, Contrib.
    /// Mineral. Petrol. 114 (1993) 296, from memory). The catalogue's line rests on another assessment and states 706 J per half mole of
    /// O2 as one standard deviation, 0.047 in log10 at 1573 K.
    /// </summary>
    [Fact]
    public void Iron_and_wustite_at_1573_kelvin_agree_with_the_published_line()
    {
        const double temperature = 1573;
        var published = ((-551159 + (269.404 * temperature) - (16.9484 * temperature * Math.Log(temperature)))
            / (PhysicalConstants.GasConstant * temperature * Math.Log(10))) - Math.Log10(1.01325);
        Assert.Equal(published, Read(new OxygenStatement.MetalOxidePair("FeO"), temperature), 0.047);
    }

    /// <summary>The same source for 1042 to 1184 K, where the line of the catalogue has the same sigma (0.067 in log10 at 1100 K).</summary>
    [Fact]
    public void Iron_and_wustite_at_1100_kelvin_agree_with_the_published_line()
    {
        const double temperature = 1100;
        var published = ((-519357 + (59.427 * temperature) + (8.9276 * temperature * Math.Log(temperature)))
            / (PhysicalConstants.GasConstant * temperature * Math.Log(10))) - Math.Log10(1.01325);
        Assert.Equal(published, Read(new OxygenStatement.MetalOxidePair("FeO"), temperature), 0.067);
    }

    /// <summary>a(FeO) = 0.1 and a(Fe) = 0.5 shift log10 pO2 by 2 log10(0.1/0.5); NiO has the same stoichiometry.</summary>
    [Theory]
    [InlineData("FeO", 1573)]
    [InlineData("NiO", 1873)]
    public void Activities_shift_the_pair(string oxide, double temperature)
    {
        var pure = Read(new OxygenStatement.MetalOxidePair(oxide), temperature);
        var diluted = Read(new OxygenStatement.MetalOxidePair(oxide, 0.1, 0.5), temperature);
        Assert.Equal(2 * Math.Log10(0.1 / 0.5), diluted - pure, 10);
    }

    /// <summary>Across the melting point of iron the stable state changes but the potential does not jump.</summary>
    [Fact]
    public void Pair_is_continuous_where_the_metal_melts()
    {
        var melting = Vessels.Catalogue.Elements["Fe"].MeltingPointKelvin;
        var below = Read(new OxygenStatement.MetalOxidePair("FeO"), melting - 1e-6);
        var above = Read(new OxygenStatement.MetalOxidePair("FeO"), melting + 1e-6);

        // The rows from solid and from liquid iron are separate lines; together their sigmas (1500 and 2000 J) are 0.14 in log10.
        Assert.Equal(below, above, 0.14);
    }

    [Fact]
    public void Whole_and_mononuclear_oxides_are_the_same_statement() =>
        Assert.Equal(
            Read(new OxygenStatement.MetalOxidePair("Cu2O", 0.5), 1500), Read(new OxygenStatement.MetalOxidePair("CuO0.5", 0.5), 1500), 12);

    /// <summary>JANAF 1998 (from memory), water at 1500 and 1600 K: -164.376 and -158.639 kJ/mol at 1 bar; H2 + 1/2 O2 = H2O.</summary>
    [Fact]
    public void Water_to_hydrogen_agrees_with_janaf()
    {
        const double published = -164376 + (0.73 * (-158639 + 164376));
        var expected = (2 * published / (PhysicalConstants.GasConstant * 1573 * Math.Log(10))) - Math.Log10(1.01325);

        // JANAF states 42 J/mol on the enthalpy of water; interpolation and rounding add as much: 100 J/mol are 0.0066 in log10 pO2.
        Assert.Equal(expected, Read(new OxygenStatement.WaterToHydrogen(1), 1573), 0.0066);
    }

    [Fact]
    public void Ten_times_the_ratio_is_a_hundred_times_the_pressure() =>
        Assert.Equal(
            2,
            Read(new OxygenStatement.CarbonDioxideToMonoxide(10), 1573) - Read(new OxygenStatement.CarbonDioxideToMonoxide(1), 1573),
            10);

    [Fact]
    public void An_override_of_the_pair_is_stated_from_the_liquid_metal()
    {
        var ledger = Ledgers.At(1900, new DatumOverride("oxidation/FeO", OverrideKind.GibbsEnergy, -100000));
        var potential = OxygenStatementReader.Potential(new OxygenStatement.MetalOxidePair("FeO"), 1900, Vessels.Catalogue, ledger)!.HalfLnPressure;
        Assert.Equal(-100000 / (PhysicalConstants.GasConstant * 1900), potential, 12);
        Assert.True(ledger.Uses["oxidation/FeO"][0].Overridden);
    }

    [Fact]
    public void Statements_that_fix_no_potential_are_null()
    {
        Assert.Null(OxygenStatementReader.Potential(new OxygenStatement.Closed(), 1573, Vessels.Catalogue, Ledgers.At(1573)));
        Assert.Null(OxygenStatementReader.Potential(new OxygenStatement.Dissolved(10), 1573, Vessels.Catalogue, Ledgers.At(1573)));
    }

    private static double Read(OxygenStatement statement, double temperature) => OxygenPotential.ToLog10(
        OxygenStatementReader.Potential(statement, temperature, Vessels.Catalogue, Ledgers.At(temperature))!.HalfLnPressure);
}
