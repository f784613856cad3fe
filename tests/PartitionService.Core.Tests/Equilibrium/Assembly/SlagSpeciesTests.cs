using PartitionService.Core.Catalogue;
using PartitionService.Core.Equilibrium;
using PartitionService.Core.Equilibrium.Assembly;
using PartitionService.Core.Thermodynamics;

namespace PartitionService.Core.Tests.Equilibrium.Assembly;

public sealed class SlagSpeciesTests
{
    private const double Temperature = 1573;

    /// <summary>Liquid PbO: both rows are of the liquid, ln K = -dG/RT - ln gamma with the numbers of the files (-186572 + 71.583 T; -1.897).</summary>
    [Fact]
    public void A_liquid_oxide_takes_the_liquid_oxidation_row()
    {
        var lead = Single("iron-silicate", "Cu", "Pb");
        Assert.Equal(-(-186572 + (71.583 * Temperature)) / (PhysicalConstants.GasConstant * Temperature) + 1.897, lead.LnK, 10);
        Assert.Equal("pure liquid oxide", lead.StandardState);
        Assert.Equal(["slag/iron-silicate/PbO", "oxidation/PbO"], lead.Slots);
    }

    /// <summary>The slag row of SiO2 is on the solid, so the oxidation row must be too, although another row would be nearer.</summary>
    [Theory]
    [InlineData("iron-silicate", "Si", "SiO2")]
    [InlineData("iron-silicate", "Zn", "ZnO")]
    [InlineData("basic-steelmaking", "Ca", "CaO")]
    [InlineData("basic-steelmaking", "Mn", "MnO")]
    [InlineData("iron-silicate", "Sn", "SnO")]
    public void Oxide_states_of_both_rows_match(string family, string element, string oxide)
    {
        var ledger = Ledgers.At(Temperature);
        var species = Create(family, "Cu", element, ledger).Single(s => s.Name == oxide);
        var slag = ledger.Select<SlagActivityDatum>($"slag/{family}/{oxide}")!;
        var used = (OxidationDatum)Vessels.Catalogue.Find(ledger.Uses[$"oxidation/{oxide}"][0].Key)!;
        Assert.Equal(slag.OxideState, used.OxideState);
        Assert.Equal($"pure {used.OxideState.ToString().ToLowerInvariant()} oxide", species.StandardState);
    }

    /// <summary>Magnesium in iron is referred to its gas, and where the oxidation table has a row from the gas it counts; ln K is on the liquid.</summary>
    [Theory]
    [InlineData("Ca", "CaO", "Fe")]
    [InlineData("Cr", "CrO1.5", "Cu")]
    [InlineData("Pb", "PbO", "Cu")]
    public void Metal_state_of_the_oxidation_row_follows_the_solute(string element, string oxide, string solvent)
    {
        var temperature = 1873.0;
        var ledger = Ledgers.At(temperature);
        var family = "basic-steelmaking";
        var species = Create(family, solvent, element, ledger, temperature).Single(s => s.Name == oxide);
        var used = (OxidationDatum)Vessels.Catalogue.Find(ledger.Uses[$"oxidation/{oxide}"][0].Key)!;
        Assert.Equal(ledger.Select<InfiniteDilutionDatum>($"metal/{solvent}/{element}")!.SoluteState, used.MetalState);
        var conversion = StateConversion.LnReferenceOverState(
            Vessels.Catalogue.Elements[element], used.MetalState, temperature, Vessels.Catalogue)!.Value;
        var energy = used.GibbsEnergy(temperature) / (PhysicalConstants.GasConstant * temperature);
        Assert.Equal(-energy - conversion - species.LnGamma!.Value, species.LnK, 10);
    }

    /// <summary>Product rows hold ln(K/gamma) itself; gold (liquid, -10.17) has no activity in the slag.</summary>
    [Fact]
    public void A_product_row_is_the_constant()
    {
        var gold = Single("iron-silicate", "Cu", "Au");
        Assert.Equal(-10.17, gold.LnK, 10);
        Assert.Null(gold.LnGamma);
        Assert.Equal("", gold.StandardState);
    }

