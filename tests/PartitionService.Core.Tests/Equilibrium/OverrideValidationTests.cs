using PartitionService.Core.Equilibrium;

namespace PartitionService.Core.Tests.Equilibrium;

public sealed class OverrideValidationTests
{
    private const string UnknownSlot =
        "must be a slot of the catalogue, or a metal/ or interaction/ slot of known solvent and elements in ordinal order";

    [Theory]
    [InlineData("metal/Cu/Pb", OverrideKind.LnGamma, 60)]
    [InlineData("metal/Cu/Pb", OverrideKind.LnGamma, -60)]
    [InlineData("metal/Pb/W", OverrideKind.LnGamma, 1)]
    [InlineData("slag/iron-silicate/PbO", OverrideKind.LnGamma, 0)]
    [InlineData("slag/chloride-salt/NaCl", OverrideKind.LnGamma, 0)]
    [InlineData("slag/lead-oxide/FeO1.5", OverrideKind.LnGamma, 0)]
    [InlineData("oxidation/PbO", OverrideKind.GibbsEnergy, -5e6)]
    [InlineData("chloride/NaCl", OverrideKind.GibbsEnergy, 5e6)]
    [InlineData("gas/Pb", OverrideKind.GibbsEnergy, 0)]
    [InlineData("interaction/Cu/O/Pb", OverrideKind.Epsilon, -1e6)]
    [InlineData("interaction/Pb/Ag/Ag", OverrideKind.Epsilon, 1e6)]
    public void Slots_of_the_catalogue_and_pairs_it_lacks_are_accepted(string slot, OverrideKind kind, double value) =>
        Assert.Empty(Validate(new DatumOverride(slot, kind, value)));

    [Theory]
    [InlineData("metal/Cu/Pb", OverrideKind.LnGamma, 60.1, "overrides[0].ln_gamma", "60.1", "must be a number in [-60, 60]")]
    [InlineData("metal/Cu/Pb", OverrideKind.LnGamma, double.NaN, "overrides[0].ln_gamma", "NaN", "must be a number in [-60, 60]")]
    [InlineData("interaction/Cu/O/Pb", OverrideKind.Epsilon, -2e6, "overrides[0].epsilon", "-2000000", "must be a number in [-1000000, 1000000]")]
    [InlineData("gas/Pb", OverrideKind.GibbsEnergy, double.PositiveInfinity, "overrides[0].gibbs_energy_joule_per_mol", "Infinity", "must be a number in [-5000000, 5000000]")]
    [InlineData("metal/Cu/Xx", OverrideKind.LnGamma, 0, "overrides[0].slot", "metal/Cu/Xx", UnknownSlot)]
    [InlineData("metal/Cu/Cu", OverrideKind.LnGamma, 0, "overrides[0].slot", "metal/Cu/Cu", UnknownSlot)]
    [InlineData("metal/Cs/Pb", OverrideKind.LnGamma, 0, "overrides[0].slot", "metal/Cs/Pb", UnknownSlot)]
    [InlineData("metal/Cu", OverrideKind.LnGamma, 0, "overrides[0].slot", "metal/Cu", UnknownSlot)]
    [InlineData("slag/glass/PbO", OverrideKind.LnGamma, 0, "overrides[0].slot", "slag/glass/PbO", UnknownSlot)]
    [InlineData("slag/iron-silicate/XxO", OverrideKind.LnGamma, 0, "overrides[0].slot", "slag/iron-silicate/XxO", UnknownSlot)]
    [InlineData("oxidation/XxO", OverrideKind.GibbsEnergy, 0, "overrides[0].slot", "oxidation/XxO", UnknownSlot)]
    [InlineData("interaction/Cu/Pb/O", OverrideKind.Epsilon, 0, "overrides[0].slot", "interaction/Cu/Pb/O", UnknownSlot)]
    [InlineData("capacity/sosinsky-cs", OverrideKind.LnGamma, 0, "overrides[0].slot", "capacity/sosinsky-cs", "must start with metal/, slag/, oxidation/, chloride/, gas/ or interaction/")]
    [InlineData("", OverrideKind.LnGamma, 0, "overrides[0].slot", "", "must start with metal/, slag/, oxidation/, chloride/, gas/ or interaction/")]
    [InlineData("metal/Cu/Pb", OverrideKind.GibbsEnergy, 0, "overrides[0]", "GibbsEnergy", "needs ln_gamma for slot metal/Cu/Pb")]
    [InlineData("interaction/Cu/O/Pb", OverrideKind.LnGamma, 0, "overrides[0]", "LnGamma", "needs epsilon for slot interaction/Cu/O/Pb")]
    [InlineData("oxidation/PbO", OverrideKind.Epsilon, 0, "overrides[0]", "Epsilon", "needs gibbs_energy_joule_per_mol for slot oxidation/PbO")]
    [InlineData("metal/Cu/Pb", OverrideKind.Unstated, 0, "overrides[0]", "", "needs ln_gamma for slot metal/Cu/Pb")]
    public void Each_rule_reports_exactly_its_violation(
        string slot, OverrideKind kind, double value, string field, string text, string allowed) =>
        Assert.Equal([new CaseViolation(field, text, allowed)], Validate(new DatumOverride(slot, kind, value)));

    [Fact]
    public void A_slot_may_stand_once() =>
        Assert.Equal(
            [new CaseViolation("overrides[1].slot", "metal/Cu/Pb", "must not stand twice")],
            Validate(new DatumOverride("metal/Cu/Pb", OverrideKind.LnGamma, 0), new DatumOverride("metal/Cu/Pb", OverrideKind.LnGamma, 1)));

    [Fact]
    public void Long_texts_are_refused_by_their_length()
    {
        var slot = Assert.Single(Validate(new DatumOverride(new string('s', 101), OverrideKind.LnGamma, 0)));
        Assert.Equal(new CaseViolation("overrides[0].slot", "101 characters long", "must have at most 100 characters"), slot);
        var source = Assert.Single(Validate(new DatumOverride("metal/Cu/Pb", OverrideKind.LnGamma, 0, new string('s', 201))));
        Assert.Equal(new CaseViolation("overrides[0].source", "201 characters long", "must have at most 200 characters"), source);
    }

    [Fact]
    public void Too_many_are_counted_and_only_the_first_hundred_read()
    {
        var violations = Validate([.. Enumerable.Repeat(new DatumOverride("gas/Pb", OverrideKind.GibbsEnergy, 0), 150)]);
        Assert.Equal(new CaseViolation("overrides", "150", "must hold at most 100 entries"), violations[0]);
        Assert.Equal(1 + 99, violations.Count);
    }

    private static IReadOnlyList<CaseViolation> Validate(params DatumOverride[] overrides)
    {
        var check = new ViolationList();
        OverrideValidation.Validate(check, overrides, Vessels.Catalogue);
        return check.Violations;
    }
}
