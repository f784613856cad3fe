using Grpc.Core;
using PartitionService.Contracts.V1;
using PartitionService.Core.Catalogue;
using PartitionService.Server.Tests.Support;

namespace PartitionService.Server.Tests.Services;

public sealed class CatalogueGrpcServiceTests(SharedServer shared) : IClassFixture<SharedServer>
{
    private static readonly ThermochemicalCatalogue Core = CatalogueLoader.LoadEmbedded();

    private CatalogueService.CatalogueServiceClient Client => shared.Server.Catalogue;

    [Fact]
    public async Task Walk_through_the_pages_meets_every_row_exactly_once()
    {
        var keys = new List<string>();
        var request = new ListDataRequest { IncludeCompeting = true, PageSize = 777 };
        do
        {
            var page = await Client.ListDataAsync(request);
            Assert.Equal(Core.Data.Count, page.TotalSize);
            Assert.Equal(Core.Digest, page.CatalogueDigest);
            Assert.InRange(page.Data.Count, 1, 777);
            keys.AddRange(page.Data.Select(d => d.Key));
            request.PageToken = page.NextPageToken;
        }
        while (request.PageToken.Length > 0);
        Assert.Equal(Core.Data.Select(d => d.Key), keys);
    }

    [Fact]
    public async Task Page_size_may_change_on_the_way()
    {
        var first = await Client.ListSolventsAsync(new ListSolventsRequest { PageSize = 1 });
        var rest = await Client.ListSolventsAsync(new ListSolventsRequest { PageSize = 1000, PageToken = first.NextPageToken });
        Assert.Equal(Core.Solvents, first.Solvents.Concat(rest.Solvents).Select(s => s.Element));
        Assert.Empty(rest.NextPageToken);
    }

    [Fact]
    public async Task Page_size_of_zero_is_one_hundred()
    {
        var page = await Client.ListDataAsync(new ListDataRequest());
        Assert.Equal(100, page.Data.Count);
    }

    [Fact]
    public async Task Solvents_carry_their_counts()
    {
        var solvents = (await Client.ListSolventsAsync(new ListSolventsRequest { PageSize = 1000 })).Solvents;
        Assert.Equal(Core.Solvents, solvents.Select(s => s.Element));
        Assert.All(solvents, s => Assert.True(s.SoluteCount > 0 && s.MeltingPointKelvin > 200, s.Element));
        var copper = solvents.Single(s => s.Element == "Cu");
        var solutes = await Client.ListSolutesAsync(new ListSolutesRequest { Solvent = "Cu", PageSize = 1000 });
        Assert.Equal(copper.SoluteCount, solutes.TotalSize);
        Assert.True(copper.InteractionCount > 0);
    }

    [Fact]
    public async Task Solutes_are_ordered_and_evaluated_at_the_temperature_asked_for()
    {
        var solutes = (await Client.ListSolutesAsync(new ListSolutesRequest { TemperatureKelvin = 1500, PageSize = 1000 })).Solutes;
        var pairs = solutes.Select(s => (s.Solvent, s.Element)).ToList();
        Assert.Equal(pairs.OrderBy(p => p.Solvent, StringComparer.Ordinal).ThenBy(p => p.Element, StringComparer.Ordinal), pairs);
        Assert.Equal(pairs.Count, pairs.Distinct().Count());
        Assert.All(solutes, s =>
        {
            var row = Assert.IsType<InfiniteDilutionDatum>(Core.Find(s.Key));
            Assert.True(row.Preferred);
            Assert.Equal(1500, s.TemperatureKelvin);
            Assert.Equal(row.LnGamma(1500), s.LnGamma0);
        });
    }

    [Fact]
    public async Task Without_a_temperature_the_middle_of_the_range_counts()
    {
        var lead = (await Client.ListSolutesAsync(new ListSolutesRequest { Solvent = "Cu", PageSize = 1000 })).Solutes.Single(s => s.Element == "Pb");
        Assert.Equal((lead.MinimumTemperatureKelvin + lead.MaximumTemperatureKelvin) / 2, lead.TemperatureKelvin);
    }

    [Fact]
    public async Task Slag_families_carry_components_and_oxides()
    {
        var families = (await Client.ListSlagFamiliesAsync(new ListSlagFamiliesRequest { PageSize = 1000 })).SlagFamilies;
        Assert.Equal(Core.SlagFamilies.Keys.Order(StringComparer.Ordinal), families.Select(f => f.Name));
        Assert.All(families, f => Assert.NotEmpty(f.Components));
        Assert.Contains(families.Single(f => f.Name == "iron-silicate").Oxides, o => o.Oxide == "SnO2");
    }

