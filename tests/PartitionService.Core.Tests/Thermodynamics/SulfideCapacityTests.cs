using PartitionService.Core.Catalogue;
using PartitionService.Core.Thermodynamics;

namespace PartitionService.Core.Tests.Thermodynamics;

public sealed class SulfideCapacityTests
{
    /// <summary>Worked example of the catalogue row capacity/sosinsky-cs: 1873.15 K, optical basicity 0.7723, printed to three decimals.</summary>
    [Fact]
    public void Worked_example_of_the_row_is_reproduced() => Assert.Equal(-1.943, SulfideCapacity.Log10(0.7723, 1873.15), 0.0005);

    [Fact]
    public void The_slot_is_the_row_that_the_catalogue_prefers()
    {
        var row = CatalogueLoader.LoadEmbedded().Slot<CapacityDatum>(SulfideCapacity.Slot).Single();
        Assert.True(row.Preferred);
        Assert.Equal("log10 C_S = (22690 - 54640 L)/T + 43.6 L - 25.2", row.Formula);
    }

    /// <summary>At T = 54640/43.6 K the terms of basicity cancel and 22690/T - 25.2 is left.</summary>
    [Theory]
    [InlineData(0.6)]
    [InlineData(0.85)]
    public void Basicity_drops_out_where_its_two_terms_cancel(double basicity) =>
        Assert.Equal((22690 * 43.6 / 54640) - 25.2, SulfideCapacity.Log10(basicity, 54640 / 43.6), 10);
}
