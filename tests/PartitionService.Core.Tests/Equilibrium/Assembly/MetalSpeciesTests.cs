using PartitionService.Core.Catalogue;
using PartitionService.Core.Equilibrium;
using PartitionService.Core.Equilibrium.Assembly;
using PartitionService.Core.Thermodynamics;

namespace PartitionService.Core.Tests.Equilibrium.Assembly;

public sealed class MetalSpeciesTests
{
    [Fact]
    public void The_solvent_has_activity_coefficient_one_and_needs_no_datum()
    {
        var copper = Create("Cu", "Cu", 1573)!;
        Assert.Equal(0, copper.LnGamma);
        Assert.Equal(0, copper.LnK);
        Assert.Empty(copper.Slots);
    }

    [Fact]
    public void A_solute_takes_the_preferred_row()
    {
        var ledger = Ledgers.At(1573);
        var lead = Create("Pb", "Cu", 1573, ledger)!;
        Assert.Equal(2046.44 / 1573, lead.LnGamma!.Value, 12);
        Assert.Equal(-lead.LnGamma.Value, lead.LnK);
        Assert.Equal(["metal/Cu/Pb"], lead.Slots);
        Assert.Equal(lead.LnGamma.Value, ledger.Uses["metal/Cu/Pb"][0].Value);
        Assert.Equal("pure liquid", lead.StandardState);
    }

    /// <summary>Solid chromium as reference: at 1573 K, below its melting point, the liquid is less stable, so ln gamma on it is lower.</summary>
    [Fact]
    public void A_solid_reference_is_converted_to_the_liquid()
    {
        var chromium = Vessels.Catalogue.Elements["Cr"];
        var row = Ledgers.At(1573).Select<InfiniteDilutionDatum>("metal/Cu/Cr")!;
        Assert.Equal(StandardState.Solid, row.SoluteState);
        var fusion = chromium.EnthalpyOfFusionJoulePerMol * (1 - (1573 / chromium.MeltingPointKelvin));
        var expected = row.LnGamma(1573) - (fusion / (PhysicalConstants.GasConstant * 1573));
        Assert.Equal(expected, Create("Cr", "Cu", 1573)!.LnGamma!.Value, 12);
    }

    [Fact]
    public void A_gaseous_reference_is_converted_to_the_liquid()
    {
        var row = Ledgers.At(1873).Select<InfiniteDilutionDatum>("metal/Fe/Mg")!;
        Assert.Equal(StandardState.MonatomicGas, row.SoluteState);
        var gas = Vessels.Catalogue.GasSpecies.Single(g => g.Species == "Mg").GibbsEnergy(1873);
        Assert.Equal(
            row.LnGamma(1873) + (gas / (PhysicalConstants.GasConstant * 1873)), Create("Mg", "Fe", 1873)!.LnGamma!.Value, 12);
    }

    [Fact]
    public void Linking_components_are_not_carried()
    {
        Assert.Null(Create("O", "Cu", 1573)!.Carried);
        Assert.Equal("Pb", Create("Pb", "Cu", 1573)!.Carried);
    }

    [Fact]
    public void A_missing_datum_gives_no_species_and_an_override_gives_one()
    {
        Assert.Null(Create("W", "Pb", 1000));
        var given = Create("W", "Pb", 1000, Ledgers.At(1000, new DatumOverride("metal/Pb/W", OverrideKind.LnGamma, 7)))!;
        Assert.Equal(7, given.LnGamma);
    }

    private static SpeciesRecord? Create(string element, string solvent, double temperature, DatumLedger? ledger = null) =>
        MetalSpecies.Create(
            Vessels.Catalogue.Elements[element], solvent, temperature, Vessels.Catalogue, ledger ?? Ledgers.At(temperature));
}
