using Grpc.Core;
using PartitionService.Contracts.V1;
using PartitionService.Core.Equilibrium;
using PartitionService.Server.Tests.Support;

namespace PartitionService.Server.Tests.Services;

public sealed class EquilibriumGrpcServiceTests
{
    [Fact]
    public async Task Answer_and_label_come_back()
    {
        await using var server = await RunningServer.StartAsync((c, _, _) => new SolveOutcome.Solved(CoreAnswers.Full(c.Name)));
        var response = await server.Equilibrium.SolveChargeAsync(WireCases.Request("ladle 7"));
        Assert.Equal("ladle 7", response.Answer.Name);
        Assert.Equal("Cu", response.Answer.Solvent);
    }

    [Fact]
    public async Task Missing_vessel_is_named()
    {
        await using var server = await RunningServer.StartAsync();
        var error = await CallError.OfAsync(server.Equilibrium.SolveChargeAsync(new SolveChargeRequest()));
        Assert.Equal(StatusCode.InvalidArgument, error.Status);
        Assert.Equal("INVALID_CASE", error.Reason);
        Assert.Equal("REQUIRED", error.Violation("vessel_case").Reason);
    }

    [Fact]
    public async Task Violations_of_message_and_rules_are_listed_all_at_once()
    {
        await using var server = await RunningServer.StartAsync();
        var vessel = new Contracts.V1.VesselCase
        {
            TemperatureKelvin = double.NaN,
            PressureAtm = double.PositiveInfinity,
            Slag = new SlagBath(),
            Metal = new MetalBath { Solvent = "Xx" },
            Allowances = new Contracts.V1.PracticeAllowances
            {
                MetalInSlag = new EntrainedMetal { FamilyTypical = false },
                SlagInMetalMassPercent = 51,
                MechanicalDustMassFraction = -0.1,
                StageEfficiencies = { new Contracts.V1.StageEfficiency { Element = "Zn", Efficiency = 1.5 } },
            },
            Charge =
            {
                new Contracts.V1.ChargeItem { Formula = "Cu" },
                new Contracts.V1.ChargeItem { Formula = "Cu", MassKg = -1 },
                new Contracts.V1.ChargeItem { Formula = "Q(", MassKg = double.NegativeInfinity },
                new Contracts.V1.ChargeItem { Formula = "FeO", VolumeNormalCubicMetre = 1 },
            },
            Overrides =
            {
                new Contracts.V1.DatumOverride { Slot = "metal/Cu/Pb" },
                new Contracts.V1.DatumOverride { Slot = "metal/Cu/Sn", LnGamma = 61 },
            },
        };

        var error = await CallError.OfAsync(server.Equilibrium.SolveChargeAsync(new SolveChargeRequest { VesselCase = vessel }));

        Assert.Equal(StatusCode.InvalidArgument, error.Status);
        Assert.Equal("INVALID_CASE", error.Reason);
        Assert.Equal(
            new[]
            {
                "vessel_case.allowances.mechanical_dust_mass_fraction",
                "vessel_case.allowances.metal_in_slag.family_typical",
                "vessel_case.allowances.slag_in_metal_mass_percent",
                "vessel_case.allowances.stage_efficiencies[0].efficiency",
                "vessel_case.charge[0]",
                "vessel_case.charge[1].mass_kg",
                "vessel_case.charge[2].formula",
                "vessel_case.charge[2].mass_kg",
                "vessel_case.charge[3].volume_normal_cubic_metre",
                "vessel_case.metal.solvent",
                "vessel_case.overrides[0]",
                "vessel_case.overrides[1].ln_gamma",
                "vessel_case.oxygen",
                "vessel_case.pressure_atm",
                "vessel_case.slag.family",
                "vessel_case.temperature_kelvin",
            },
            error.Fields.Order(StringComparer.Ordinal));
        var mass = error.Violation("vessel_case.charge[1].mass_kg");
        Assert.Equal("NOT_ALLOWED", mass.Reason);
        Assert.Contains("-1", mass.Description, StringComparison.Ordinal);
        Assert.Contains("[1E-27, ", mass.Description, StringComparison.Ordinal);
        Assert.Contains("NaN", error.Violation("vessel_case.temperature_kelvin").Description, StringComparison.Ordinal);
    }

    [Fact]
    public async Task Entrainment_without_basis_is_refused()
    {
        await using var server = await RunningServer.StartAsync();
        var request = WireCases.Request();
        request.VesselCase.Allowances = new Contracts.V1.PracticeAllowances { MetalInSlag = new EntrainedMetal() };
        var error = await CallError.OfAsync(server.Equilibrium.SolveChargeAsync(request));
        Assert.Equal("REQUIRED", error.Violation("vessel_case.allowances.metal_in_slag").Reason);
        Assert.Single(error.BadRequest!.FieldViolations);
    }

    [Theory]
    [InlineData(SolveFailure.OxygenHasNoHome, StatusCode.FailedPrecondition, "OXYGEN_HAS_NO_HOME")]
    [InlineData(SolveFailure.ElementHasNoHome, StatusCode.FailedPrecondition, "ELEMENT_HAS_NO_HOME")]
    [InlineData(SolveFailure.PressureExceeded, StatusCode.FailedPrecondition, "PRESSURE_EXCEEDED")]
    [InlineData(SolveFailure.NoSolvent, StatusCode.FailedPrecondition, "NO_SOLVENT")]
    [InlineData(SolveFailure.DissolvedOxygenNotReachable, StatusCode.FailedPrecondition, "DISSOLVED_OXYGEN_NOT_REACHABLE")]
    [InlineData(SolveFailure.NotConverged, StatusCode.Internal, "NOT_CONVERGED")]
    public async Task Failure_has_its_status_and_reason(SolveFailure failure, StatusCode status, string reason)
    {
        await using var server = await RunningServer.StartAsync((_, _, _) => new SolveOutcome.Failed(failure, "Charge less oxygen.", ["O", "Zn"]));
        var error = await CallError.OfAsync(server.Equilibrium.SolveChargeAsync(WireCases.Request()));
        Assert.Equal((status, reason), (error.Status, error.Reason));
        Assert.Equal("Charge less oxygen.", error.Message);
        Assert.Equal("O,Zn", error.Info.Metadata["elements"]);
    }

    [Fact]
    public async Task Sixty_four_calls_at_a_time_get_their_own_answers()
    {
        await using var server = await RunningServer.StartAsync((c, _, _) =>
        {
            Thread.Sleep(5);
            return new SolveOutcome.Solved(CoreAnswers.Full(c.Name));
        });
        var names = Enumerable.Range(0, 64).Select(i => $"case {i}").ToList();
        var answers = await Task.WhenAll(names.Select(n => server.Equilibrium.SolveChargeAsync(WireCases.Request(n)).ResponseAsync));
        Assert.Equal(names, answers.Select(a => a.Answer.Name));
    }
}
