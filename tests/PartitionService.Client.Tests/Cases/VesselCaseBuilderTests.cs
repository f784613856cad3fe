using Google.Protobuf;
using Google.Protobuf.Reflection;
using PartitionService.Client.Cases;
using PartitionService.Contracts.V1;

namespace PartitionService.Client.Tests.Cases;

public sealed class VesselCaseBuilderTests
{
    [Fact]
    public void States_a_case_in_a_few_lines()
    {
        var built = VesselCaseBuilder.Named("Furnace 2").At(1573.15).Charge("Cu", kg: 1000).Charge("PbO", kg: 5).Blow("air", normalCubicMetres: 30)
            .Solvent("Cu").UnderSlag("iron-silicate").WithGas().OxygenPressure(log10Atm: -7).EntrainTypicalMetal().Build();

        var expected = new VesselCase
        {
            Name = "Furnace 2",
            TemperatureKelvin = 1573.15,
            Charge =
            {
                new ChargeItem { Formula = "Cu", MassKg = 1000 },
                new ChargeItem { Formula = "PbO", MassKg = 5 },
                new ChargeItem { Formula = "air", VolumeNormalCubicMetre = 30 },
            },
            Metal = new MetalBath { Solvent = "Cu" },
            Slag = new SlagBath { Family = "iron-silicate" },
            Gas = new GasAtmosphere(),
            Oxygen = new OxygenStatement { Log10Po2Atm = -7 },
            Allowances = new PracticeAllowances { MetalInSlag = new EntrainedMetal { FamilyTypical = true } },
        };
        Assert.Equal(expected, built);
    }

    [Fact]
    public void Covers_every_field_of_the_contract()
    {
        var covered = new HashSet<string>();
        foreach (var built in CasesWithEveryField())
            CollectSetFields(built, covered);

        var all = new HashSet<string>();
        CollectAllFields(VesselCase.Descriptor, all);
        Assert.Equal(all.Order(), covered.Order());
    }

    [Fact]
    public void Refuses_a_second_statement_about_oxygen()
    {
        var builder = Complete().OxygenPressure(-7);

        var fault = Assert.Throws<InvalidOperationException>(() => builder.ClosedOxygenBalance());

        Assert.Equal("Oxygen is stated already, as Log10Po2Atm; a vessel takes one statement.", fault.Message);
    }

    [Fact]
    public void Names_all_that_is_missing()
    {
        var fault = Assert.Throws<InvalidOperationException>(() => VesselCaseBuilder.Named("").Build());

        Assert.Equal(
            "The case lacks the temperature (At), a charge (Charge or Blow), a statement about oxygen (for example OxygenPressure or ClosedOxygenBalance).",
            fault.Message);
    }

    [Theory]
    [InlineData(double.NaN)]
    [InlineData(double.PositiveInfinity)]
    [InlineData(double.NegativeInfinity)]
    public void Refuses_numbers_that_are_not_finite(double value)
    {
        Action[] statements =
        [
            () => Complete().At(value), () => Complete().UnderPressure(value), () => Complete().Charge("Cu", value), () => Complete().Blow("air", value),
            () => Complete().OxygenPressure(value), () => Complete().CarbonDioxideToMonoxide(value), () => Complete().SteamToHydrogen(value),
            () => Complete().OxygenFromPair("FeO", value), () => Complete().OxygenFromPair("FeO", 1, value), () => Complete().DissolvedOxygen(value),
            () => Complete().EntrainMetal(value), () => Complete().EntrainSlag(value), () => Complete().LoseToDust(value), () => Complete().ReachOnly("Sn", value),
            () => Complete().OverrideLnGamma("metal/Cu/Pb", value), () => Complete().OverrideGibbsEnergy("oxidation/PbO", value),
            () => Complete().OverrideInteraction("interaction/Cu/O/Sn", value),
        ];

        Assert.All(statements, statement => Assert.Throws<ArgumentOutOfRangeException>(statement));
    }

    [Fact]
    public void Built_cases_do_not_change_with_later_statements()
    {
        var builder = Complete().ClosedOxygenBalance();
        var before = builder.Build();

        builder.Charge("Pb", 1).WithGas();

        Assert.Single(before.Charge);
        Assert.Null(before.Gas);
    }

    private static VesselCaseBuilder Complete() => VesselCaseBuilder.Named("x").At(1500).Charge("Cu", 1);

    private static IEnumerable<VesselCase> CasesWithEveryField()
    {
        yield return Complete().UnderPressure(2).Blow("air", 1).Solvent("Cu").UnderSlag("iron-silicate").WithGas().OxygenPressure(-7)
            .EntrainTypicalMetal().EntrainSlag(1).LoseToDust(0.01).ReachOnly("Sn", 0.8)
            .OverrideLnGamma("metal/Cu/Pb", 1, "assays").OverrideGibbsEnergy("oxidation/PbO", -7e4).OverrideInteraction("interaction/Cu/O/Sn", -4).Build();
        yield return Complete().CarbonDioxideToMonoxide(3).EntrainMetal(2).Build();
        yield return Complete().SteamToHydrogen(3).Build();
        yield return Complete().OxygenFromPair("FeO", 0.3, 0.9).Build();
        yield return Complete().DissolvedOxygen(600).Build();
        yield return Complete().ClosedOxygenBalance().Build();
    }

    private static void CollectSetFields(IMessage message, HashSet<string> names)
    {
        foreach (var field in message.Descriptor.Fields.InDeclarationOrder())
        {
            var value = field.Accessor.GetValue(message);
            var isSet = field.IsRepeated ? ((System.Collections.IList)value).Count > 0 : field.HasPresence ? field.Accessor.HasValue(message) : value is not ("" or 0.0);
            if (!isSet)
                continue;
            names.Add(field.FullName);
            foreach (var inner in value is System.Collections.IList list ? list.OfType<IMessage>() : new[] { value }.OfType<IMessage>())
                CollectSetFields(inner, names);
        }
    }

    private static void CollectAllFields(MessageDescriptor descriptor, HashSet<string> names)
    {
        foreach (var field in descriptor.Fields.InDeclarationOrder())
        {
            names.Add(field.FullName);
            if (field.FieldType == FieldType.Message)
                CollectAllFields(field.MessageType, names);
        }
    }
}
