using PartitionService.Core.Catalogue;
using PartitionService.Core.Equilibrium;

namespace PartitionService.Core.Tests.Equilibrium.Reporting;

public sealed class AnswerBuilderTests
{
    private static readonly VesselAnswer Answer = Vessels.Answer(
        Vessels.BlackCopper.Plus(new("Zn", 5), new("K2O", 1), new("C", 1))
        with
        {
            Allowances = new()
            {
                MetalInSlagMassPercent = 2,
                SlagInMetalMassPercent = 1,
                MechanicalDustMassFraction = 0.01,
                StageEfficiencies = [new("Zn", 0.5)],
            },
        });

    [Fact]
    public void The_six_fractions_of_every_element_add_up_to_one() => Assert.All(
        Answer.Elements,
        row => Assert.Equal(
            1,
            row.MetalFraction + row.SlagFraction + row.GasFraction + row.MechanicalDustFraction + row.UnburntCarbonFraction
            + row.UnplacedFraction,
            12));

    [Fact]
    public void Every_balance_closes() => Assert.InRange(Answer.Solution.LargestBalanceError, 0, 1e-10);

    [Fact]
    public void Elements_stand_by_falling_input()
    {
        Assert.Equal(Answer.Elements.OrderByDescending(e => e.InputKg).ThenBy(e => e.Element, StringComparer.Ordinal), Answer.Elements);
        Assert.Equal(1000, Answer.Row("Cu").InputKg, 9);
    }

    [Fact]
    public void Contents_of_a_phase_add_up_and_stand_by_falling_mass()
    {
        foreach (var phase in new[] { Answer.Metal!, Answer.Slag! })
        {
            Assert.Equal(100, phase.Elements.Sum(e => e.MassPercent), 9);
            Assert.Equal(phase.MassKg, phase.Elements.Sum(e => e.MassKg), 8);
            Assert.Equal(phase.Elements.OrderByDescending(e => e.MassKg), phase.Elements);
            Assert.Equal(1, phase.Species.Sum(s => s.MoleFraction), 9);
        }
    }

    [Fact]
    public void Contents_of_the_rows_are_those_of_the_phases()
    {
        Assert.Equal(1e4 * Answer.Metal!.MassPercent("Pb"), Answer.Row("Pb").MetalMassPpm!.Value, 6);
        Assert.Equal(1e4 * Answer.Slag!.MassPercent("Pb"), Answer.Row("Pb").SlagMassPpm!.Value, 6);
    }

    [Fact]
    public void All_mass_that_goes_in_comes_out()
    {
        var input = Answer.Elements.Sum(e => e.InputKg);
        var output = Answer.Metal!.MassKg + Answer.Slag!.MassKg + Answer.Gas!.MassKg + Answer.MechanicalDustKg + Answer.UnburntCarbonKg;
        Assert.Equal(input, output, 7);
    }

    [Fact]
    public void Loss_of_the_solvent_is_what_does_not_leave_with_the_metal()
    {
        var loss = Answer.SolventLoss;
        Assert.Equal(1000, loss.InputKg, 9);
        Assert.Equal(1000 * Answer.Row("Cu").MechanicalDustFraction, loss.MechanicalDustKg, 9);
        Assert.Equal(1000 * Answer.Row("Cu").SlagFraction, loss.DissolvedInSlagKg + loss.EntrainedInSlagKg, 8);
        Assert.Equal(1 - Answer.Row("Cu").MetalFraction, loss.LossFraction, 10);
    }

    [Fact]
    public void Data_used_are_listed_once_by_key_and_the_weakest_access_is_among_them()
    {
        Assert.Equal(Answer.DataUsed.Count, Answer.DataUsed.Select(d => d.Key).Distinct().Count());
        Assert.Equal(Answer.DataUsed.Max(d => d.Access), Answer.WeakestAccess);
        Assert.All(Answer.DataUsed, d => Assert.NotNull(Vessels.Catalogue.Find(d.Key)));
        Assert.Contains(Answer.DataUsed, d => d.Key == "metal/Cu/Pb#1" || d.Key.StartsWith("metal/Cu/Pb#", StringComparison.Ordinal));
    }

    [Fact]
    public void Identity_of_the_case_and_of_the_catalogue_are_passed_on()
    {
        Assert.Equal("black copper", Answer.Name);
        Assert.Equal(CatalogueLoader.LoadEmbedded().Digest, Answer.CatalogueDigest);
        Assert.Equal(("Cu", "iron-silicate", 1573.0, 1.0), (Answer.Solvent, Answer.SlagFamily, Answer.TemperatureKelvin, Answer.PressureAtm));
    }

    /// <summary>FeO's coefficient depends on the slag: the datum is reported at the final composition, as the species is.</summary>
    [Fact]
    public void A_datum_that_depends_on_composition_is_reported_at_the_final_one()
    {
        var species = Answer.Slag!.Species.Single(s => s.Species == "FeO");
        var datum = Answer.DataUsed.Single(d => d.Key.StartsWith("slag/iron-silicate/FeO#", StringComparison.Ordinal));
        Assert.Equal(Math.Log(species.ActivityCoefficient!.Value), datum.Value, 8);
    }
}