    [Theory]
    [InlineData(DatumKind.InfiniteDilution, "metal/")]
    [InlineData(DatumKind.Interaction, "interaction/")]
    [InlineData(DatumKind.Oxidation, "oxidation/")]
    [InlineData(DatumKind.Chloride, "chloride/")]
    [InlineData(DatumKind.GasSpecies, "gas/")]
    [InlineData(DatumKind.SlagActivity, "slag/")]
    [InlineData(DatumKind.SolubilityLimit, "solubility/")]
    [InlineData(DatumKind.Capacity, "capacity/")]
    [InlineData(DatumKind.OpticalBasicity, "optical-basicity/")]
    [InlineData(DatumKind.Entrainment, "entrainment/")]
    public async Task Filter_by_kind_is_the_filter_by_first_part_of_the_slot(DatumKind kind, string prefix)
    {
        var byKind = await Client.ListDataAsync(new ListDataRequest { Kind = kind, IncludeCompeting = true, PageSize = 1000 });
        var byPrefix = await Client.ListDataAsync(new ListDataRequest { SlotPrefix = prefix, IncludeCompeting = true, PageSize = 1000 });
        Assert.NotEmpty(byKind.Data);
        Assert.Equal(byPrefix.Data, byKind.Data);
    }

    [Fact]
    public async Task Filter_by_element_takes_solutes_oxides_and_gases_but_not_the_solvents()
    {
        var rows = (await Client.ListDataAsync(new ListDataRequest { Element = "Pb", PageSize = 1000 })).Data;
        Assert.Contains(rows, r => r.Slot == "metal/Cu/Pb");
        Assert.Contains(rows, r => r.Slot == "oxidation/PbO");
        Assert.Contains(rows, r => r.Slot == "slag/iron-silicate/PbO");
        Assert.Contains(rows, r => r.Slot == "gas/PbO");
        Assert.DoesNotContain(rows, r => r.Slot.StartsWith("metal/Pb/", StringComparison.Ordinal));
        Assert.All(rows, r => Assert.True(r.Preferred));
    }

    [Fact]
    public async Task Prefix_without_rows_is_an_empty_list()
    {
        var page = await Client.ListDataAsync(new ListDataRequest { SlotPrefix = "metal/Qq/" });
        Assert.Equal((0, 0, ""), (page.Data.Count, page.TotalSize, page.NextPageToken));
    }

    [Theory]
    [InlineData("metal/Cu/Pb")]
    [InlineData("metal/Cu/Pb#2")]
    public async Task Datum_is_explained_by_slot_or_key(string asked)
    {
        var answer = await Client.ExplainDatumAsync(new ExplainDatumRequest { Slot = asked, TemperatureKelvin = 1473 });
        Assert.Equal("metal/Cu/Pb", answer.Slot);
        Assert.Equal(Core.Slot("metal/Cu/Pb").Count, answer.Data.Count);
        Assert.True(answer.Data[0].Preferred);
        Assert.Equal(answer.Data.OrderByDescending(d => d.Preferred), answer.Data);
        Assert.All(answer.Data, d =>
        {
            Assert.Equal(1473, d.ValueTemperatureKelvin);
            Assert.NotEmpty(d.Sources);
            Assert.All(d.Sources, s => Assert.NotEmpty(s.Citation));
        });
    }

    [Fact]
    public async Task Coverage_comes_with_all_tables_and_their_counts()
    {
        var answer = await Client.GetCoverageAsync(new GetCoverageRequest());
        Assert.Equal(Core.Digest, answer.CatalogueDigest);
        Assert.Equal([CoverageKind.Metals, CoverageKind.Slags, CoverageKind.Vapours], answer.Tables.Select(t => t.Kind));
        Assert.All(answer.Tables, t =>
        {
            Assert.Equal(Enum.GetValues<Contracts.V1.CoverageTrust>().Skip(1), t.Counts.Select(c => c.Trust));
            Assert.All(t.Counts, c => Assert.Equal(t.Cells.Count(cell => cell.Trust == c.Trust), c.CellCount));
            Assert.All(t.Cells, c => Assert.Equal(c.Trust == Contracts.V1.CoverageTrust.Missing, !c.HasSigma));
        });
    }

    [Theory]
    [InlineData(CoverageKind.Metals, "Cu", "Pb", "metal/Cu/Pb#1", "1")]
    [InlineData(CoverageKind.Slags, "iron-silicate", "Pb", "slag/iron-silicate/PbO#", "1")]
    [InlineData(CoverageKind.Vapours, "gas", "Pb", "gas/Pb", "J/mol")]
    public async Task One_table_of_the_coverage_can_be_asked_for(CoverageKind kind, string row, string element, string keyStart, string unit)
    {
        var table = Assert.Single((await Client.GetCoverageAsync(new GetCoverageRequest { Kind = kind })).Tables);
        Assert.Equal(kind, table.Kind);
        Assert.Contains(row, table.Rows);
        var cells = table.Cells.Where(c => c.Row == row && c.Element == element).ToList();
        Assert.NotEmpty(cells);
        Assert.All(cells, c => Assert.StartsWith(keyStart, c.Key, StringComparison.Ordinal));
        Assert.All(cells, c => Assert.Equal(unit, c.Unit));
    }

