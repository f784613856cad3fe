using PartitionService.Cli.CaseFiles;

namespace PartitionService.Cli.Tests.Commands;

public sealed class StarterCommandTests
{
    [Fact]
    public async Task Writes_a_case_that_can_be_read()
    {
        using var file = new TemporaryFile();

        var (code, output, error) = await ToolTests.RunAsync("starter", file.Path);

        Assert.Equal((ExitCode.Success, $"Wrote {file.Path}. Next: partition solve {file.Path}{Environment.NewLine}", ""), (code, output, error));
        Assert.StartsWith("Hollowmere Works, ", (await CaseFileReader.ReadFileAsync(file.Path, default)).Case.Name, StringComparison.Ordinal);
    }

    [Fact]
    public async Task Leaves_a_file_that_exists_as_it_is()
    {
        using var file = new TemporaryFile("mine"u8.ToArray());

        var (code, _, error) = await ToolTests.RunAsync("starter", file.Path);

        Assert.Equal(ExitCode.WrongInput, code);
        Assert.Contains("add --replace", error, StringComparison.Ordinal);
        Assert.Equal("mine", await File.ReadAllTextAsync(file.Path));
    }

    [Fact]
    public async Task Replaces_a_file_on_request()
    {
        using var file = new TemporaryFile("mine"u8.ToArray());

        var (code, _, _) = await ToolTests.RunAsync("starter", file.Path, "--replace");

        Assert.Equal(ExitCode.Success, code);
        Assert.NotEqual("mine", await File.ReadAllTextAsync(file.Path));
    }

    [Fact]
    public async Task The_parts_in_comments_are_right_as_well()
    {
        var (_, text, _) = await ToolTests.RunAsync("starter", "-");
        var lines = text.Split('\n').Select(line =>
            line.TrimStart().StartsWith("# slag_in", StringComparison.Ordinal) || line.TrimStart().StartsWith("# mechanical", StringComparison.Ordinal)
            || line.TrimStart().StartsWith("# stage", StringComparison.Ordinal) || line.StartsWith("# overrides", StringComparison.Ordinal) || line.Contains("#   - {", StringComparison.Ordinal)
                ? line.Replace("# ", "", StringComparison.Ordinal)
                : line);

        var read = CaseFileReader.Read("starter", string.Join('\n', lines)).Case;

        Assert.Equal(3, read.Overrides.Count);
        Assert.Equal(0.1, read.Allowances.SlagInMetalMassPercent);
        Assert.Equal(0.01, read.Allowances.MechanicalDustMassFraction);
        Assert.Equal("Sn", Assert.Single(read.Allowances.StageEfficiencies).Element);
    }
}
