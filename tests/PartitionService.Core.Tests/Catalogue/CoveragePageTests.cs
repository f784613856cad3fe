using PartitionService.Core.Catalogue;

namespace PartitionService.Core.Tests.Catalogue;

public sealed class CoveragePageTests
{
    private static readonly CoverageMatrix Coverage = CoverageMatrix.Of(CatalogueLoader.LoadEmbedded());

    /// <summary>Set PARTITION_WRITE_COVERAGE to 1 to write the page anew after a change of the catalogue.</summary>
    [Fact]
    public void Committed_page_is_that_of_the_catalogue()
    {
        var fresh = CoveragePage.Write(Coverage);
        var path = Path.Combine(SourceFolder(), "COVERAGE.md");
        if (Environment.GetEnvironmentVariable("PARTITION_WRITE_COVERAGE") == "1")
            File.WriteAllText(path, fresh);
        Assert.Equal(fresh, File.ReadAllText(path));
    }

    [Fact]
    public void Page_counts_every_cell_and_names_every_species()
    {
        var page = CoveragePage.Write(Coverage);
        var all = Coverage.Slags.Cells;
        Assert.Contains($"| {Coverage.Slags.Count(CoverageTrust.Missing)} | {all.Count} |", page, StringComparison.Ordinal);
        Assert.All(all.Where(cell => cell.Species.Length > 0), cell => Assert.Contains($"| {cell.Species} |", page, StringComparison.Ordinal));
        Assert.DoesNotContain('\r', page);
    }

    /// <summary>The catalogue files in the working tree that these tests were built from.</summary>
    private static string SourceFolder()
    {
        for (var folder = new DirectoryInfo(AppContext.BaseDirectory); folder is not null; folder = folder.Parent)
        {
            if (File.Exists(Path.Combine(folder.FullName, "PartitionService.sln")))
                return Path.Combine(folder.FullName, "src", "PartitionService.Core", "Catalogue", "Data");
        }

        throw new DirectoryNotFoundException($"no PartitionService.sln above {AppContext.BaseDirectory}");
    }
}
