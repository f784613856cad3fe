using PartitionService.Cli.CaseFiles;

namespace PartitionService.Cli.Tests;

public sealed class ExampleFilesTests
{
    public static TheoryData<string> Names => [.. Directory.GetFiles(Folder, "*.yaml").Select(path => Path.GetFileName(path)!).Order()];

    internal static string Folder => Path.Combine(AppContext.BaseDirectory, "Examples");

    [Fact]
    public void Are_the_five_of_the_works() => Assert.Equal(
        ["aluminium-remelt.yaml", "black-copper.yaml", "copper-fire-refining.yaml", "electric-arc-steel.yaml", "lead-softening.yaml"],
        Directory.GetFiles(Folder).Select(Path.GetFileName).Order());

    [Theory]
    [MemberData(nameof(Names))]
    public async Task Can_be_read(string name)
    {
        var file = await CaseFileReader.ReadFileAsync(Path.Combine(Folder, name), default);

        Assert.StartsWith("Hollowmere Works, ", file.Case.Name, StringComparison.Ordinal);
        Assert.NotEmpty(file.Case.Charge);
    }

    [Theory]
    [MemberData(nameof(Names))]
    public void Start_with_a_caution(string name)
    {
        var header = string.Join(' ', File.ReadLines(Path.Combine(Folder, name)).TakeWhile(line => line.StartsWith('#')));

        Assert.Contains("CAUTION", header, StringComparison.Ordinal);
        Assert.Contains("local codes and licensed practice", header, StringComparison.Ordinal);
    }
}
