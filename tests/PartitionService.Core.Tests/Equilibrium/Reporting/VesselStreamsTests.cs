namespace PartitionService.Core.Tests.Equilibrium.Reporting;

/// <summary>Entrainment does not touch the equilibrium: it moves shares of the finished phases.</summary>
public sealed class VesselStreamsTests
{
    [Theory]
    [InlineData(2, 0)]
    [InlineData(0, 1)]
    [InlineData(5, 3)]
    public void Droplets_are_exactly_the_mass_percent_of_the_leaving_phases(double metalInSlag, double slagInMetal)
    {
        var answer = Vessels.Answer(Vessels.BlackCopper with
        {
            Allowances = new() { MetalInSlagMassPercent = metalInSlag, SlagInMetalMassPercent = slagInMetal },
        });
        var report = answer.Allowances!;
        Assert.Equal(metalInSlag, 100 * report.MetalInSlagKg / answer.Slag!.MassKg, 9);
        Assert.Equal(slagInMetal, 100 * report.SlagInMetalKg / answer.Metal!.MassKg, 9);
        Assert.Equal((metalInSlag, slagInMetal), (report.MetalInSlagMassPercent, report.SlagInMetalMassPercent));
    }

    [Fact]
    public void Droplets_have_the_composition_of_the_clean_metal()
    {
        var clean = Vessels.Answer(Vessels.BlackCopper);
        var mixed = Vessels.Answer(Vessels.BlackCopper with { Allowances = new() { MetalInSlagMassPercent = 4 } });
        var (metal, slag) = (clean.Metal!, clean.Slag!);
        Assert.Equal(metal.MassPercent("Pb"), mixed.Metal!.MassPercent("Pb"), 10);
        Assert.Equal((0.96 * slag.MassPercent("Pb")) + (0.04 * metal.MassPercent("Pb")), mixed.Slag!.MassPercent("Pb"), 10);
        Assert.Equal(clean.Row("Pb").PartitionRatioSlagToMetal, mixed.Row("Pb").PartitionRatioSlagToMetal);
        Assert.Equal(metal.MassKg + slag.MassKg, mixed.Metal!.MassKg + mixed.Slag!.MassKg, 8);
    }

    /// <summary>90 % droplets in 469 kg of slag would need 4200 kg of metal: all 1000 kg go, and the answer says so.</summary>
    [Fact]
    public void More_than_there_is_is_limited()
    {
        var clean = Vessels.Answer(Vessels.BlackCopper);
        var answer = Vessels.Answer(Vessels.BlackCopper with { Allowances = new() { MetalInSlagMassPercent = 90 } });
        Assert.Equal(clean.Metal!.MassKg, answer.Allowances!.MetalInSlagKg, 8);
        Assert.Null(answer.Metal);
        Assert.Equal(1, answer.Row("Cu").SlagFraction + answer.Row("Cu").GasFraction, 10);
    }

    [Fact]
    public void Typical_droplets_are_the_familys()
    {
        var answer = Vessels.Answer(Vessels.BlackCopper with { Allowances = new() { MetalInSlagTypical = true } });
        Assert.Equal(0.5, answer.Allowances!.MetalInSlagMassPercent);
        Assert.Equal("entrainment/secondary-copper-black-copper", answer.Allowances.MetalInSlagSlot);
    }

    [Fact]
    public void What_bypasses_stays_in_the_phase_it_came_with()
    {
        var answer = Vessels.Answer(Vessels.BlackCopper with { Allowances = new() { StageEfficiencies = [new("Pb", 0)] } });
        Assert.Equal(1, answer.Row("Pb").MetalFraction, 12);
        Assert.Null(answer.Row("Pb").PartitionRatioSlagToMetal);
        var applied = Assert.Single(answer.Allowances!.StageEfficiencies);
        Assert.Equal(("Pb", 0.0), (applied.Element, applied.Efficiency));
        Assert.Equal(10, applied.BypassedKg, 9);
    }

    [Fact]
    public void Dust_leaves_unreacted()
    {
        var answer = Vessels.Answer(Vessels.BlackCopper with { Allowances = new() { MechanicalDustMassFraction = 0.02 } });
        Assert.Equal(0.02, answer.Row("Pb").MechanicalDustFraction, 12);
        Assert.Equal(0.02 * (1000 + 10 + 5 + 300 + 150), answer.MechanicalDustKg, 9);
        Assert.Equal(0, answer.Row("N").MechanicalDustFraction);
    }

    [Fact]
    public void Without_allowances_there_is_no_report_of_them() => Assert.Null(Vessels.Answer(Vessels.BlackCopper).Allowances);
}
