using PartitionService.Cli.Output;

namespace PartitionService.Cli.Tests.Output;

public sealed class SplitBarTests
{
    [Theory]
    [InlineData(1, 0, 0, 0, "##########")]
    [InlineData(0.5, 0.3, 0.1, 0.1, "#####===.-")]
    [InlineData(0, 0, 0, 0, "??????????")]
    [InlineData(0.999, 0.001, 0, 0, "##########")]
    [InlineData(0.33, 0.33, 0.34, 0, "###===....")]
    [InlineData(0.25, 0.25, 0.25, 0.25, "###===..--")]
    public void Draws_the_shares(double metal, double slag, double gas, double dust, string expected) =>
        Assert.Equal(expected, SplitBar.Letters.Draw(10, metal, slag, gas, dust));

    [Theory]
    [InlineData(8)]
    [InlineData(12)]
    [InlineData(20)]
    public void Is_always_equally_long(int cells)
    {
        for (var i = 0; i <= 100; i++)
        {
            var metal = i / 100.0;
            Assert.Equal(cells, SplitBar.Blocks.Draw(cells, metal, (1 - metal) / 3, (1 - metal) / 3, (1 - metal) / 3 + 1e-12).Length);
        }
    }

    [Fact]
    public void Marks_are_told_apart_without_colour()
    {
        foreach (var bar in new[] { SplitBar.Blocks, SplitBar.Letters })
            Assert.Equal(5, new[] { bar.Metal, bar.Slag, bar.Gas, bar.Dust, bar.Other }.Distinct().Count());
    }
}
