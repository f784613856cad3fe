using PartitionService.Cli.Output;

namespace PartitionService.Cli.Tests.Output;

public sealed class PlainTextTests
{
    [Fact]
    public void Wraps_at_blanks_and_loses_nothing()
    {
        Assert.Equal(["lead and", "tin leave"], PlainText.Wrap("lead and tin  leave", 9));
        Assert.Equal(["abcde", "fghij", "k l"], PlainText.Wrap("abcdefghijk l", 5));
        Assert.Equal([""], PlainText.Wrap("", 5));
    }

    [Fact]
    public void Takes_the_sting_out_of_control_characters() => Assert.Equal(" [31mred  line", PlainText.Clean("\u001b[31mred\r\nline"));

    [Fact]
    public void Indents_further_lines_under_the_text()
    {
        using var output = new StringWriter();

        PlainText.WriteLabelled(output, "Note", 6, "one two three four five six", 26);

        Assert.Equal($"Note  one two three four{Environment.NewLine}      five six{Environment.NewLine}", output.ToString());
    }
}
