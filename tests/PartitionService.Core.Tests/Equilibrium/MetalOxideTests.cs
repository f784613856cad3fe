using PartitionService.Core.Equilibrium;

namespace PartitionService.Core.Tests.Equilibrium;

public sealed class MetalOxideTests
{
    [Theory]
    [InlineData("FeO", "Fe", 1, "oxidation/FeO")]
    [InlineData("Cu2O", "Cu", 0.5, "oxidation/CuO0.5")]
    [InlineData("CuO0.5", "Cu", 0.5, "oxidation/CuO0.5")]
    [InlineData("Fe3O4", "Fe", 1.3333, "oxidation/FeO1.3333")]
    [InlineData("SnO2", "Sn", 2, "oxidation/SnO2")]
    [InlineData("OPb", "Pb", 1, "oxidation/PbO")]
    public void Oxides_resolve_however_they_are_written(string text, string element, double oxygen, string slot) =>
        Assert.Equal(new MetalOxide(element, oxygen, slot), MetalOxide.Resolve(text, Vessels.Catalogue));

    [Theory]
    [InlineData("")]
    [InlineData("Fe")]
    [InlineData("O2")]
    [InlineData("FeS")]
    [InlineData("Fe2SiO4")]
    [InlineData("FeO7")]
    [InlineData("not a formula")]
    public void Anything_else_is_null(string text) => Assert.Null(MetalOxide.Resolve(text, Vessels.Catalogue));

    [Theory]
    [InlineData("Fe", 1, "FeO")]
    [InlineData("Cu", 0.5, "CuO0.5")]
    [InlineData("Fe", 4.0 / 3, "FeO1.3333")]
    [InlineData("Sn", 2, "SnO2")]
    public void Mononuclear_names_carry_the_ratio(string element, double oxygen, string name) =>
        Assert.Equal(name, MetalOxide.Name(element, oxygen));
}
