using PartitionService.Core.Equilibrium;

namespace PartitionService.Core.Tests.Equilibrium.Reporting;

public sealed class CautionRulesTests
{
    [Fact]
    public void Hazards_in_the_gas_are_named_with_their_load()
    {
        var answer = Vessels.Answer(Vessels.BlackCopper.Plus(new("As", 3), new("S", 2), new("C", 3)));
        foreach (var element in new[] { "As", "Pb" })
        {
            var caution = answer.Cautions.Single(c => c.Substance == element);
            var load = 1000 * answer.Gas!.Elements.Single(e => e.Element == element).MassKg / answer.Gas.VolumeNormalCubicMetre;
            Assert.Equal(load, caution.LoadGramPerNormalCubicMetre!.Value, 1e-12 * load);
            Assert.Contains("follow local codes and licensed practice", caution.Text, StringComparison.Ordinal);
        }

        foreach (var gas in new[] { "CO", "SO2" })
        {
            Assert.Equal(
                answer.Gas!.Species.Single(s => s.Species == gas).LoadGramPerNormalCubicMetre,
                answer.Cautions.Single(c => c.Substance == gas).LoadGramPerNormalCubicMetre);
        }
    }

    [Fact]
    public void Chlorine_with_carbon_warns_of_dioxins()
    {
        Assert.Contains(Vessels.Answer(Vessels.BlackCopper.Plus(new("NaCl", 1), new("C", 1))).Cautions, c => c.Substance == "dioxins");
        Assert.DoesNotContain(Vessels.Answer(Vessels.BlackCopper.Plus(new ChargeItem("C", 1))).Cautions, c => c.Substance == "dioxins");
    }

    [Fact]
    public void Dust_is_warned_of_without_a_load()
    {
        var answer = Vessels.Answer(Vessels.Lead with { Allowances = new() { MechanicalDustMassFraction = 0.01 } });
        var lead = answer.Cautions.Single(c => c.Substance == "Pb");
        Assert.Null(lead.LoadGramPerNormalCubicMetre);
        Assert.Contains("mechanical dust", lead.Text, StringComparison.Ordinal);
    }

    [Fact]
    public void The_general_caution_always_stands_last_and_is_no_permit()
    {
        var caution = Assert.Single(Vessels.Answer(Vessels.Lead).Cautions);
        Assert.Contains("not a permit to operate", caution.Text, StringComparison.Ordinal);
        Assert.Equal(caution, Vessels.Answer(Vessels.BlackCopper).Cautions[^1]);
    }
}
