using PartitionService.Core.Equilibrium;

namespace PartitionService.Core.Tests.Equilibrium.Reporting;

/// <summary>For every remark a small real case that brings it, and one beside it that does not.</summary>
public sealed class RemarkRulesTests
{
    private static readonly Dictionary<RemarkCode, (VesselCase With, VesselCase Without, string Element)> Cases = new()
    {
        [RemarkCode.BeyondHenrianRange] = (CopperWith(new ChargeItem("Pb", 300)), CopperWith(new ChargeItem("Pb", 1)), "Pb"),
        [RemarkCode.ExtrapolatedInTemperature] = (
            CopperWith(new ChargeItem("Pb", 1)) with { TemperatureKelvin = 1773 }, CopperWith(new ChargeItem("Pb", 1)), "Pb"),
        [RemarkCode.ExtrapolatedInComposition] = (LeadSlag(lime: 1), LeadSlag(lime: 15), "Pb"),
        [RemarkCode.DatumAssumed] = (CopperWith(new ChargeItem("Se", 1)), CopperWith(new ChargeItem("Pb", 1)), "Se"),
        [RemarkCode.DatumMissing] = (Vessels.Lead.Plus(new ChargeItem("W", 1)), Vessels.Lead, "W"),
        [RemarkCode.FromMemory] = (Vessels.Lead.Plus(new ChargeItem("As", 0.01)), Vessels.Lead, ""),
        [RemarkCode.ActivityAboveOne] = (Vessels.Lead.Plus(new ChargeItem("Fe", 1)), Vessels.Lead.Plus(new ChargeItem("Fe", 1e-5)), "Fe"),
        [RemarkCode.SolubilityExceeded] = (Vessels.Lead.Plus(new ChargeItem("Fe", 1)), Vessels.Lead.Plus(new ChargeItem("Fe", 1e-5)), "Fe"),
        [RemarkCode.NoGasToBoilInto] = (
            CopperWith(new ChargeItem("Zn", 200)), CopperWith(new ChargeItem("Zn", 200)) with { GasAllowed = true }, "Zn"),
        [RemarkCode.PhaseAbsent] = (Vessels.Lead with { GasAllowed = true }, Vessels.Lead, ""),
        [RemarkCode.MetalConsumed] = (
            LeadSlag(lime: 15) with { Oxygen = new OxygenStatement.Pressure(-2) }, LeadSlag(lime: 15), "Pb"),
        [RemarkCode.InteractionBounded] = (
            CopperWith(new("Pb", 5), new("Sn", 5)) with { Overrides = [new("interaction/Cu/Pb/Sn", OverrideKind.Epsilon, 5000)] },
            CopperWith(new("Pb", 5), new("Sn", 5)),
            "Pb"),
        [RemarkCode.DatumOverridden] = (
            Vessels.Lead with { Overrides = [new("metal/Pb/Ag", OverrideKind.LnGamma, 1)] }, Vessels.Lead, "Ag"),
        [RemarkCode.DatumFlagged] = (Vessels.BlackCopper, Vessels.Lead, "Sn"),
        [RemarkCode.UnburntCarbon] = (Vessels.BlackCopper.Plus(new ChargeItem("C", 200)) with { Oxygen = new OxygenStatement.Closed() },
            Vessels.BlackCopper.Plus(new ChargeItem("C", 1)), "C"),
        [RemarkCode.CarriedAsInert] = (Vessels.BlackCopper.Plus(new ChargeItem("K2O", 5)), Vessels.BlackCopper, "K"),
        [RemarkCode.AllowanceLimited] = (
            Vessels.BlackCopper with { Allowances = new() { MetalInSlagMassPercent = 90 } },
            Vessels.BlackCopper with { Allowances = new() { MetalInSlagMassPercent = 1 } },
            ""),
        [RemarkCode.ConcentratedMetal] = (CopperWith(new ChargeItem("Pb", 1000)), CopperWith(new ChargeItem("Pb", 1)), "Cu"),
        [RemarkCode.SlagOutsideFamily] = (Vessels.BlackCopper.Plus(new ChargeItem("CaO", 200)), Vessels.BlackCopper, "Ca"),
        [RemarkCode.EntrainmentIgnored] = (
            Vessels.BlackCopper.Plus(new ChargeItem("Ag", 1)),
            Vessels.BlackCopper.Plus(new ChargeItem("Ag", 1)) with { Allowances = new() { MetalInSlagTypical = true } },
            "Ag"),
    };

    public static TheoryData<RemarkCode> Codes => [.. Enum.GetValues<RemarkCode>()];

    [Theory]
    [MemberData(nameof(Codes))]
    public void Each_remark_comes_where_it_should(RemarkCode code)
    {
        var (with, _, element) = Cases[code];
        var remarks = Vessels.Answer(with).Remarks(code).ToArray();
        Assert.Contains(remarks, remark => remark.Element == element);
        Assert.All(remarks, remark =>
        {
            Assert.True(Enum.IsDefined(remark.Severity));
            Assert.EndsWith(".", remark.Text, StringComparison.Ordinal);
            Assert.DoesNotContain("NaN", remark.Text, StringComparison.Ordinal);
        });
    }

    [Theory]
    [MemberData(nameof(Codes))]
    public void Each_remark_stays_away_where_it_should(RemarkCode code)
    {
        var (_, without, element) = Cases[code];
        Assert.DoesNotContain(Vessels.Answer(without).Remarks(code), remark => remark.Element == element);
    }

    [Fact]
    public void The_most_severe_stand_first()
    {
        var severities = Vessels.Answer(Cases[RemarkCode.UnburntCarbon].With).Remarks.Select(r => r.Severity).ToArray();
        Assert.True(severities.Distinct().Count() > 1);
        Assert.Equal(severities.OrderDescending(), severities);
    }

    /// <summary>Regression: the names stood in the order of the species, so the subject was no slot (interaction/Cu/Si/O).</summary>
    [Fact]
    public void Subject_of_a_bounded_interaction_was_no_slot()
    {
        var remarks = Vessels.Answer(Vessels.BlackCopper).Remarks(RemarkCode.InteractionBounded).ToArray();
        Assert.NotEmpty(remarks);
        Assert.All(remarks, remark => Assert.NotEmpty(Vessels.Catalogue.Slot(remark.Subject)));
    }

    [Fact]
    public void An_override_that_nothing_asks_for_is_warned_of()
    {
        var answer = Vessels.Answer(Vessels.Lead with { Overrides = [new("metal/Cu/Pb", OverrideKind.LnGamma, 1)] });
        var remark = Assert.Single(answer.Remarks(RemarkCode.DatumOverridden));
        Assert.Equal((Severity.Warning, "metal/Cu/Pb"), (remark.Severity, remark.Subject));
    }

    private static VesselCase CopperWith(params ChargeItem[] items) => new()
    {
        TemperatureKelvin = 1473,
        Solvent = "Cu",
        Oxygen = new OxygenStatement.Closed(),
        Charge = [new("Cu", 1000), .. items],
    };

    private static VesselCase LeadSlag(double lime) => new()
    {
        TemperatureKelvin = 1523,
        Solvent = "Pb",
        SlagFamily = "lead-smelting",
        Oxygen = new OxygenStatement.Pressure(-10),
        Charge = [new("Pb", 100), new("FeO", 34), new("SiO2", 24), new("CaO", lime), new("ZnO", 14)],
    };
}