    [Fact]
    public async Task Unknown_table_of_the_coverage_is_refused()
    {
        var failure = await Assert.ThrowsAsync<RpcException>(async () => await Client.GetCoverageAsync(new GetCoverageRequest { Kind = (CoverageKind)99 }));
        Assert.Equal(StatusCode.InvalidArgument, failure.StatusCode);
    }

    [Fact]
    public async Task Unknown_datum_is_not_found()
    {
        var error = await CallError.OfAsync(Client.ExplainDatumAsync(new ExplainDatumRequest { Slot = "metal/Cu/Qq" }));
        Assert.Equal((StatusCode.NotFound, "UNKNOWN_DATUM"), (error.Status, error.Reason));
        Assert.Contains("metal/Cu/Qq", error.Message, StringComparison.Ordinal);
    }

    [Theory]
    [InlineData("")]
    [InlineData("metal/Cu/Pb#999999")]
    public async Task Slot_that_cannot_be_is_refused(string slot)
    {
        var error = await CallError.OfAsync(Client.ExplainDatumAsync(new ExplainDatumRequest { Slot = slot }));
        Assert.Equal(slot.Length == 0 ? "INVALID_CASE" : "UNKNOWN_DATUM", error.Reason);
    }

    [Fact]
    public async Task Bad_fields_of_a_list_are_named_all_at_once()
    {
        var error = await CallError.OfAsync(Client.ListDataAsync(new ListDataRequest
        {
            Kind = (DatumKind)99,
            SlotPrefix = new string('x', 101),
            Element = "Qq",
            TemperatureKelvin = double.NaN,
            PageSize = -1,
        }));
        Assert.Equal((StatusCode.InvalidArgument, "INVALID_CASE"), (error.Status, error.Reason));
        Assert.Equal(["kind", "slot_prefix", "element", "temperature_kelvin", "page_size"], error.Fields);
        Assert.Equal("page_size is -1; must be a number in [0, 1000]", error.Violation("page_size").Description);
    }

    [Theory]
    [InlineData(499.9)]
    [InlineData(2500.1)]
    [InlineData(double.PositiveInfinity)]
    public async Task Temperature_out_of_range_is_refused(double temperature)
    {
        var error = await CallError.OfAsync(Client.ListSolutesAsync(new ListSolutesRequest { TemperatureKelvin = temperature }));
        Assert.Contains("[500, 2500]", error.Violation("temperature_kelvin").Description, StringComparison.Ordinal);
    }

    [Fact]
    public async Task Unknown_solvent_is_refused_and_not_an_empty_list()
    {
        var error = await CallError.OfAsync(Client.ListSolutesAsync(new ListSolutesRequest { Solvent = "Qq", PageSize = 1001 }));
        Assert.Equal(["solvent", "page_size"], error.Fields);
    }

    [Fact]
    public async Task Token_of_another_list_filter_or_of_nothing_is_refused()
    {
        var token = (await Client.ListDataAsync(new ListDataRequest { SlotPrefix = "metal/", PageSize = 1 })).NextPageToken;
        AsyncUnaryCall<ListDataResponse>[] calls =
        [
            Client.ListDataAsync(new ListDataRequest { SlotPrefix = "slag/", PageToken = token }),
            Client.ListDataAsync(new ListDataRequest { SlotPrefix = "metal/", TemperatureKelvin = 1500, PageToken = token }),
            Client.ListDataAsync(new ListDataRequest { SlotPrefix = "metal/", IncludeCompeting = true, PageToken = token }),
            Client.ListDataAsync(new ListDataRequest { SlotPrefix = "metal/", PageToken = "nonsense" }),
        ];
        foreach (var call in calls)
        {
            var error = await CallError.OfAsync(call);
            Assert.Equal((StatusCode.InvalidArgument, "INVALID_PAGE_TOKEN"), (error.Status, error.Reason));
        }

        var other = await CallError.OfAsync(Client.ListSolventsAsync(new ListSolventsRequest { PageToken = token }));
        Assert.Equal("INVALID_PAGE_TOKEN", other.Reason);
        Assert.NotEmpty((await Client.ListDataAsync(new ListDataRequest { SlotPrefix = "metal/", PageToken = token })).Data);
    }
}
