using Google.Protobuf;
using PartitionService.Contracts.V1;

namespace PartitionService.Cli.Tests.Commands;

public sealed class ConvertCommandTests
{
    private static readonly string[] Lead =
        ["convert", "--solvent", "Cu", "--solute", "Pb", "--temperature", "1473.15", "--from", "raoultian", "--to", "henrian-one-mass-percent", "--activity", "0.01"];

    [Fact]
    public async Task Converts_with_a_given_activity_coefficient()
    {
        var (code, output, _) = await ToolTests.RunAsync([.. Lead, "--ln-gamma0", "-1.5", "--format", "json"]);

        var response = JsonParser.Default.Parse<ConvertActivityCoefficientResponse>(output);
        // x = a/gamma0; in the dilute limit mass % = 100 x M(Pb)/M(Cu).
        Assert.Equal(ExitCode.Success, code);
        Assert.Equal(0.01 / Math.Exp(-1.5), response.MoleFraction, 1e-12);
        Assert.Equal(100 * response.MoleFraction * 207.2 / 63.546, response.Activity, 1e-3);
        Assert.Equal("", response.DatumKey);
    }

    [Fact]
    public async Task Takes_the_activity_coefficient_of_the_catalogue_otherwise()
    {
        var (code, output, _) = await ToolTests.RunAsync(Lead);

        Assert.Equal(ExitCode.Success, code);
        Assert.Matches(@"(?m)^source of ln gamma0 +metal/Cu/Pb#[0-9]+, ", output);
    }

    [Fact]
    public async Task Tells_what_is_out_of_range()
    {
        var (code, _, error) = await ToolTests.RunAsync([.. Lead[..^1], "-1"]);

        Assert.Equal(ExitCode.InvalidCase, code);
        Assert.Contains("activity", error, StringComparison.Ordinal);
    }
}
