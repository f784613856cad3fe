using Google.Protobuf;
using PartitionService.Contracts.V1;

namespace PartitionService.Cli.Tests.Commands;

/// <summary>Asks the real service inside the process: its catalogue is what the commands exist for.</summary>
public sealed class CatalogueCommandTests
{
    [Fact]
    public async Task Lists_solvents()
    {
        var (code, output, _) = await ToolTests.RunAsync("catalogue", "solvents");

        Assert.Equal(ExitCode.Success, code);
        Assert.Matches(@"(?m)^Cu +13[0-9]{2}\.[0-9] +[0-9]+ +[0-9]+", output);
    }

    [Fact]
    public async Task Lists_all_pages_of_solutes()
    {
        var (_, output, _) = await ToolTests.RunAsync("catalogue", "solutes", "--format", "json");

        var list = JsonParser.Default.Parse<ListSolutesResponse>(output);
        Assert.True(list.Solutes.Count > 100, $"one page holds 100 solutes, the list {list.Solutes.Count}");
        Assert.Equal(list.TotalSize, list.Solutes.Count);
    }

    [Fact]
    public async Task Lists_the_oxides_of_slags()
    {
        var (_, output, _) = await ToolTests.RunAsync("catalogue", "slags", "--format", "csv");

        Assert.StartsWith("family,oxide,element,sigma_ln_gamma,access,key\r\n", output, StringComparison.Ordinal);
        Assert.Contains("\r\niron-silicate,PbO,Pb,", output, StringComparison.Ordinal);
    }

    [Fact]
    public async Task Filters_data()
    {
        var (_, output, _) = await ToolTests.RunAsync("catalogue", "data", "--kind", "oxidation", "--element", "Sn", "--temperature", "1200", "--format", "json");

        var data = JsonParser.Default.Parse<ListDataResponse>(output).Data;
        Assert.NotEmpty(data);
        Assert.All(data, datum => Assert.Equal((DatumKind.Oxidation, 1200.0), (datum.Kind, datum.ValueTemperatureKelvin)));
    }

    [Fact]
    public async Task Explains_a_datum_with_its_sources()
    {
        var (code, output, _) = await ToolTests.RunAsync("catalogue", "explain", "metal/Cu/Pb");

        Assert.Equal(ExitCode.Success, code);
        Assert.Contains("metal/Cu/Pb#1", output, StringComparison.Ordinal);
        Assert.Contains("counts", output, StringComparison.Ordinal);
    }

    [Fact]
    public async Task Shows_the_coverage_on_120_columns_with_a_legend()
    {
        var (code, output, _) = await ToolTests.RunAsync("catalogue", "coverage");

        Assert.Equal(ExitCode.Success, code);
        var lines = output.Split('\n').Select(line => line.TrimEnd('\r')).ToList();
        Assert.StartsWith("Legend   R read in a source; ", lines[0], StringComparison.Ordinal);
        Assert.All(lines, line => Assert.InRange(line.Length, 0, 120));
        Assert.All((string[])["Metals ", "Slags ", "Vapours "], title => Assert.Contains(lines, line => line.StartsWith(title, StringComparison.Ordinal)));
        Assert.Contains("IS iron-silicate", output, StringComparison.Ordinal);
        Assert.Matches(@"(?m)^PbO +[RADMX.-]", output);
    }

    [Fact]
    public async Task Shows_one_table_of_the_coverage()
    {
        var (_, output, _) = await ToolTests.RunAsync("catalogue", "coverage", "--table", "slags", "--format", "csv");

        Assert.StartsWith("table,row,element,species,trust,sigma,unit,key\r\nslags,", output, StringComparison.Ordinal);
        Assert.Matches(@"slags,iron-silicate,Pb,PbO,[a-z]+,[0-9.]+,1,slag/iron-silicate/PbO#[0-9]+\r\n", output);
        Assert.DoesNotContain("metals,", output, StringComparison.Ordinal);
    }

    [Fact]
    public async Task Gives_the_coverage_as_a_message()
    {
        var (_, output, _) = await ToolTests.RunAsync("catalogue", "coverage", "--table", "vapours", "--format", "json");

        var table = Assert.Single(JsonParser.Default.Parse<GetCoverageResponse>(output).Tables);
        Assert.Equal(CoverageKind.Vapours, table.Kind);
        Assert.Contains(table.Cells, cell => cell.Species == "As4O6");
    }

    [Fact]
    public async Task Tells_that_there_is_no_such_datum()
    {
        var (code, output, error) = await ToolTests.RunAsync("catalogue", "explain", "metal/Xx/Yy");

        Assert.Equal((ExitCode.UnknownDatum, ""), (code, output));
        Assert.Contains("metal/Xx/Yy", error, StringComparison.Ordinal);
    }

    [Fact]
    public async Task Tells_that_a_filter_is_refused()
    {
        var (code, _, error) = await ToolTests.RunAsync("catalogue", "solutes", "Cu", "--temperature", "20");

        Assert.Equal(ExitCode.InvalidCase, code);
        Assert.Contains("temperature_kelvin", error, StringComparison.Ordinal);
    }
}