    /// <summary>The product row of platinum is from the solid: below the melting point 1 mol of liquid makes more oxide than 1 of solid.</summary>
    [Fact]
    public void A_product_row_from_the_solid_is_converted_to_the_liquid()
    {
        var platinum = Vessels.Catalogue.Elements["Pt"];
        var fusion = platinum.EnthalpyOfFusionJoulePerMol * (1 - (Temperature / platinum.MeltingPointKelvin));
        Assert.True(fusion > 0);
        Assert.Equal(-14.13 + (fusion / (PhysicalConstants.GasConstant * Temperature)), Single("iron-silicate", "Cu", "Pt").LnK, 10);
    }

    [Fact]
    public void A_chloride_takes_the_chloride_row()
    {
        var sodium = Create("chloride-salt", "Al", "Na", Ledgers.At(1000), 1000).Single(s => s.Name == "NaCl");
        Assert.Equal(378812 - 61793, sodium.LnK * PhysicalConstants.GasConstant * 1000, 1e-6);
        Assert.Equal(1, sodium.Atoms["Cl"]);
        Assert.Equal("pure liquid chloride", sodium.StandardState);
    }

    [Fact]
    public void Several_valences_stand_side_by_side() =>
        Assert.Equal(["FeO", "FeO1.5"], Create("iron-silicate", "Cu", "Fe", Ledgers.At(Temperature)).Select(s => s.Name));

    [Fact]
    public void An_element_without_a_row_has_no_species() => Assert.Empty(Create("iron-silicate", "Cu", "Hg", Ledgers.At(Temperature)));

    [Fact]
    public void An_override_gives_an_oxide_that_the_family_lacks()
    {
        var slot = "slag/lead-oxide/FeO";
        Assert.Null(Ledgers.At(1273).Select<SlagActivityDatum>(slot));
        var iron = Create("lead-oxide", "Pb", "Fe", Ledgers.At(1273, new DatumOverride(slot, OverrideKind.LnGamma, 2)), 1273).Single();
        Assert.Equal(2, iron.LnGamma);
    }

    [Fact]
    public void An_oxidation_override_is_stated_from_the_liquid_metal()
    {
        var ledger = Ledgers.At(Temperature, new DatumOverride("oxidation/CrO1.5", OverrideKind.GibbsEnergy, -300000));
        var chromium = Create("iron-silicate", "Cu", "Cr", ledger).Single(s => s.Name == "CrO1.5");
        Assert.Equal((300000 / (PhysicalConstants.GasConstant * Temperature)) - chromium.LnGamma!.Value, chromium.LnK, 10);
    }

    [Fact]
    public void Phosphorus_goes_by_the_formula_only_in_steelmaking_slag_over_iron()
    {
        Assert.Equal([PhosphorusPartition.Slot], Single("basic-steelmaking", "Fe", "P", 1873).Slots);
        Assert.Contains("slag/basic-steelmaking/PO2.5", Single("basic-steelmaking", "Ni", "P", 1873).Slots);
        var given = Ledgers.At(1873, new DatumOverride("slag/basic-steelmaking/PO2.5", OverrideKind.LnGamma, -20));
        Assert.Equal(-20, Create("basic-steelmaking", "Fe", "P", given, 1873).Single().LnGamma);
    }

    [Fact]
    public void Sulfide_replaces_an_oxide_ion_where_the_family_has_a_capacity()
    {
        SpeciesRecord? Sulfide(string family) =>
            new SlagSpecies(Vessels.Catalogue.SlagFamilies[family], "Fe", 1873, Vessels.Catalogue, Ledgers.At(1873)).Sulfide();
        Assert.Null(Sulfide("iron-silicate"));
        var sulfide = Sulfide("ladle-lime-alumina")!;
        Assert.Equal(1, sulfide.Atoms["S"]);
        Assert.Equal(-1, sulfide.Atoms["O"]);
        Assert.Null(sulfide.Carried);
    }

    private static SpeciesRecord Single(string family, string solvent, string element, double temperature = Temperature) =>
        Create(family, solvent, element, Ledgers.At(temperature), temperature).Single();

    private static SpeciesRecord[] Create(
        string family, string solvent, string element, DatumLedger ledger, double temperature = Temperature) =>
        [.. new SlagSpecies(Vessels.Catalogue.SlagFamilies[family], solvent, temperature, Vessels.Catalogue, ledger)
            .Create(Vessels.Catalogue.Elements[element])];
}
