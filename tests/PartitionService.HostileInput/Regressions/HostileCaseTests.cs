using Google.Protobuf;
using Google.Rpc;
using Grpc.Core;
using PartitionService.Contracts.V1;
using PartitionService.HostileInput.Checking;
using PartitionService.HostileInput.Mutation;
using PartitionService.HostileInput.Running;

namespace PartitionService.HostileInput.Regressions;

/// <summary>What the hostile runs found in cases, each as small as it goes.</summary>
public sealed class HostileCaseTests : IDisposable
{
    private readonly DirectService service = new();

    public void Dispose() => service.Dispose();

    [Theory]
    [InlineData(5e-324)]
    [InlineData(1e-310)]
    [InlineData(9.9e-28)]
    public async Task Mass_below_an_atoms_did_not_converge(double massKg)
    {
        var vessel = SeedMessages.Vessels[1].Clone();
        vessel.Charge[2].MassKg = massKg;
        var violation = Assert.Single((await RefusalOfAsync(vessel)).GetDetail<BadRequest>().FieldViolations);
        Assert.Equal("vessel_case.charge[2].mass_kg", violation.Field);
        Assert.EndsWith("must be 0 or a number in [1E-27, 1000000000]", violation.Description, StringComparison.Ordinal);
    }

    [Fact]
    public async Task Smallest_mass_of_every_item_of_every_example_converges()
    {
        foreach (var example in SeedMessages.Vessels)
        {
            for (var item = 0; item < example.Charge.Count; item++)
            {
                var vessel = example.Clone();
                if (vessel.Charge[item].QuantityCase == ChargeItem.QuantityOneofCase.MassKg)
                    vessel.Charge[item].MassKg = 1e-27;
                else
                    vessel.Charge[item].VolumeNormalCubicMetre = 1e-27;
                var reply = await SolveAsync(vessel);
                Assert.True(reply.Code is StatusCode.OK or StatusCode.FailedPrecondition, $"{reply.Code} with a trace of item {item} of {vessel.Name}");
            }
        }
    }

    [Fact]
    public async Task Stage_efficiency_below_rounding_did_not_converge()
    {
        var vessel = SeedMessages.Vessels[1].Clone();
        vessel.Allowances ??= new PracticeAllowances();
        vessel.Allowances.StageEfficiencies.Clear();
        vessel.Allowances.StageEfficiencies.Add(new StageEfficiency { Element = "Sn", Efficiency = double.Epsilon });
        Assert.Equal(StatusCode.OK, (await SolveAsync(vessel)).Code);
    }

    [Theory]
    [InlineData("ferrous-calcium-silicate")]
    [InlineData("lead-smelting")]
    public async Task Slag_without_the_oxide_of_a_ratio_had_a_remark_with_a_number_that_is_none(string family)
    {
        var vessel = SeedMessages.Vessels.Single(v => v.Metal?.Solvent == "Pb").Clone();
        vessel.Slag = new SlagBath { Family = family };
        var reply = await SolveAsync(vessel);
        Assert.Equal(StatusCode.OK, reply.Code);
        Assert.Null(FiniteNumbers.FindBad(reply.Answer!));
    }

    [Theory]
    [InlineData(1.7e-8)]
    [InlineData(1e-12)]
    public async Task Slag_of_sulfide_alone_held_less_than_no_oxygen(double h2oToH2Ratio)
    {
        var vessel = SeedMessages.Vessels.Single(v => v.Metal?.Solvent == "Fe").Clone();
        vessel.Oxygen = new OxygenStatement { H2OToH2Ratio = h2oToH2Ratio };
        var reply = await SolveAsync(vessel);
        Assert.True(reply.Code is StatusCode.OK or StatusCode.FailedPrecondition, $"{reply.Code}");
        Assert.Null(reply.Answer is null ? null : FiniteNumbers.FindBad(reply.Answer));
    }

    [Theory]
    [InlineData("Mn", 746918.3033818288)]
    [InlineData("P", 1e9)]
    public async Task Dissolved_oxygen_in_a_metal_that_it_consumes_was_a_fault_of_the_service(string formula, double massKg)
    {
        var vessel = SeedMessages.Vessels.Single(v => v.Metal?.Solvent == "Fe").Clone();
        vessel.Charge.Single(item => item.Formula == formula).MassKg = massKg;
        vessel.Oxygen = new OxygenStatement { DissolvedOxygenMassPpm = 600 };
        var reply = await SolveAsync(vessel);
        Assert.True(reply.Code is StatusCode.OK or StatusCode.FailedPrecondition, $"{reply.Code}: {reply.Refusal?.Message}");
    }

    [Fact]
    public async Task Formula_of_a_rare_script_was_quoted_as_half_a_character()
    {
        var vessel = SeedMessages.Vessels[0].Clone();
        vessel.Charge[0].Formula = "\U0001F525";
        var refusal = await RefusalOfAsync(vessel);
        Assert.Contains("'\U0001F525' cannot start", refusal.Message, StringComparison.Ordinal);
        Assert.DoesNotContain('\uFFFD', refusal.Message);
    }

    [Theory]
    [InlineData("\u001b[31m", "\\u001B[31m")]
    [InlineData("\u202EuC", "\\u202EuC")]
    [InlineData("Cu\u2028", "Cu\\u2028")]
    public async Task Text_that_steers_or_turns_a_terminal_was_sent_back_raw(string formula, string shown)
    {
        var vessel = SeedMessages.Vessels[0].Clone();
        vessel.Charge[0].Formula = formula;
        Assert.Contains($"charge[0].formula is {shown}; must be", (await RefusalOfAsync(vessel)).Message, StringComparison.Ordinal);
    }

    [Fact]
    public async Task Bad_page_token_did_not_name_its_field()
    {
        var reply = await service.CallAsync("ListData", new ListDataRequest { PageToken = "abc" }.ToByteArray());
        var violation = Assert.Single(reply!.Refusal!.GetDetail<BadRequest>().FieldViolations);
        Assert.Equal("page_token is abc; must be the next_page_token of the page before, with the same filter, or empty", violation.Description);
    }

    [Fact]
    public async Task Element_that_the_catalogue_lacks_was_named_without_what_is_allowed()
    {
        var vessel = SeedMessages.Vessels[0].Clone();
        vessel.Charge[0].Formula = "Cn2";
        Assert.Contains("must hold only elements that the catalogue knows; Cn is none", (await RefusalOfAsync(vessel)).Message, StringComparison.Ordinal);
    }

    [Fact]
    public async Task Override_of_the_wrong_kind_was_named_in_words_that_no_request_has()
    {
        var vessel = SeedMessages.Vessels[0].Clone();
        vessel.Overrides.Add(new DatumOverride { Slot = "metal/Cu/Pb", GibbsEnergyJoulePerMol = 1 });
        Assert.Contains(
            "overrides[0] is gibbs_energy_joule_per_mol; needs ln_gamma for slot metal/Cu/Pb", (await RefusalOfAsync(vessel)).Message, StringComparison.Ordinal);
    }

    private async Task<Reply> SolveAsync(VesselCase vessel) =>
        (await service.CallAsync("SolveCharge", new SolveChargeRequest { VesselCase = vessel }.ToByteArray()))!;

    private async Task<Google.Rpc.Status> RefusalOfAsync(VesselCase vessel)
    {
        var reply = await SolveAsync(vessel);
        Assert.Equal(StatusCode.InvalidArgument, reply.Code);
        return reply.Refusal!;
    }
}
