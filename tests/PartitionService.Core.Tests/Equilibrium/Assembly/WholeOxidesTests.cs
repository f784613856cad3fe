using PartitionService.Core.Equilibrium.Assembly;

namespace PartitionService.Core.Tests.Equilibrium.Assembly;

public sealed class WholeOxidesTests
{
    /// <summary>By hand: 1 mol Si is 60.083 g SiO2, 2 mol Al are 101.961 g Al2O3.</summary>
    [Fact]
    public void Elements_become_whole_oxides()
    {
        var slag = WholeOxides.Composition([("Si", 1), ("Al", 2)], Vessels.Catalogue.Elements)!;
        Assert.Equal(100 * 60.083 / (60.083 + 101.961), slag["SiO2"], 0.005);
        Assert.Equal(100, slag["SiO2"] + slag["Al2O3"], 10);
    }

    [Fact]
    public void Ferric_iron_is_kept_apart()
    {
        var slag = WholeOxides.Composition([("Fe", 1), ("FeO1.5", 2)], Vessels.Catalogue.Elements)!;
        Assert.Equal(71.844 / 159.687, slag["FeO"] / slag["Fe2O3"], 4);
    }

    [Fact]
    public void Elements_without_a_whole_oxide_are_left_out() =>
        Assert.Null(WholeOxides.Composition([("Au", 1), ("Si", 0)], Vessels.Catalogue.Elements));

    [Fact]
    public void Composition_of_the_charge_splits_ferrous_and_ferric_iron()
    {
        var account = Ledgers.Assemble(Vessels.BlackCopper.Plus(new Core.Equilibrium.ChargeItem("Fe2O3", 30))).Account;
        var slag = WholeOxides.OfCharge(account, Vessels.Catalogue.Elements)!;
        Assert.Equal(100 * 30.0 / 480, slag["Fe2O3"], 6);
        Assert.Equal(100 * 300.0 / 480, slag["FeO"], 6);
        Assert.Equal(100 * 150.0 / 480, slag["SiO2"], 6);
    }
}
