using PartitionService.Core.Equilibrium;
using PartitionService.Core.Equilibrium.Charging;

namespace PartitionService.Core.Tests.Equilibrium.Charging;

public sealed class ChargeReaderTests
{
    /// <summary>By hand: 223.199 kg of PbO (207.2 + 15.999 g/mol) are 1000 mol.</summary>
    [Fact]
    public void A_mass_becomes_atoms()
    {
        var read = Read(new("PbO", 223.199));
        Assert.Equal(1000, read.Atoms["Pb"], 9);
        Assert.Equal(1000, read.Atoms["O"], 9);
        Assert.Equal(223.199, read.MassKg, 9);
    }

    /// <summary>1 Nm3 of an ideal gas is 44.615 mol (1/0.02241397 m3/mol); CO2 brings two oxygen atoms each.</summary>
    [Fact]
    public void A_volume_becomes_atoms()
    {
        var read = Read(new("CO2", 1, ChargeUnit.NormalCubicMetre));
        Assert.Equal(44.615, read.Atoms["C"], 3);
        Assert.Equal(2 * 44.615, read.Atoms["O"], 3);
        Assert.Equal(44.615 * 44.009 / 1000, read.MassKg, 4);
    }

    /// <summary>100 Nm3 of air: 20.95 % O2 and 0.03 % CO2 (the composition that GasFormulas states) hold 20.98 Nm3 of O2.</summary>
    [Fact]
    public void Air_becomes_nitrogen_oxygen_argon_and_a_little_carbon()
    {
        var read = Read(new("air", 100, ChargeUnit.NormalCubicMetre));
        const double mol = 100 / 0.02241396954;
        Assert.Equal(2 * 0.2098 * mol, read.Atoms["O"], 2);
        Assert.Equal(2 * 0.7809 * mol, read.Atoms["N"], 2);
        Assert.Equal(0.0093 * mol, read.Atoms["Ar"], 2);
        Assert.Equal(0.0003 * mol, read.Atoms["C"], 2);
        Assert.Equal(ChargeOrigin.Gas, read.Origin);
    }

    [Theory]
    [InlineData("Cu", ChargeOrigin.Metal)]
    [InlineData("FeSi", ChargeOrigin.Metal)]
    [InlineData("Cu2S", ChargeOrigin.Metal)]
    [InlineData("Fe3C", ChargeOrigin.Metal)]
    [InlineData("PbO", ChargeOrigin.Slag)]
    [InlineData("CaCO3", ChargeOrigin.Slag)]
    [InlineData("Ca(OH)2", ChargeOrigin.Slag)]
    [InlineData("NaCl", ChargeOrigin.Slag)]
    [InlineData("CaF2", ChargeOrigin.Slag)]
    [InlineData("PbSO4", ChargeOrigin.Slag)]
    [InlineData("O2", ChargeOrigin.Gas)]
    [InlineData("SO2", ChargeOrigin.Gas)]
    [InlineData("HCl", ChargeOrigin.Gas)]
    [InlineData("C2H3Cl", ChargeOrigin.Gas)]
    [InlineData("C15H16O2", ChargeOrigin.Gas)]
    [InlineData("NH3", ChargeOrigin.Gas)]
    [InlineData("C", ChargeOrigin.Carbon)]
    public void Constituents_come_with_a_phase(string formula, object origin) =>
        Assert.Equal(origin, Read(new(formula, 1)).Origin);

    [Fact]
    public void An_unknown_element_is_named()
    {
        Assert.False(ChargeReader.TryResolve("He2O3", Vessels.Catalogue.Elements, out var atoms, out var problem));
        Assert.Null(atoms);
        Assert.Equal("holds He, which the catalogue does not know", problem);
    }

    [Fact]
    public void An_item_that_was_not_validated_is_refused() => Assert.Throws<ArgumentException>(() => Read(new("Xx", 1)));

    private static ChargeConstituent Read(ChargeItem item) => ChargeReader.Read(item, Vessels.Catalogue.Elements);
}
