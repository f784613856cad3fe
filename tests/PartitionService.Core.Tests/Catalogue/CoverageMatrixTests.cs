using PartitionService.Core.Catalogue;

namespace PartitionService.Core.Tests.Catalogue;

public sealed class CoverageMatrixTests
{
    private static readonly ThermochemicalCatalogue Catalogue = CatalogueLoader.LoadEmbedded();
    private static readonly CoverageMatrix Coverage = CoverageMatrix.Of(Catalogue);

    public static TheoryData<string> Tables => ["metals", "slags", "vapours"];

    [Theory]
    [MemberData(nameof(Tables))]
    public void Counts_add_up_to_all_cells(string name)
    {
        var table = Table(name);
        Assert.Equal(table.Cells.Count, Enum.GetValues<CoverageTrust>().Sum(table.Count));
    }

    [Theory]
    [MemberData(nameof(Tables))]
    public void Every_cell_with_a_number_agrees_with_its_row_of_the_catalogue(string name)
    {
        foreach (var cell in Table(name).Cells.Where(cell => cell.Trust != CoverageTrust.Missing))
        {
            var row = Assert.IsType<Datum>(Catalogue.Find(cell.Key), exactMatch: false);
            Assert.True(row.Preferred, cell.Key);
            Assert.Equal(row.Access.ToString(), cell.Trust.ToString());
            Assert.True(cell.Sigma > 0, cell.Key);
        }
    }

    [Theory]
    [MemberData(nameof(Tables))]
    public void A_missing_cell_holds_nothing_and_stands_alone(string name)
    {
        var table = Table(name);
        foreach (var cell in table.Cells.Where(cell => cell.Trust == CoverageTrust.Missing))
        {
            Assert.Equal(("", "", (double?)null), (cell.Species, cell.Key, cell.Sigma));
            Assert.Single(table.At(cell.Row, cell.Element));
        }
    }

    [Fact]
    public void Metals_have_a_cell_for_every_pair_but_the_solvent_in_itself()
    {
        var table = Coverage.Metals;
        Assert.Equal(Catalogue.Solvents, table.Rows);
        var solventsThatAreSolutes = table.Rows.Count(table.Elements.Contains);
        Assert.Equal((table.Rows.Count * table.Elements.Count) - solventsThatAreSolutes, table.Cells.Count);
        Assert.Empty(table.At("Cu", "Cu"));
    }

    [Fact]
    public void Slags_show_every_row_that_counts()
    {
        Assert.Equal(Catalogue.SlagFamilies.Keys.Order(StringComparer.Ordinal), Coverage.Slags.Rows);
        Assert.Equal(
            Catalogue.Data.OfType<SlagActivityDatum>().Where(row => row.Preferred).Select(row => row.Key).Order(StringComparer.Ordinal),
            Coverage.Slags.Cells.Where(cell => cell.Key.Length > 0).Select(cell => cell.Key).Order(StringComparer.Ordinal));
        Assert.Equal(["SnO", "SnO2"], Coverage.Slags.At("iron-silicate", "Sn").Select(cell => cell.Species));
    }

    [Fact]
    public void Vapours_leave_out_carrier_gases_and_name_elements_without_any()
    {
        var table = Coverage.Vapours;
        Assert.DoesNotContain(table.Cells, cell => cell.Species is "O2" or "CO2" or "HCl" or "Ar");
        Assert.Contains(table.At(CoverageMatrix.GasRow, "Pb"), cell => cell.Species == "PbO");
        Assert.Superset(
            Catalogue.Data.OfType<SlagActivityDatum>().Where(row => row.Preferred).Select(row => row.Element).ToHashSet(),
            table.Elements.ToHashSet());
    }

    [Fact]
    public void Levels_stand_in_the_order_of_trust() =>
        Assert.Equal(
            [.. Enum.GetNames<Access>(), nameof(CoverageTrust.Missing)],
            Enum.GetValues<CoverageTrust>().Order().Select(trust => trust.ToString()));

    /// <summary>A pair may have several ranges; the weakest of them is what a user of the whole range relies on.</summary>
    [Fact]
    public void A_pair_with_several_ranges_shows_its_weakest() =>
        Assert.All(
            Catalogue.Data.OfType<InfiniteDilutionDatum>().Where(row => row.Preferred).GroupBy(row => (row.Solvent, row.Solute)),
            pair => Assert.Equal(
                pair.Max(row => row.Access).ToString(), Assert.Single(Coverage.Metals.At(pair.Key.Solvent, pair.Key.Solute)).Trust.ToString()));

    private static CoverageTable Table(string name) => name switch
    {
        "metals" => Coverage.Metals,
        "slags" => Coverage.Slags,
        _ => Coverage.Vapours,
    };
}
