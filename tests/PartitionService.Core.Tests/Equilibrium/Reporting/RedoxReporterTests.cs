using PartitionService.Core.Equilibrium;

namespace PartitionService.Core.Tests.Equilibrium.Reporting;

public sealed class RedoxReporterTests
{
    /// <summary>What the answer says must be blown in is charged as O2; the closed balance then finds the stated potential.</summary>
    [Fact]
    public void Oxygen_to_supply_closes_the_balance()
    {
        var stated = Vessels.Answer(Vessels.BlackCopper);
        Assert.True(stated.Redox.OxygenToSupplyKg > 0);
        var closed = Vessels.Answer(
            Vessels.BlackCopper.Plus(new ChargeItem("O2", stated.Redox.OxygenToSupplyNormalCubicMetre, ChargeUnit.NormalCubicMetre))
            with
            { Oxygen = new OxygenStatement.Closed() });
        Assert.Equal(-8, closed.Redox.Log10OxygenPressureAtm!.Value, 8);
        Assert.Equal(0, closed.Redox.OxygenToSupplyKg);
        Assert.Equal(stated.Row("Pb").MetalFraction, closed.Row("Pb").MetalFraction, 8);
    }

    [Fact]
    public void Oxygen_is_removed_where_the_charge_brings_too_much() =>
        Assert.True(Vessels.Answer(Vessels.BlackCopper.Plus(new ChargeItem("Fe2O3", 100))).Redox.OxygenToSupplyKg < 0);

    [Fact]
    public void Supply_is_the_difference_between_held_and_charged_oxygen()
    {
        var answer = Vessels.Answer(Vessels.BlackCopper);
        var held = answer.Metal!.Elements.Concat(answer.Slag!.Elements).Concat(answer.Gas!.Elements)
            .Where(e => e.Element == "O").Sum(e => e.MassKg);
        var charged = (300 * 15.999 / 71.844) + (150 * 31.998 / 60.083);
        Assert.Equal(held - charged, answer.Redox.OxygenToSupplyKg, 1e-3);
        Assert.Equal(held, answer.Row("O").InputKg, 9);
    }

    /// <summary>RT ln pO2 at log10 pO2 = -8 and 1573 K by hand: -240.9 kJ/mol; 1 kg of O2 is 0.70045 Nm3.</summary>
    [Fact]
    public void Potential_and_volume_by_hand()
    {
        var redox = Vessels.Answer(Vessels.BlackCopper).Redox;
        Assert.Equal(-240.9, redox.OxygenPotentialKilojoulePerMol!.Value, 0.05);
        Assert.Equal(0.70045, redox.OxygenToSupplyNormalCubicMetre / redox.OxygenToSupplyKg, 0.00005);
    }

    [Fact]
    public void Ratios_are_those_of_the_statement()
    {
        var carbon = Vessels.Answer(Vessels.BlackCopper with { Oxygen = new OxygenStatement.CarbonDioxideToMonoxide(7) });
        Assert.Equal(7, carbon.Redox.CarbonDioxideToMonoxide!.Value, 9);
        var hydrogen = Vessels.Answer(Vessels.BlackCopper with { Oxygen = new OxygenStatement.WaterToHydrogen(3) });
        Assert.Equal(3, hydrogen.Redox.WaterToHydrogen!.Value, 9);
    }

    [Fact]
    public void Without_oxygen_there_is_no_potential()
    {
        var redox = Vessels.Answer(Vessels.Lead).Redox;
        Assert.Null(redox.Log10OxygenPressureAtm);
        Assert.Null(redox.DissolvedOxygenMassPpm);
        Assert.Equal(0, redox.OxygenToSupplyKg);
    }
}
