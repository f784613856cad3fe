using PartitionService.Cli.Output;

namespace PartitionService.Cli.Tests.Output;

public sealed class PlainTableTests
{
    [Fact]
    public void Sets_numbers_on_the_decimal_point()
    {
        var table = new PlainTable(new TableColumn("", Alignment.Left), new TableColumn("kg", Alignment.Decimal), new TableColumn("L", Alignment.Decimal));
        table.Add("Cu", "1000", "0.0123");
        table.Add("Pd", "0.25", "1.20e-8");
        table.Add("Zn", "<0.001", "-");

        Assert.Equal(["          kg        L", "Cu  1000      0.0123", "Pd     0.25   1.20e-8", "Zn    <0.001  -"], Lines(table, 80).Select(line => line.TrimEnd()));
    }

    [Fact]
    public void Wraps_the_last_column_and_loses_nothing()
    {
        var table = new PlainTable(new TableColumn("key", Alignment.Left), new TableColumn("words", Alignment.Left));
        table.Add("a", "one two three four five six seven eight nine ten eleven twelve");

        Assert.Equal(["key  words", "a    one two three four five six", "     seven eight nine ten eleven", "     twelve"], Lines(table, 36));
    }

    private static string[] Lines(PlainTable table, int width)
    {
        using var output = new StringWriter();
        table.Write(output, width);
        return output.ToString().Split(Environment.NewLine, StringSplitOptions.RemoveEmptyEntries);
    }
}
