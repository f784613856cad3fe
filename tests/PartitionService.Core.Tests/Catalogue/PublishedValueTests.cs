using PartitionService.Core.Catalogue;

namespace PartitionService.Core.Tests.Catalogue;

/// <summary>Numbers of the catalogue against values from outside it.</summary>
public sealed class PublishedValueTests
{
    private const double GasConstant = 8.314462618;

    private static readonly ThermochemicalCatalogue Catalogue = CatalogueLoader.LoadEmbedded();

    [Theory]
    [InlineData("CO", 1000, -200_275)] // NIST-JANAF 1998, formation Gibbs energy, from memory
    [InlineData("CO", 1500, -243_740)]
    [InlineData("CO2", 1000, -395_886)]
    [InlineData("CO2", 1500, -396_288)]
    [InlineData("H2O", 1000, -192_590)]
    [InlineData("H2O", 1500, -164_376)]
    [InlineData("HCl", 1000, -100_799)]
    [InlineData("NO", 1500, 71_425)]
    public void Formation_energy_of_common_gases_agrees_with_the_tables(string species, double temperature, double expected)
    {
        var found = Catalogue.GasSpecies.Single(g => g.Species == species).GibbsEnergy(temperature);
        Assert.Equal(expected, found, 500.0);
    }

    [Fact]
    public void Carbon_monoxide_to_dioxide_ratio_gives_the_oxygen_potential_of_the_tables()
    {
        // CO + 1/2 O2 = CO2: log10 K at 1500 K is 5.316 from the NIST-JANAF 1998 log10 Kf 13.801 and 8.488, from memory.
        double G(string s) => Catalogue.GasSpecies.Single(g => g.Species == s).GibbsEnergy(1500);
        Assert.Equal(5.316, -(G("CO2") - G("CO")) / (GasConstant * 1500 * Math.Log(10)), 0.03);
    }

    [Theory]
    [InlineData("Zn", 1180)] // normal boiling points, CRC Handbook of Chemistry and Physics, from memory
    [InlineData("Cd", 1040)]
    [InlineData("Mg", 1363)]
    [InlineData("Pb", 2022)]
    public void Monatomic_vapour_reaches_about_one_atmosphere_at_the_boiling_point(string element, double boilingPoint)
    {
        var energy = Catalogue.GasSpecies.Single(g => g.Species == element).GibbsEnergy(boilingPoint);
        Assert.Equal(0, -energy / (GasConstant * boilingPoint * Math.Log(10)), 0.06);
    }

    [Theory]
    [InlineData("NiO", StandardState.Solid, StandardState.Solid, 1300, -9.94)] // O'Neill and Pownceby 1993, Ni + NiO, from memory
    [InlineData("CoO", StandardState.Solid, StandardState.Solid, 1300, -11.42)] // O'Neill and Pownceby 1993, Co + CoO, from memory
    [InlineData("FeO", StandardState.Solid, StandardState.Solid, 1300, -14.43)] // iron-wustite line 6.702 - 27489/T, from memory
    public void Oxygen_buffers_agree_with_published_lines(
        string oxide, StandardState metal, StandardState state, double temperature, double log10OxygenPressure)
    {
        var line = Catalogue.Slot<OxidationDatum>($"oxidation/{oxide}")
            .Single(d => d.Preferred && d.MetalState == metal && d.OxideState == state && d.Covers(temperature));
        var found = 2 / line.OxygenPerMetal * line.GibbsEnergy(temperature) / (GasConstant * temperature * Math.Log(10));
        Assert.Equal(log10OxygenPressure, found, 0.08);
    }

    [Fact]
    public void Carbon_oxygen_product_of_liquid_iron_is_the_known_one()
    {
        // [mass % C][mass % O] at 1873 K and 1 atm CO lies between 0.0018 and 0.0026:
        // Turkdogan, Fundamentals of Steelmaking 1996, from memory.
        const double T = 1873, Iron = 55.845;
        double Ln(string solute) => Catalogue.Slot<InfiniteDilutionDatum>($"metal/Fe/{solute}").Single(d => d.Preferred).LnGamma(T);
        var carbonMonoxide = Catalogue.GasSpecies.Single(g => g.Species == "CO").GibbsEnergy(T);
        var product = Math.Exp((carbonMonoxide / (GasConstant * T)) - Ln("C") - Ln("O")); // x_C x_O from a_C pO2^(1/2) = exp(dG/RT)
        Assert.InRange(product * (100 * 12.011 / Iron) * (100 * 15.999 / Iron), 0.0018, 0.0026);
    }

    [Fact]
    public void Oxygen_in_lead_converted_from_the_gas_reaction_gives_the_published_energy()
    {
        // Otsuka and Kozuka, Metall. Trans. B 10 (1979): 1/2 O2 = O(1 at % in Pb), -118600 + 14.10 T J/mol;
        // R ln 100 = 38.29 J/K turns at % into x.
        var row = Catalogue.Slot<InfiniteDilutionDatum>("metal/Pb/O").Single(d => d.Preferred);
        Assert.Equal(StandardState.HalfDiatomicGas, row.SoluteState);
        Assert.Equal(-118600 + ((14.10 + (GasConstant * Math.Log(100))) * 1200), row.LnGamma(1200) * GasConstant * 1200, 20.0);
    }

    [Fact]
    public void Mass_percent_interaction_is_converted_by_the_relation_of_Lupis_and_Elliott()
    {
        // e_C^C = 0.14 in liquid iron at 1873 K (Sigworth and Elliott 1974, from memory):
        // 230 (12.011/55.845) 0.14 + (55.845 - 12.011)/55.845 = 7.71.
        var rows = Catalogue.Slot<InteractionDatum>("interaction/Fe/C/C");
        Assert.Contains(rows, r => Math.Abs(r.Epsilon(1873) - 7.71) < 0.2);
    }
}
