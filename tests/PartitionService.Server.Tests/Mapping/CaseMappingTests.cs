using PartitionService.Core.Equilibrium;
using PartitionService.Server.Mapping;
using Wire = PartitionService.Contracts.V1;

namespace PartitionService.Server.Tests.Mapping;

public sealed class CaseMappingTests
{
    [Fact]
    public void Unset_fields_take_the_defaults_of_the_core()
    {
        var mapped = Map(new Wire.VesselCase());
        Assert.Equal("", mapped.Name);
        Assert.Equal(1, mapped.PressureAtm);
        Assert.Null(mapped.Solvent);
        Assert.Null(mapped.SlagFamily);
        Assert.False(mapped.GasAllowed);
        Assert.Same(PracticeAllowances.None, mapped.Allowances);
        Assert.Empty(mapped.Charge);
        Assert.Empty(mapped.Overrides);
    }

    [Fact]
    public void Pressure_that_is_sent_as_zero_is_not_taken_for_unset() =>
        Assert.Equal(0, Map(new Wire.VesselCase { PressureAtm = 0 }).PressureAtm);

    [Fact]
    public void Metal_with_an_empty_solvent_leaves_the_choice_to_the_core() =>
        Assert.Null(Map(new Wire.VesselCase { Metal = new Wire.MetalBath() }).Solvent);

    [Fact]
    public void Every_field_is_taken_over()
    {
        var mapped = Map(new Wire.VesselCase
        {
            Name = "n",
            TemperatureKelvin = 1500,
            PressureAtm = 0.5,
            Metal = new Wire.MetalBath { Solvent = "Pb" },
            Slag = new Wire.SlagBath { Family = "f" },
            Gas = new Wire.GasAtmosphere(),
            Charge = { new Wire.ChargeItem { Formula = "Pb", MassKg = 2 }, new Wire.ChargeItem { Formula = "air", VolumeNormalCubicMetre = 3 } },
            Overrides =
            {
                new Wire.DatumOverride { Slot = "a", LnGamma = 1, Source = "plant" },
                new Wire.DatumOverride { Slot = "b", GibbsEnergyJoulePerMol = 2 },
                new Wire.DatumOverride { Slot = "c", Epsilon = 3 },
                new Wire.DatumOverride { Slot = "d" },
            },
        });
        Assert.Equal(("n", 1500, 0.5, "Pb", "f", true), (mapped.Name, mapped.TemperatureKelvin, mapped.PressureAtm, mapped.Solvent, mapped.SlagFamily, mapped.GasAllowed));
        Assert.Equal([new ChargeItem("Pb", 2), new ChargeItem("air", 3, ChargeUnit.NormalCubicMetre)], mapped.Charge);
        Assert.Equal(
            [
                new DatumOverride("a", OverrideKind.LnGamma, 1, "plant"),
                new DatumOverride("b", OverrideKind.GibbsEnergy, 2, "caller"),
                new DatumOverride("c", OverrideKind.Epsilon, 3, "caller"),
                new DatumOverride("d", OverrideKind.Unstated, 0, "caller"),
            ],
            mapped.Overrides);
    }

    [Fact]
    public void Quantity_that_is_not_stated_is_told_from_zero()
    {
        var mapped = Map(new Wire.VesselCase { Charge = { new Wire.ChargeItem { Formula = "Cu" }, new Wire.ChargeItem { Formula = "Cu", MassKg = 0 } } });
        Assert.Equal([ChargeUnit.Unstated, ChargeUnit.Kilogram], mapped.Charge.Select(c => c.Unit));
    }

    public static TheoryData<Wire.OxygenStatement?, OxygenStatement> Statements => new()
    {
        { null, new OxygenStatement.Unstated() },
        { new Wire.OxygenStatement(), new OxygenStatement.Unstated() },
        { new Wire.OxygenStatement { Log10Po2Atm = 0 }, new OxygenStatement.Pressure(0) },
        { new Wire.OxygenStatement { Co2ToCoRatio = 2 }, new OxygenStatement.CarbonDioxideToMonoxide(2) },
        { new Wire.OxygenStatement { H2OToH2Ratio = 3 }, new OxygenStatement.WaterToHydrogen(3) },
        { new Wire.OxygenStatement { DissolvedOxygenMassPpm = 4 }, new OxygenStatement.Dissolved(4) },
        { new Wire.OxygenStatement { ClosedBalance = new Wire.ClosedOxygenBalance() }, new OxygenStatement.Closed() },
        { new Wire.OxygenStatement { MetalOxidePair = new Wire.MetalOxidePair { Oxide = "FeO" } }, new OxygenStatement.MetalOxidePair("FeO") },
        {
            new Wire.OxygenStatement { MetalOxidePair = new Wire.MetalOxidePair { Oxide = "FeO", OxideActivity = 0.3, MetalActivity = 0.4 } },
            new OxygenStatement.MetalOxidePair("FeO", 0.3, 0.4)
        },
    };

    [Theory]
    [MemberData(nameof(Statements), DisableDiscoveryEnumeration = true)]
    public void Statement_about_oxygen_keeps_its_kind_and_numbers(Wire.OxygenStatement? sent, OxygenStatement expected) =>
        Assert.Equal(expected, OxygenMapping.ToStatement(sent));

    [Fact]
    public void Every_kind_of_statement_is_covered_above() =>
        Assert.Equal(
            typeof(OxygenStatement).GetNestedTypes().Select(t => t.Name).Order(),
            Statements.Select(row => row[1].GetType().Name).Distinct().Order());

    [Fact]
    public void Allowances_are_taken_over()
    {
        var mapped = Map(new Wire.VesselCase
        {
            Allowances = new Wire.PracticeAllowances
            {
                MetalInSlag = new Wire.EntrainedMetal { MassPercent = 5 },
                SlagInMetalMassPercent = 2,
                MechanicalDustMassFraction = 0.01,
                StageEfficiencies = { new Wire.StageEfficiency { Element = "Zn", Efficiency = 0.6 } },
            },
        }).Allowances;
        Assert.Equal((5, false, 2, 0.01), (mapped.MetalInSlagMassPercent, mapped.MetalInSlagTypical, mapped.SlagInMetalMassPercent, mapped.MechanicalDustMassFraction));
        Assert.Equal([new StageEfficiency("Zn", 0.6)], mapped.StageEfficiencies);
        Assert.True(Map(new Wire.VesselCase
        {
            Allowances = new Wire.PracticeAllowances { MetalInSlag = new Wire.EntrainedMetal { FamilyTypical = true } },
        }).Allowances.MetalInSlagTypical);
    }

    private static VesselCase Map(Wire.VesselCase sent)
    {
        var violations = new List<CaseViolation>();
        var mapped = CaseMapping.ToCase(sent, violations);
        Assert.Empty(violations);
        return mapped;
    }
}
