using Google.Protobuf;
using PartitionService.Contracts.V1;

namespace PartitionService.Cli.Tests;

/// <summary>Every example must read sensibly to a metallurgist: these are the directions that practice knows, with wide margins.</summary>
public sealed class ExampleAnswersTests
{
    [Fact]
    public async Task Black_copper_keeps_noble_metals_and_fumes_zinc_and_cadmium()
    {
        var answer = await SolveAsync("black-copper.yaml");

        Assert.All(["Au", "Pd", "Ag", "Cu", "Ni"], element => Assert.True(Share(answer, element).MetalFraction > 0.9, element));
        Assert.All(["Al", "Si", "Ca", "Fe"], element => Assert.True(Share(answer, element).SlagFraction > 0.9, element));
        Assert.All(["Zn", "Cd", "Br", "Cl"], element => Assert.True(Share(answer, element).GasFraction > 0.6, element));
        Assert.InRange(Share(answer, "Au").SlagFraction, 1e-4, 0.05);
    }

    [Fact]
    public async Task Steel_keeps_copper_and_tin_and_loses_rare_earths_to_the_slag()
    {
        var answer = await SolveAsync("electric-arc-steel.yaml");

        Assert.All(["Cu", "Sn", "Ni", "Mo", "As", "Sb"], element => Assert.True(Share(answer, element).MetalFraction > 0.95, element));
        Assert.All(["Nd", "Al", "Si", "Ti", "Ca", "Mg", "V"], element => Assert.True(Share(answer, element).SlagFraction > 0.9, element));
        Assert.All(["Zn", "Pb", "Cd"], element => Assert.True(Share(answer, element).GasFraction > 0.9, element));
        Assert.All(["Cr", "Mn"], element => Assert.InRange(Share(answer, element).MetalFraction, 0.1, 0.95));
    }

    [Fact]
    public async Task Softening_takes_tin_arsenic_and_antimony_and_leaves_the_silver()
    {
        var answer = await SolveAsync("lead-softening.yaml");

        Assert.All(["Ag", "Au", "Bi"], element => Assert.True(Share(answer, element).MetalFraction > 0.95, element));
        Assert.All(["Sn", "As", "Sb"], element => Assert.True(Share(answer, element).SlagFraction > 0.8, element));
        Assert.True(Share(answer, "Sn").MetalFraction < Share(answer, "As").MetalFraction);
        Assert.True(Share(answer, "Sn").MetalFraction < Share(answer, "Sb").MetalFraction);
        Assert.InRange(answer.SolventLoss.LossFraction, 0.005, 0.1);
    }

    [Fact]
    public async Task Remelting_sends_alkalis_and_some_magnesium_to_the_salt_and_keeps_the_rest()
    {
        var answer = await SolveAsync("aluminium-remelt.yaml");

        Assert.All(["Na", "Ca", "Sr", "Li"], element => Assert.True(Share(answer, element).SlagFraction > 0.95, element));
        Assert.InRange(Share(answer, "Mg").SlagFraction, 0.2, 0.8);
        Assert.All(["Al", "Si", "Fe", "Cu", "Mn", "Zn", "Pb"], element => Assert.True(Share(answer, element).MetalFraction > 0.95, element));
    }

    [Fact]
    public async Task Fire_refining_takes_the_impurities_in_the_order_of_their_oxides()
    {
        var answer = await SolveAsync("copper-fire-refining.yaml");

        string[] order = ["Fe", "Zn", "Sn", "Co", "Ni", "Sb", "Ag", "Au"];
        var left = order.Select(element => Share(answer, element).MetalFraction).ToArray();
        Assert.Equal(left.Order(), left);
        Assert.True(Share(answer, "S").GasFraction > 0.9);
        Assert.InRange(answer.Redox.DissolvedOxygenMassPpm, 3000, 12000);
        Assert.InRange(answer.SolventLoss.LossFraction, 0.001, 0.05);
    }

    [Fact]
    public async Task The_starter_case_can_be_solved()
    {
        using var file = new TemporaryFile();
        await ToolTests.RunAsync("starter", file.Path);

        var (code, output, error) = await ToolTests.RunAsync("solve", file.Path);

        Assert.Equal((ExitCode.Success, ""), (code, error));
        Assert.StartsWith("Hollowmere Works, Furnace 1, first trial", output, StringComparison.Ordinal);
    }

    private static ElementDistribution Share(ChargeAnswer answer, string element) => answer.Elements.Single(entry => entry.Element == element);

    private static async Task<ChargeAnswer> SolveAsync(string name)
    {
        var (code, output, error) = await ToolTests.RunAsync("solve", Path.Combine(ExampleFilesTests.Folder, name), "--format", "json");

        Assert.Equal((ExitCode.Success, ""), (code, error));
        var answer = JsonParser.Default.Parse<ChargeAnswer>(output);
        foreach (var share in answer.Elements)
        {
            var sum = share.MetalFraction + share.SlagFraction + share.GasFraction + share.MechanicalDustFraction + share.UnburntCarbonFraction + share.UnplacedFraction;
            Assert.Equal(1, sum, 1e-9);
        }

        return answer;
    }
}
