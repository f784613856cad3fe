using Grpc.Core;
using PartitionService.Contracts.V1;
using PartitionService.Server.Tests.Support;

namespace PartitionService.Server.Tests.Services;

public sealed class ActivityGrpcServiceTests(SharedServer shared) : IClassFixture<SharedServer>
{
    private ActivityService.ActivityServiceClient Client => shared.Server.Activity;

    /// <summary>
    /// Copper in iron at 1873 K: gamma0 8.6, dG = 33470 - 39.37 T J/mol (Sigworth and Elliott, Metal Science 8 (1974) 298;
    /// from memory). The catalogue prefers a later row with the same numbers to 1 %, hence 200 J/mol.
    /// </summary>
    [Fact]
    public async Task Copper_in_iron_agrees_with_the_published_figures()
    {
        var answer = await Client.ConvertActivityCoefficientAsync(Request(ReferenceState.HenrianOneMassPercent, ReferenceState.Raoultian, 1));
        Assert.InRange(Math.Exp(answer.LnGamma0), 8.5, 8.7);
        Assert.InRange(answer.GibbsEnergyToOneMassPercentJoulePerMol, 33470 - (39.37 * 1873) - 200, 33470 - (39.37 * 1873) + 200);
        Assert.Equal("pure liquid", answer.StandardState);
        Assert.StartsWith("metal/Fe/Cu#", answer.DatumKey, StringComparison.Ordinal);
        Assert.NotEqual(Access.Unspecified, answer.Access);
        Assert.Equal(1, answer.MassPercent, 12);
        Assert.Equal(55.845 / (100 * 63.546), answer.MoleFraction, 6);
        Assert.Equal(answer.MoleFraction * Math.Exp(answer.LnGamma0), answer.Activity, 12);
    }

    [Fact]
    public async Task Caller_may_bring_the_coefficient()
    {
        var request = Request(ReferenceState.Raoultian, ReferenceState.HenrianMoleFraction, 0.5);
        request.LnGamma0 = 0;
        var answer = await Client.ConvertActivityCoefficientAsync(request);
        Assert.Equal((0.5, 0, ""), (answer.Activity, answer.LnGamma0, answer.DatumKey));
        Assert.Equal(Access.Unspecified, answer.Access);
    }

    [Theory]
    [InlineData(ReferenceState.Raoultian)]
    [InlineData(ReferenceState.HenrianMoleFraction)]
    [InlineData(ReferenceState.HenrianOneMassPercent)]
    public async Task There_and_back_is_the_same_activity(ReferenceState other)
    {
        foreach (var from in Enum.GetValues<ReferenceState>().Where(s => s != ReferenceState.Unspecified))
        {
            var there = await Client.ConvertActivityCoefficientAsync(Request(from, other, 0.0123));
            var back = await Client.ConvertActivityCoefficientAsync(Request(other, from, there.Activity));
            Assert.Equal(0.0123, back.Activity, 14);
        }
    }

    [Theory]
    [InlineData("O", "1/2 X2 gas, 1 atm")]
    [InlineData("C", "graphite")]
    [InlineData("Pb", "pure liquid")]
    public async Task State_of_a_callers_number_follows_the_element(string solute, string state)
    {
        var request = Request(ReferenceState.Raoultian, ReferenceState.Raoultian, 1);
        request.Solute = solute;
        request.LnGamma0 = 1;
        Assert.Equal(state, (await Client.ConvertActivityCoefficientAsync(request)).StandardState);
    }

    [Fact]
    public async Task Empty_request_names_every_missing_field()
    {
        var error = await CallError.OfAsync(Client.ConvertActivityCoefficientAsync(new ConvertActivityCoefficientRequest()));
        Assert.Equal((StatusCode.InvalidArgument, "INVALID_CASE"), (error.Status, error.Reason));
        Assert.Equal(["solvent", "solute", "temperature_kelvin", "from", "to", "activity"], error.Fields);
    }

    [Fact]
    public async Task Every_bad_value_is_named()
    {
        var error = await CallError.OfAsync(Client.ConvertActivityCoefficientAsync(new ConvertActivityCoefficientRequest
        {
            Solvent = "Fe",
            Solute = "Fe",
            TemperatureKelvin = double.NaN,
            From = (ReferenceState)9,
            To = (ReferenceState)10,
            Activity = double.PositiveInfinity,
            LnGamma0 = double.NaN,
        }));
        Assert.Equal(["solute", "temperature_kelvin", "from", "to", "activity", "ln_gamma0"], error.Fields);
        Assert.All(error.BadRequest!.FieldViolations, v => Assert.Equal("NOT_ALLOWED", v.Reason));
    }

    [Theory]
    [InlineData(0)]
    [InlineData(-1)]
    [InlineData(double.NaN)]
    [InlineData(1.0000001e30)]
    public async Task Activity_out_of_range_is_refused(double activity)
    {
        var error = await CallError.OfAsync(Client.ConvertActivityCoefficientAsync(Request(ReferenceState.Raoultian, ReferenceState.Raoultian, activity)));
        Assert.Contains("(0, 1e30]", error.Violation("activity").Description, StringComparison.Ordinal);
    }

    [Fact]
    public async Task Pair_without_a_row_is_not_found()
    {
        var request = Request(ReferenceState.Raoultian, ReferenceState.Raoultian, 1);
        request.Solvent = "Zn";
        request.Solute = "U";
        var error = await CallError.OfAsync(Client.ConvertActivityCoefficientAsync(request));
        Assert.Equal((StatusCode.NotFound, "UNKNOWN_DATUM"), (error.Status, error.Reason));
        Assert.Contains("metal/Zn/U", error.Message, StringComparison.Ordinal);
    }

    private static ConvertActivityCoefficientRequest Request(ReferenceState from, ReferenceState to, double activity) => new()
    {
        Solvent = "Fe",
        Solute = "Cu",
        TemperatureKelvin = 1873,
        From = from,
        To = to,
        Activity = activity,
    };
}
