using PartitionService.Core.Equilibrium;

namespace PartitionService.Core.Tests.Equilibrium.Assembly;

public sealed class ActivityIterationTests
{
    [Theory]
    [InlineData(1)]
    [InlineData(60)]
    [InlineData(600)]
    [InlineData(1200)]
    public void Dissolved_oxygen_is_met_exactly(double massPpm)
    {
        var answer = Vessels.Answer(Vessels.Steel with { Oxygen = new OxygenStatement.Dissolved(massPpm) });
        Assert.InRange(answer.Redox.DissolvedOxygenMassPpm!.Value / massPpm, 1 - 1e-9, 1 + 1e-9);
        Assert.Equal(answer.Redox.DissolvedOxygenMassPpm.Value, 1e4 * answer.Metal!.MassPercent("O"), 1e-6);
    }

    /// <summary>Without interactions Henry's law is exact: x_O = pO2^(1/2)/gamma0, ln gamma0 = 5.45578 - 10265.2/T in copper.</summary>
    [Fact]
    public void Without_interactions_oxygen_in_copper_is_henrian_by_hand()
    {
        var answer = Vessels.Answer(Vessels.BlackCopper with
        {
            Charge = [new("Cu", 100), new("N2", 1)],
            Overrides = [new("interaction/Cu/O/O", OverrideKind.Epsilon, 0)],
        });
        var oxygen = answer.Metal!.Species.Single(s => s.Species == "O");
        Assert.Equal(1e-4 / Math.Exp(5.45578 - (10265.2 / 1573)), oxygen.MoleFraction, 1e-12);
    }

    /// <summary>A given epsilon of 20 between lead and tin at the answer's own composition: ln gamma_Pb = ln gamma0 + ln gamma_Cu + 20 x_Sn + ....</summary>
    [Fact]
    public void Coefficients_belong_to_the_answers_own_composition()
    {
        var vessel = new VesselCase
        {
            TemperatureKelvin = 1573,
            Solvent = "Cu",
            Oxygen = new OxygenStatement.Closed(),
            Charge = [new("Cu", 1000), new("Pb", 5), new("Ag", 8)],
            Overrides = [new("interaction/Cu/Ag/Pb", OverrideKind.Epsilon, 20), new("interaction/Cu/Ag/Ag", OverrideKind.Epsilon, 0)],
        };
        var metal = Vessels.Answer(vessel).Metal!.Species.ToDictionary(s => s.Species);
        var solvent = -20 * metal["Ag"].MoleFraction * metal["Pb"].MoleFraction;
        var lead = (2046.44 / 1573) + solvent + (20 * metal["Ag"].MoleFraction);

        // eps x = 0.1: the bounded form differs from the plain one by less than 2e-4 of a term (InteractionModel).
        Assert.Equal(lead, Math.Log(metal["Pb"].ActivityCoefficient!.Value), 20 * metal["Ag"].MoleFraction * 2e-4);
        Assert.Equal(solvent, Math.Log(metal["Cu"].ActivityCoefficient!.Value), 1e-6);
    }
}
