using System.Diagnostics;
using PartitionService.Cli.CaseFiles;

namespace PartitionService.HostileInput.Regressions;

/// <summary>What the hostile runs found in case files, each as small as it goes.</summary>
public sealed class HostileCaseFileTests
{
    [Theory]
    [InlineData("charge:\n  - {formula: Fe, mass_kg: \r\n700}", 2)]
    [InlineData("charge:\n  - {formulname: twice\na: Bi, mass_kg: 75}", 2)]
    [InlineData("name: \"\\uD800\"", 1)]
    public void Broken_line_or_half_a_character_ended_the_tool_with_an_exception(string text, int line)
    {
        var error = Assert.Single(ErrorsOf(text));
        Assert.StartsWith("This is not valid YAML: ", error.Message, StringComparison.Ordinal);
        Assert.InRange(error.Line, line, line + 1);
    }

    [Theory]
    [InlineData("{0}: 1")]
    [InlineData("temperature_kelvin: {0}")]
    [InlineData("oxygen: closed_balance\nallowances: {{metal_in_slag: {{family_typical: {0}}}}}")]
    public void Text_of_any_length_was_printed_in_full(string format)
    {
        var text = string.Format(System.Globalization.CultureInfo.InvariantCulture, format, new string('k', 100_000));
        Assert.All(ErrorsOf(text), error => Assert.InRange(error.Message.Length, 10, 400));
    }

    [Fact]
    public void Hundred_thousand_unknown_keys_gave_as_many_lines()
    {
        var clock = Stopwatch.StartNew();
        var errors = ErrorsOf(string.Concat(Enumerable.Repeat("charg: 1\n", 100_000)));
        Assert.Equal(CaseFileReader.MostErrors + 1, errors.Count);
        Assert.Equal("99903 further errors are not listed; mend these first.", errors[^1].Message);
        Assert.True(clock.Elapsed < TimeSpan.FromSeconds(30), $"took {clock.Elapsed}");
    }

    private static IReadOnlyList<CaseFileError> ErrorsOf(string text) =>
        Assert.Throws<CaseFileException>(() => CaseFileReader.Read("case.yaml", text)).Errors;
}
