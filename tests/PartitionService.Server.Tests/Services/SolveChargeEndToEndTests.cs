using Grpc.Core;
using PartitionService.Contracts.V1;
using PartitionService.Core.Catalogue;
using PartitionService.Server.Tests.Support;

namespace PartitionService.Server.Tests.Services;

/// <summary>The real solver behind the real server.</summary>
public sealed class SolveChargeEndToEndTests(SharedServer shared) : IClassFixture<SharedServer>
{
    private EquilibriumService.EquilibriumServiceClient Client => shared.Server.Equilibrium;

    [Fact]
    public async Task Vessel_is_solved_and_every_element_is_accounted_for()
    {
        var answer = (await Client.SolveChargeAsync(WireCases.Request())).Answer;
        Assert.Equal("Cu", answer.Solvent);
        Assert.Equal(CatalogueLoader.LoadEmbedded().Digest, answer.CatalogueDigest);
        Assert.Equal(-8, answer.Redox.Log10Po2Atm, 9);
        Assert.Superset(new HashSet<string> { "Cu", "Pb", "Sn", "Fe", "Si" }, answer.Elements.Select(e => e.Element).ToHashSet());
        Assert.All(answer.Elements, e => Assert.Equal(
            1,
            e.MetalFraction + e.SlagFraction + e.GasFraction + e.MechanicalDustFraction + e.UnburntCarbonFraction + e.UnplacedFraction,
            9));
        Assert.NotEmpty(answer.DataUsed);
        Assert.True(answer.Solution.LargestBalanceError < 1e-9);
    }

    /// <summary>More oxidising: less of every base metal stays in the bath.</summary>
    [Fact]
    public async Task Oxidation_drives_tin_and_lead_into_the_slag()
    {
        var reducing = (await Client.SolveChargeAsync(At(-10))).Answer;
        var oxidising = (await Client.SolveChargeAsync(At(-7))).Answer;
        foreach (var element in new[] { "Sn", "Pb" })
            Assert.True(Metal(oxidising, element) < Metal(reducing, element), element);
    }

    /// <summary>The tangent predicts a small step of the temperature; without a request there is none.</summary>
    [Fact]
    public async Task Derivatives_come_on_request_and_predict_a_small_step()
    {
        var request = WireCases.Request();
        Assert.Null((await Client.SolveChargeAsync(request)).Answer.Derivatives);
        request.Derivatives = new DerivativeRequest { Temperature = true, Data = true };
        var before = (await Client.SolveChargeAsync(request)).Answer;
        request.VesselCase.TemperatureKelvin += 0.5;
        var after = (await Client.SolveChargeAsync(request)).Answer;
        var row = before.Derivatives.Outputs.ToList().FindIndex(o => o is { Kind: DerivativeOutputKind.SlagFraction, Element: "Sn" });
        var column = before.Derivatives.Columns[0];
        Assert.Equal(DerivativeParameterKind.Temperature, column.Kind);
        var change = Slag(after) - Slag(before);
        Assert.Equal(change, 0.5 * column.Derivatives[row], 0.01 * Math.Abs(change));
        Assert.Equal(
            before.DataUsed.Select(use => use.Key.Split('#')[0]).Distinct(),
            before.Derivatives.Columns.Skip(1).Select(c => c.Name));

        static double Slag(ChargeAnswer answer) => answer.Elements.Single(e => e.Element == "Sn").SlagFraction;
    }

    [Fact]
    public async Task Charge_without_a_metal_has_no_solvent()
    {
        var request = WireCases.Request();
        request.VesselCase.Metal = null;
        request.VesselCase.Charge.Clear();
        request.VesselCase.Charge.Add(new ChargeItem { Formula = "SiO2", MassKg = 1 });
        var error = await CallError.OfAsync(Client.SolveChargeAsync(request));
        Assert.Equal((StatusCode.FailedPrecondition, "NO_SOLVENT"), (error.Status, error.Reason));
    }

    [Fact]
    public async Task Sixty_four_calls_at_a_time_agree_to_the_last_bit()
    {
        var answers = await Task.WhenAll(Enumerable.Range(0, 64).Select(_ => Client.SolveChargeAsync(WireCases.Request()).ResponseAsync));
        Assert.All(answers, a => Assert.Equal(answers[0], a));
    }

    private static SolveChargeRequest At(double log10OxygenPressureAtm)
    {
        var request = WireCases.Request();
        request.VesselCase.Oxygen = new OxygenStatement { Log10Po2Atm = log10OxygenPressureAtm };
        return request;
    }

    private static double Metal(ChargeAnswer answer, string element) => answer.Elements.Single(e => e.Element == element).MetalFraction;
}
