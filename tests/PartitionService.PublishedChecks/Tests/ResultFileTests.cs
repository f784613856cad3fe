using System.Globalization;
using PartitionService.PublishedChecks.Report;
using PartitionService.PublishedChecks.Rows;

namespace PartitionService.PublishedChecks.Tests;

/// <summary>Result files: a fresh run writes them, and the committed copies agree with it.</summary>
public sealed class ResultFileTests
{
    /// <summary>Difference of two figures that rounding to four digits on another machine may leave, relative.</summary>
    private const double Rounding = 2e-3;

    /// <summary>Last digit of a difference.</summary>
    private const double RoundingOfDifference = 0.0101;

    private const int DifferenceColumn = 6;

    private const string HowTo = "copy Fresh/Results.csv and Fresh/Results.md from the output folder over the committed copies";

    public ResultFileTests()
    {
        var folder = Directory.CreateDirectory(Path.Combine(AppContext.BaseDirectory, "Fresh")).FullName;
        File.WriteAllText(Path.Combine(folder, "Results.csv"), ResultTable.Csv(CheckRun.Results));
        File.WriteAllText(Path.Combine(folder, "Results.md"), ResultTable.Markdown(CheckRun.Results));
        Console.WriteLine(ResultTable.Markdown(CheckRun.Results));
    }

    [Fact]
    public void The_committed_table_equals_a_fresh_run()
    {
        var committed = CsvText.Split(Committed("Results.csv"));
        var fresh = CsvText.Split(ResultTable.Csv(CheckRun.Results));
        Assert.True(fresh.Count == committed.Count, $"{fresh.Count} lines now, {committed.Count} committed; {HowTo}");
        Assert.All(fresh.Zip(committed), pair =>
        {
            var (now, then) = pair;
            Assert.True(now.Count == then.Count, $"{now[0]}: number of fields; {HowTo}");
            Assert.All(now.Index(), cell => Assert.True(
                Same(cell.Item, then[cell.Index], cell.Index == DifferenceColumn),
                $"{now[0]}: {cell.Item} now, {then[cell.Index]} committed; {HowTo}"));
        });
    }

    [Fact]
    public void The_committed_summary_equals_a_fresh_run()
    {
        static string Summary(string markdown) => markdown[..markdown.IndexOf("\n## ", StringComparison.Ordinal)];
        Assert.Equal(Summary(ResultTable.Markdown(CheckRun.Results)), Summary(Committed("Results.md")));
    }

    [Fact]
    public void The_committed_tables_show_the_same_verdicts()
    {
        var markdown = Committed("Results.md");
        Assert.All(CheckRun.Results.Select(ResultTable.Cells), cells =>
            Assert.Contains(
                markdown.Split('\n'),
                line => line.StartsWith($"| {cells[0]} |", StringComparison.Ordinal) && line.Contains($"| {cells[8]} |", StringComparison.Ordinal)));
    }

    private static string Committed(string file) =>
        File.ReadAllText(Path.Combine(AppContext.BaseDirectory, file)).ReplaceLineEndings("\n");

    /// <summary>Equal text, or equal words with numbers that differ by no more than rounding of the column.</summary>
    private static bool Same(string now, string then, bool difference)
    {
        var first = now.Split(' ');
        var second = then.Split(' ');
        return first.Length == second.Length && first.Zip(second).All(pair => pair.First == pair.Second
            || (Number(pair.First) is { } a && Number(pair.Second) is { } b
                && Math.Abs(a - b) <= (difference ? RoundingOfDifference : Rounding * Math.Abs(b))));
    }

    private static double? Number(string word) =>
        double.TryParse(word.TrimEnd(';'), NumberStyles.Float, CultureInfo.InvariantCulture, out var number) ? number : null;
}
