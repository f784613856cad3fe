using PartitionService.Contracts.V1;

namespace PartitionService.Contracts.Tests;

/// <summary>The README lists what a caller may meet.</summary>
public sealed class ReadmeTests
{
    private const string Prefix = "ERROR_REASON_";

    private static readonly string[] Lines = File.ReadAllLines(Path.Combine(AppContext.BaseDirectory, "README.md"));

    public static TheoryData<string> Reasons => [.. Names];

    private static IEnumerable<string> Names =>
        ErrorReflection.Descriptor.EnumTypes[0].Values.Where(value => value.Number != 0).Select(value => value.Name[Prefix.Length..]);

    [Theory]
    [MemberData(nameof(Reasons))]
    public void Every_reason_stands_in_the_table_with_the_status_of_the_contract(string reason)
    {
        var row = Assert.Single(Lines, line => line.StartsWith($"| `{reason}` |", StringComparison.Ordinal));
        var cells = row.Split('|', StringSplitOptions.TrimEntries);
        Assert.NotEmpty(cells[3]);
        Assert.Contains($"// {cells[2]}: ", CommentOf(reason), StringComparison.Ordinal);
    }

    [Fact]
    public void Table_holds_no_reason_that_is_gone() =>
        Assert.Equal(
            Names.Order(StringComparer.Ordinal),
            Lines.SkipWhile(line => line != "### Errors").Skip(1).TakeWhile(line => !line.StartsWith('#'))
                .Where(line => line.StartsWith("| `", StringComparison.Ordinal)).Select(line => line.Split('`')[1]).Order(StringComparer.Ordinal));

    private static string CommentOf(string reason)
    {
        var lines = ProtoFiles.Lines("error.proto");
        return lines[Array.FindIndex(lines, line => line.TrimStart().StartsWith($"{Prefix}{reason} =", StringComparison.Ordinal)) - 1];
    }
}
