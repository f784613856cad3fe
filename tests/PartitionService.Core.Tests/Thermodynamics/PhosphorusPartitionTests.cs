using PartitionService.Core.Catalogue;
using PartitionService.Core.Thermodynamics;

namespace PartitionService.Core.Tests.Thermodynamics;

public sealed class PhosphorusPartitionTests
{
    private const double DrainTemperature = 1923.15;

    /// <summary>Drain heat 1 as the catalogue row capacity/suito-inoue-1995-lp works it out; its 23.3 % FetO hold 77.73 % iron.</summary>
    private static readonly Dictionary<string, double> DrainHeat1 = new()
    {
        ["CaO"] = 47.2,
        ["SiO2"] = 17.0,
        ["MgO"] = 9.8,
        ["Al2O3"] = 0.4,
        ["FeO"] = 23.3,
        ["MnO"] = 0.9,
        ["P2O5"] = 1.4,
    };

    private const double DrainIron = 23.3 * 55.845 / 71.844;

    [Fact]
    public void Worked_example_of_the_row_is_reproduced() => Assert.Equal(2.310, Drain([]), 0.0005);

    [Fact]
    public void The_slot_is_the_row_that_the_catalogue_prefers()
    {
        var row = CatalogueLoader.LoadEmbedded().Slot<CapacityDatum>(PhosphorusPartition.Slot).Single();
        Assert.True(row.Preferred);
        Assert.StartsWith("log10 L_P = 0.072 (%CaO + 0.3 %MgO + 0.6 %P2O5 + 0.2 %MnO", row.Formula, StringComparison.Ordinal);
    }

    /// <summary>Coefficients of the row's bracket and of its flux extension, each times 0.072.</summary>
    [Theory]
    [InlineData("CaO", 1)]
    [InlineData("MgO", 0.3)]
    [InlineData("P2O5", 0.6)]
    [InlineData("MnO", 0.2)]
    [InlineData("Al2O3", -0.5)]
    [InlineData("Na2O", 1.2)]
    [InlineData("BaO", 0.9)]
    [InlineData("SiO2", 0)]
    public void One_more_mass_percent_of_an_oxide_adds_its_coefficient(string oxide, double coefficient) =>
        Assert.Equal(0.072 * coefficient, Drain(new() { [oxide] = 1 }) - Drain([]), 10);

    [Fact]
    public void Below_half_a_percent_of_iron_the_formula_stays_at_half_a_percent()
    {
        var slag = new SlagComposition(DrainHeat1, false);
        var edge = PhosphorusPartition.Log10(slag, 0.5, DrainTemperature);
        Assert.Equal(edge, PhosphorusPartition.Log10(slag, 0, DrainTemperature));
        Assert.True(PhosphorusPartition.Log10(slag, 0.51, DrainTemperature) > edge);
    }

    [Fact]
    public void A_missing_composition_is_refused() =>
        Assert.Throws<ArgumentNullException>(() => PhosphorusPartition.Log10(null!, 18, DrainTemperature));

    private static double Drain(Dictionary<string, double> more)
    {
        var slag = DrainHeat1.Concat(more).GroupBy(o => o.Key).ToDictionary(g => g.Key, g => g.Sum(o => o.Value));
        return PhosphorusPartition.Log10(new SlagComposition(slag, false), DrainIron, DrainTemperature);
    }
}
